/**
 * The import rule holds in the whole project, and the checker itself sees what breaks it.
 */
import { describe, expect, test } from 'vitest';
import { importsOf, violations } from '../support/import-rule';
import { sourcesUnder } from '../support/project-files';

describe('the import rule', () => {
  test('holds in every file', () => {
    const files = sourcesUnder('core', 'extension', 'test');
    expect(files.length).toBeGreaterThan(20);
    expect(violations(files)).toEqual([]);
  });
});

describe('the checker of the import rule', () => {
  const broken: readonly (readonly [string, string, string])[] = [
    ['the core uses the editor', 'core/features/hover.ts', "import * as vscode from 'vscode';"],
    ['the core uses Node', 'core/report/json.ts', "import { join } from 'node:path';"],
    ['Node by its bare name', 'core/report/json.ts', "import { join } from 'path';"],
    ['YAML outside its room', 'core/model/build.ts', "import { parseDocument } from 'yaml';"],
    ['mathjs outside its room', 'core/quantity/read.ts', "import { parse } from 'mathjs/number';"],
    ['a lower room looks up', 'core/compute/ripple.ts', "import type { Board } from '../model/board';"],
    ['checks and features know each other', 'core/checks/rail-low.ts', "import '../features/hover';"],
    ['features use checks', 'core/features/fix.ts', "import { all } from '../checks/index';"],
    ['a room is named without its index', 'core/compute/ripple.ts', "import { build } from '../model';"],
    ['a room uses the façade by its folder', 'core/analysis/run.ts', "export { analyse } from '..';"],
    ['a room uses the façade', 'core/analysis/run.ts', "export { analyse } from '../index';"],
    ['a room without a rule', 'core/misc/helper.ts', "import { span } from '../text/span';"],
    [
      'the engine looks outside itself',
      'core/engine/solve.ts',
      "import type { Band } from '../quantity/figure';",
    ],
    ['the façade imports the command line', 'core/index.ts', "import { main } from './cli/main';"],
    ['the command line goes past the façade', 'core/cli/main.ts', "import { write } from '../report/json';"],
    [
      'the extension goes past the façade',
      'extension/main.ts',
      "const m = await import('../core/text/span');",
    ],
    ['the extension uses Node', 'extension/main.ts', "const fs = require('node:fs');"],
    ['a unit test uses the editor', 'test/core/x.test.ts', "import * as vscode from 'vscode';"],
    ['an import with its file extension', 'core/text/lines.ts', "import { span } from './span.ts';"],
    [
      'an import over several lines',
      'core/quantity/read.ts',
      "import {\n  type Board,\n  other,\n} from '../model/board';",
    ],
  ];
  test.each(broken)('sees that %s', (_, path, text) => {
    expect(violations([{ path, text }])).toHaveLength(1);
  });

  const sound: readonly (readonly [string, string, string])[] = [
    ['a room within itself', 'core/checks/rail-low.ts', "import { cure } from './cure';"],
    ['types of findings anywhere', 'core/model/build.ts', "import type { Fix } from '../checks/finding';"],
    ['the façade by the command line', 'core/cli/main.ts', "import { analyse } from '../index';"],
    ['Node in the command line', 'core/cli/main.ts', "import process from 'node:process';"],
    ['an index by its folder', 'core/model/build.ts', "import { keys } from '../format';"],
    ['a deeper folder', 'core/catalog/chips/x.ts', "import { figure } from '../../quantity/figure';"],
    ['YAML in its room', 'core/syntax/parse.ts', "import { parseDocument } from 'yaml';"],
    ['an import in a comment', 'core/text/span.ts', "// import x from 'vscode';\n/* import 'yaml' */"],
  ];
  test.each(sound)('accepts %s', (_, path, text) => {
    expect(violations([{ path, text }])).toEqual([]);
  });

  test('reads every form of import', () => {
    const text = [
      "import a from 'one';",
      "import type { B } from 'two';",
      "export * from 'three';",
      "import 'four';",
      "const e = await import('five');",
      "const f = require('six');",
    ].join('\n');
    expect(importsOf(text).sort()).toEqual(['five', 'four', 'one', 'six', 'three', 'two']);
  });
});
