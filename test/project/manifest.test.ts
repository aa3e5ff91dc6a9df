/**
 * The manifest and the code name the same commands and settings, and the defaults in both are one.
 */
import { expect, test } from 'vitest';
import { toolVersion } from '../../core/index';
import { readProjectFile, sourcesUnder } from '../support/project-files';

interface Manifest {
  readonly version: string;
  readonly activationEvents: readonly string[];
  readonly contributes: {
    readonly commands: readonly { readonly command: string; readonly category: string }[];
    readonly menus: {
      readonly commandPalette: readonly { readonly command: string; readonly when?: string }[];
    };
    readonly configuration: {
      readonly properties: Readonly<
        Record<string, { readonly default: unknown; readonly enum?: readonly string[] }>
      >;
    };
  };
}

const manifest: Manifest = JSON.parse(readProjectFile('package.json'));
const { commands, menus, configuration } = manifest.contributes;
const settingsSource = readProjectFile('extension/settings.ts');
const commandSource = readProjectFile('extension/commands/names.ts');

function quoted(text: string, pattern: RegExp): string[] {
  return [...text.matchAll(pattern)].map((match) => match[1]!).sort();
}

test('commands: declared are those that the code names', () => {
  const named = quoted(commandSource, /'(railLedger\.\w+)'/g);
  expect(named.length).toBeGreaterThan(0);
  expect(commands.map(({ command }) => command).sort()).toEqual(named);
});

test('commands: each name is registered in the entry, and written nowhere else in the code', () => {
  const entry = readProjectFile('extension/main.ts');
  const constants = quoted(commandSource, /export const (\w+)/g);
  for (const constant of constants) expect(entry).toMatch(new RegExp(`registerCommand\\(\\s*${constant}\\b`));
  const elsewhere = sourcesUnder('extension').filter(
    ({ path, text }) => path !== 'extension/commands/names.ts' && /['"`]railLedger\./.test(text),
  );
  expect(elsewhere).toEqual([]);
});

test('commands: all are of one category and hidden from the palette where no board is open', () => {
  expect(new Set(commands.map(({ category }) => category))).toEqual(new Set(['Rail Ledger']));
  expect(menus.commandPalette.map(({ command }) => command).sort()).toEqual(
    commands.map(({ command }) => command).sort(),
  );
  for (const { when } of menus.commandPalette) {
    const pattern = /^resourceFilename =~ \/(.+)\/$/.exec(when ?? '')?.[1];
    expect(pattern).toBeDefined();
    const names = new RegExp(pattern!);
    expect(
      ['rails.yaml', 'night.rails.yaml', 'handrails.yaml', 'rails.yaml.bak'].map((n) => names.test(n)),
    ).toEqual([true, true, false, false]);
  }
});

test('settings: declared are those that are read, with the same default', () => {
  const read = quoted(settingsSource, /configuration\.get<\w+>\('(\w+)'/g);
  expect(read.length).toBeGreaterThan(0);
  expect(Object.keys(configuration.properties).sort()).toEqual(read.map((name) => `railLedger.${name}`));
  const delay = /get<number>\('delay', (\d+)\)/.exec(settingsSource)?.[1];
  expect(configuration.properties['railLedger.delay']?.default).toBe(Number(delay));
  const run = configuration.properties['railLedger.run'];
  expect(run?.enum).toContain(run?.default);
});

test('activation waits for YAML or a folder with a board', () => {
  expect([...manifest.activationEvents].sort()).toEqual([
    'onLanguage:yaml',
    'workspaceContains:**/*.rails.yaml',
    'workspaceContains:**/rails.yaml',
  ]);
});

test('the version that reports carry is the one of the package', () => {
  expect(toolVersion).toBe(manifest.version);
});
