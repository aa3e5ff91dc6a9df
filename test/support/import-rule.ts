/**
 * The project's import rule as one table, and a reader of import statements that holds files against it.
 * Kept as plain functions over text, so that a sample that breaks the rule is a test like any other.
 */

export interface SourceFile {
  /** From the project's root, with slashes: `core/text/span.ts`. */
  readonly path: string;
  readonly text: string;
}

const ground = ['text', 'quantity'];
const readers = ['syntax', 'expression', 'format', 'catalog', ...ground];
const computers = ['model', 'compute', 'engine', 'pump', ...readers];

/** What each room of the core may import beside itself. The types in checks/finding.ts are open to all. */
const rooms: Readonly<Record<string, readonly string[]>> = {
  text: [],
  quantity: ['text'],
  syntax: ['text'],
  expression: ground,
  format: ground,
  catalog: ground,
  compute: ground,
  engine: [],
  pump: ['engine', ...ground],
  model: readers,
  analysis: computers,
  checks: ['analysis', ...computers],
  features: ['analysis', ...computers],
  sizing: ['analysis', 'checks', ...computers],
  report: ['analysis', ...ground],
  cli: [],
};

const openToAll = 'core/checks/finding';
const facade = 'core/index';

/** Packages that only one place may import. */
const owners: Readonly<Record<string, (path: string) => boolean>> = {
  yaml: (path) => path.startsWith('core/syntax/') || path.startsWith('test/'),
  mathjs: (path) => path.startsWith('core/expression/') || path.startsWith('test/'),
  vscode: (path) => path.startsWith('extension/') || path.startsWith('test/editor/'),
};

/** One sentence for each import that breaks the rule. */
export function violations(files: readonly SourceFile[]): string[] {
  return files.flatMap((file) =>
    importsOf(file.text).flatMap((target) => {
      const why = judge(file.path, target);
      return why === undefined ? [] : [`${file.path} imports ${target}: ${why}`];
    }),
  );
}

/** The targets of static and dynamic imports, re-exports and requires; comments are not looked at. */
export function importsOf(text: string): string[] {
  const code = text.replace(/\/\*[\s\S]*?\*\/|^\s*\/\/.*$/gm, '');
  const patterns = [
    /^\s*(?:import|export)\s[^'"`;]*?\bfrom\s*['"]([^'"]+)['"]/gm,
    /^\s*import\s*['"]([^'"]+)['"]/gm,
    /\b(?:import|require)\s*\(\s*['"`]([^'"`]+)['"`]/g,
  ];
  return patterns.flatMap((pattern) => [...code.matchAll(pattern)].map((match) => match[1]!));
}

function judge(path: string, target: string): string | undefined {
  if (!target.startsWith('.')) return judgePackage(path, target);
  const resolved = resolve(path, target);
  if (path.startsWith('extension/')) {
    const allowed = resolved.startsWith('extension/') || resolved === facade;
    return allowed ? undefined : 'the extension reaches the core by its façade only';
  }
  if (!path.startsWith('core/')) return undefined;
  if (!resolved.startsWith('core/')) return 'the core imports nothing outside itself';
  if (/\.[jt]s$/.test(target)) return 'imports are written without the file extension';
  return judgeRooms(path, resolved);
}

function judgeRooms(path: string, resolved: string): string | undefined {
  if (resolved === openToAll) return undefined;
  const from = roomOf(path);
  const to = roomOf(resolved);
  if (from === undefined) {
    return to === 'cli' ? 'the façade does not know the command line' : undefined;
  }
  if (from === 'cli' && resolved === facade) return undefined;
  if (to === undefined) return 'only the command line and outsiders use the façade';
  const allowed = rooms[from];
  if (allowed === undefined) return `the room ${from} is not in the import rule`;
  return from === to || allowed.includes(to) ? undefined : `${from} may not import ${to}`;
}

function judgePackage(path: string, target: string): string | undefined {
  const name = target.startsWith('@')
    ? target.split('/').slice(0, 2).join('/')
    : (target.split('/')[0] ?? target);
  const owner = owners[name];
  if (owner !== undefined) return owner(path) ? undefined : `${name} has one place, which is not here`;
  if (path.startsWith('core/cli/')) {
    return target.startsWith('node:') ? undefined : 'the command line uses no packages';
  }
  if (path.startsWith('core/') || path.startsWith('extension/'))
    return 'neither Node nor packages are in reach here';
  return undefined;
}

/** Nothing for the façade itself, which stands in no room. A room's own name means its index. */
function roomOf(path: string): string | undefined {
  const name = /^core\/([^/]+)/.exec(path)?.[1]?.replace(/\.ts$/, '');
  return name === 'index' ? undefined : name;
}

function resolve(path: string, target: string): string {
  const parts = path.split('/').slice(0, -1);
  for (const part of target.split('/')) {
    if (part === '..') parts.pop();
    else if (part !== '.') parts.push(part);
  }
  const resolved = parts.join('/').replace(/\.[jt]s$/, '');
  return resolved === 'core' ? facade : resolved;
}
