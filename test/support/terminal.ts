/**
 * The command line with a machine in memory: files, streams and the kind of terminal as a test wants them.
 */
import type { Io } from '../../core/cli/io';
import { run } from '../../core/cli/run';

export interface Machine {
  readonly files?: Readonly<Record<string, string | Uint8Array>>;
  readonly input?: string;
  readonly cwd?: string;
  readonly env?: Record<string, string>;
  readonly isTerminal?: boolean;
  readonly errorIsTerminal?: boolean;
  readonly today?: string;
}

/** Runs against files in memory. */
export async function rail(args: string, machine: Machine = {}) {
  const {
    files = {},
    input = '',
    cwd = '/home/board',
    env = {},
    isTerminal = false,
    errorIsTerminal,
    today = '2026-01-15',
  } = machine;
  const bytes = (content: string | Uint8Array) =>
    typeof content === 'string' ? new TextEncoder().encode(content) : content;
  const written: Record<string, string> = {};
  let out = '';
  let err = '';
  const io: Io = {
    cwd,
    env,
    isTerminal,
    width: undefined,
    ...(errorIsTerminal === undefined ? {} : { errorIsTerminal }),
    out: (text) => {
      out += text;
    },
    err: (text) => {
      err += text;
    },
    readFile: async (path) => {
      const content = files[path];
      if (content === undefined) throw Object.assign(new Error('missing'), { code: 'ENOENT' });
      return bytes(content);
    },
    writeFile: async (path, text) => {
      written[path] = text;
    },
    isFile: async (path) => Object.hasOwn(files, path),
    packageFolder: '/package',
    today: () => today,
    readInput: async () => bytes(input),
  };
  const code = await run(
    args.split(' ').filter((word) => word !== ''),
    io,
  );
  return { code, out, err, written };
}
