/**
 * Broken and half-typed files: always a board with what is readable, never an exception, no span outside the text.
 */
import fc from 'fast-check';
import { expect, test } from 'vitest';
import { type BoardReading, readBoard } from '../../../core/model/build';
import { checkFindings } from '../../support/check-findings';
import { smallCatalogue } from '../../support/small-catalogue';

const good = `board: "Weir gauge" # µΩ 😀
conditions: { ambient: -20..45 degC }
supplies:
  pack: &pack { battery: li-ion, cells: 2, current: 500 mA }
chips:
  mcu: { part: mcu-a, rail: v3, draws: { active: 24 mA }, pins: { GP15: { strength: 12 mA } } }
clocks:
  tick: { pin: mcu.GP15, frequency: 100 kHz, duty: 50 % }
rails:
  vbat: { supply: pack }
  v3: { regulator: { from: vbat, output: 3.3 V +-2 %, ground: 50 uA } }
  v6:
    pump:
      topology: doubler
      input: v3
      drive: tick
      diode: { saturation: 2.5 nA }
      flying: "1 \\u00b5F"
      reservoir: { value: = 2 * 5 uF, kind: x7r }
    needs: { voltage: 5.2..6.5 V }
    loads:
      a: 4k7
      b: >-
        1.2
        mA
modes: { active: { share: 2 % } }
parts: { diodes: { d: { saturation: 1 nA } } }
bench: [{ rail: v6, load: 1 mA, voltage: 5 V }]
`;

function expectSpansInside(reading: BoardReading): void {
  const { length } = reading.text;
  const inside = ({ start, end }: { start: number; end: number }) =>
    0 <= start && start <= end && end <= length;
  for (const { span, related = [], fixes = [], message } of reading.findings) {
    expect(inside(span), message).toBe(true);
    expect(length === 0 || span.end > span.start, `${message} has no width`).toBe(true);
    for (const other of related) expect(inside(other.span)).toBe(true);
    for (const { edits } of fixes) for (const edit of edits) expect(inside(edit.span)).toBe(true);
  }
  for (const { span } of [...reading.quantities, ...reading.references]) expect(inside(span)).toBe(true);
  for (const offset of [0, length >> 1, length]) expect(inside(reading.nodeAt(offset).span)).toBe(true);
}

test('every beginning of a good file', () => {
  for (let end = 0; end <= good.length; end++)
    expectSpansInside(readBoard(good.slice(0, end), smallCatalogue));
});

test('a good file with random edits', () => {
  const pieces = fc.constantFrom(
    ...'{}[]:,-#&*!|>\'"%@`\n\t \r'.split(''),
    '..',
    '+-',
    '= ',
    '<<: ',
    '*pack',
    '\u0000',
    '\ud800',
  );
  const edit = fc.record({
    at: fc.nat(good.length),
    cut: fc.nat(12),
    put: fc.string({ unit: pieces, maxLength: 4 }),
  });
  fc.assert(
    fc.property(fc.array(edit, { minLength: 1, maxLength: 5 }), (edits) => {
      let text = good;
      for (const { at, cut, put } of edits) text = text.slice(0, at) + put + text.slice(at + cut);
      expectSpansInside(readBoard(text, smallCatalogue));
    }),
    { numRuns: 300 },
  );
});

test('any text', () => {
  const text = fc.oneof(fc.string({ unit: 'binary', maxLength: 200 }), fc.string({ maxLength: 200 }));
  fc.assert(
    fc.property(text, (written) => expectSpansInside(readBoard(written, smallCatalogue))),
    { numRuns: 300 },
  );
});

test('any tree of known keys with any values', () => {
  const keys = good.match(/[a-z0-9]+(?=:)/g) ?? [];
  const value = fc.constantFrom(
    '1',
    '5 V',
    '-3 mA',
    'v3',
    'mcu.GP15',
    '= 1 V',
    '[]',
    '{}',
    '',
    'null',
    '*pack',
    '1e999 V',
  );
  const tree = fc.letrec<{ node: string }>((tie) => ({
    node: fc.oneof(
      { maxDepth: 4 },
      value,
      fc
        .array(fc.tuple(fc.constantFrom(...keys), tie('node')), { maxLength: 5 })
        .map((entries) => `{ ${entries.map(([key, inner]) => `${key}: ${inner}`).join(', ')} }`),
      fc.array(tie('node'), { maxLength: 3 }).map((items) => `[${items.join(', ')}]`),
    ),
  })).node;
  fc.assert(
    fc.property(tree, (text) => expectSpansInside(readBoard(text, smallCatalogue))),
    { numRuns: 300 },
  );
});

test('what stands before and after a broken line is read', () => {
  const { board } = checkFindings(`
supplies: { p: { voltage: 5 V } }
rails:
  v5: { supply: p }
  v3
  #^ syntax: A colon and a value are missing behind \`v3\`.
  v9: { supply: p }
`);
  expect([...board.rails.keys()]).toEqual(['v5', 'v3', 'v9']);
});

test('where the text is broken nothing else is said', () => {
  const { findings } = readBoard('rails:\n  v5:\n    suply\n', smallCatalogue);
  expect(findings.filter(({ span }) => span.start >= 14).map(({ code }) => code)).toEqual(['syntax']);
});

test('syntax findings carry the path of their place', () => {
  const { findings } = readBoard('rails:\n  v5:\n    loads: { a: 1 mA\n', smallCatalogue);
  expect(findings.filter(({ code }) => code === 'syntax').map(({ at }) => at)[0]).toContain('rails.v5.loads');
});
