/**
 * Names: unknown ones with what was probably meant, equal ones, rails in circles.
 */
import { expect, test } from 'vitest';
import { applyEdits } from '../../../core/text/edit';
import { checkFindings } from '../../support/check-findings';

const sound = `
supplies: { p: { voltage: 5 V } }
chips: { mcu: { part: mcu-a, rail: v5 } }
clocks: { tick: { pin: mcu.GP15, frequency: 10 kHz, duty: 50 % } }
modes: { active: { share: 2 % } }
`;

test('names of entries', () => {
  checkFindings(`${sound}
rails:
  v5: { supply: q }
  #             ^ unknown-name: did you mean \`p\`
  v9:
    pump:
      topology: doubler
      input: v55
      #      ^^^ unknown-name: No rail \`v55\`: did you mean \`v5\`?
      drive: tock
      #      ^^^^ unknown-name: No clock or driver
      diode: schottky-b
      #      ^^^^^^^^^^ unknown-name: did you mean \`schottky-a\`
      flying: { value: 1 uF, kind: x7s }
      #                            ^^^ unknown-name: did you mean \`x7r\`
      reservoir: { value: 1 uF, kind: x7r }
    loads:
      a: { current: 1 mA, in: [active, activ] }
      #                                ^^^^^ unknown-name: did you mean \`active\`
      b: { current: 1 mA, in: sleeping }
      #                       ^^^^^^^^ unknown-name: There is \`active\`.
`);
});

test('pins', () => {
  checkFindings(`
supplies: { p: { voltage: 5 V } }
chips:
  mcu: { part: mcu-a }
  free: { part: mcu-b }
  bare: { rail: v5 }
  #^^^ missing-key: without one its pin \`P1\` has no output resistance
clocks:
  a: { pin: mcu.GP15, frequency: 1 kHz, duty: 50 % }
  b: { pin: mcu.GP51, frequency: 1 kHz, duty: 50 % }
  #             ^^^^ unknown-name: did you mean \`GP15\`
  c: { pin: free.ANY, frequency: 1 kHz, duty: 50 % }
  d: { pin: mcv.GP15, frequency: 1 kHz, duty: 50 % }
  #         ^^^ unknown-name: did you mean \`mcu\`
  e: { pin: GP15, frequency: 1 kHz, duty: 50 % }
  #         ^^^^ unknown-name: CHIP.PIN, for example \`mcu.GP15\`
  f: { pin: bare.P1, frequency: 1 kHz, duty: 50 % }
rails: { v5: { supply: p } }
`);
});

test('a pin that the board itself lists exists', () => {
  checkFindings(`
supplies: { p: { voltage: 5 V } }
chips: { mcu: { part: mcu-a, rail: v5, pins: { GP3: } } }
clocks: { a: { pin: mcu.GP3, frequency: 1 kHz, duty: 50 % } }
rails: { v5: { supply: p } }
`);
});

test('drive settings, in any spelling of the current', () => {
  checkFindings(`
chips:
  mcu:
    part: mcu-a
    pins:
      GP15: { strength: 12mA }
      GP14: { strength: 4 mA }
      #                 ^^^^ unknown-name: There are \`2 mA\`, \`12 mA\`.
  other:
    part: mcu-b
    pins: { P1: { strength: 4 mA } }
    #                       ^^^^ unknown-name: None is given
rails: {}
`);
});

test('a clock and a driver of one name', () => {
  checkFindings(
    `${sound}
drivers:
  tick: { input: tick, gates: { part: gate-a } }
  #^^^ duplicate-name: A clock is called \`tick\` too
rails: { v5: { supply: p } }
`,
    { ignore: ['not-computed'] },
  );
});

test('the finding of an equal name points to the first one', () => {
  const { findings } = checkFindings(`
supplies: { p: { voltage: 5 V } }
rails:
  v5: { supply: p }
  v5: { supply: p }
  #^ duplicate-name: a second time
`);
  expect(findings[0]).toMatchObject({ at: 'rails.v5', related: [{ message: 'The first one is here.' }] });
});

test("rails in a circle, through a regulator and a chip's clock", () => {
  const { findings } = checkFindings(
    `
chips: { mcu: { part: mcu-b, rail: v3 } }
clocks: { tick: { pin: mcu.P1, frequency: 1 kHz, duty: 50 % } }
rails:
  v3: { regulator: { from: v6, output: 3.3 V } }
  #                        ^^ rail-cycle: \`v3\` on \`v6\` on \`v3\`
  v6:
    pump: { topology: doubler, input: v5, drive: tick, diode: silicon-a, flying: 1 uF, reservoir: 1 uF }
  v5: { regulator: { from: v5, output: 5 V } }
  #                        ^^ rail-cycle: stands on itself
`,
    { ignore: ['assumed'] },
  );
  expect(findings.find(({ at }) => at === 'rails.v3')?.related?.map(({ message }) => message)).toEqual([
    '`v3` stands on `v6`.',
    '`v6` stands on `v3` through `tick`, which chip `mcu` puts out.',
  ]);
});

test('a long circle is one finding', () => {
  const { findings } = checkFindings(`
rails:
  a: { regulator: { from: b, output: 1 V } }
  #                       ^ rail-cycle: \`a\` on \`b\` on \`c\` on \`a\`
  b: { regulator: { from: c, output: 1 V } }
  c: { regulator: { from: a, output: 1 V } }
  d: { regulator: { from: a, output: 1 V } }
`);
  expect(findings).toHaveLength(1);
});

test('an inverter on the rail that it is driven from is no circle', () => {
  checkFindings(
    `${sound}
rails:
  v5: { supply: p }
  v9:
    pump: { topology: inverter, drive: tick, diode: silicon-a, flying: 1 uF, reservoir: 1 uF }
`,
    { ignore: ['assumed'] },
  );
});

test('the preferred fix writes what was meant', () => {
  const text = `
rails: { v5: { suply: q }, v9: { supply: p } }
#              ^^^^^ unknown-key: did you mean \`supply\`
supplies: { p: { voltage: 3..2 V } }
#                         ^^^^^^ bad-quantity: write \`2..3 V\`
clocks: { tick: { pin: mcu.P1, frequency: 3 khz, duty: 50 % } }
#                                           ^^^ wrong-unit: did you mean \`kHz\`
chips: { mcu: { part: mcu-c } }
#                     ^^^^^ unknown-name: did you mean \`mcu-a\`
`;
  const { findings } = checkFindings(text, { ignore: ['missing-key'] });
  const edits = findings.flatMap(({ fixes = [] }) =>
    fixes.flatMap((fix) => (fix.preferred ? fix.edits : [])),
  );
  const lines = applyEdits(text, edits)
    .split('\n')
    .filter((line) => !line.startsWith('#'));
  expect(lines).toEqual([
    '',
    'rails: { v5: { supply: q }, v9: { supply: p } }',
    'supplies: { p: { voltage: 2..3 V } }',
    'clocks: { tick: { pin: mcu.P1, frequency: 3 kHz, duty: 50 % } }',
    'chips: { mcu: { part: mcu-a } }',
    '',
  ]);
});
