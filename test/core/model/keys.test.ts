/**
 * Keys: unknown, missing, without a value, and those whose effect is not computed.
 */
import { expect, test } from 'vitest';
import { checkFindings } from '../../support/check-findings';

test('unknown keys', () => {
  checkFindings(
    `
raills: {}
#^^^^^ unknown-key: did you mean \`rails\`
supplies:
  p: { voltage: 5 V, curent: 1 A }
  #                  ^^^^^^ unknown-key: did you mean \`current\`
  q: { voltage: 5 V, colour: red }
  #                  ^^^^^^ unknown-key: there are \`standard\`
  r: { voltage: 5 V, voltge: 4 V }
  #                  ^^^^^^ unknown-key
  s: { voltage: 5 V, __proto__: 4 V }
  #                  ^^^^^^^^^ unknown-key
`,
    { ignore: ['missing-key'] },
  );
});

test('a file without rails says so, softly', () => {
  const { findings } = checkFindings('board: x\n', { ignore: ['missing-key'] });
  expect(findings.map(({ code, severity, at }) => [code, severity, at])).toEqual([
    ['missing-key', 'warning', 'rails'],
  ]);
});

test('missing keys, marked at the name of what lacks them', () => {
  checkFindings(
    `
supplies:
  pp: { current: 1 A }
  #^ missing-key: one of \`standard\`, \`battery\`, \`voltage\`
  q: { voltage: 5 V }
rails:
  va: { loads: { x: 1 mA } }
  #^ missing-key: A rail needs one of \`supply\`
  vb: { supply: q, filter: { from: va, resistor: 1 ohm, capacitor: 1 uF } }
  #                ^^^^^^ duplicate-name: \`supply\` and \`filter\` stand here
  vc: { filter: { from: va, capacitor: 1 uF } }
  #     ^^^^^^ missing-key: needs one of \`resistor\`, \`inductor\`
  vd: { regulator: { output: 3 V } }
  #     ^^^^^^^^^ missing-key: \`from\` is missing
  ve:
    pump: { topology: doubler }
    #^^^ missing-key: \`input\` is missing
    #^^^ missing-key: \`drive\` is missing
    #^^^ missing-key: \`flying\` is missing
    #^^^ missing-key: \`diode\` is missing
    #^^^ missing-key: \`reservoir\` is missing
  vf:
    pump: { topology: ladder, input: ground, drive: t, diode: silicon-a, flying: 1 uF, stages: 3 }
clocks:
  t: { external: { frequency: 1 kHz, high: 5 V } }
  uu: { duty: 50 % }
  #^ missing-key: one of \`pin\`, \`astable\`, \`schmitt\`, \`external\`
  vv: { pin: mcu.P1, duty: 50 % }
  #^ missing-key: \`frequency\` is missing
chips: { mcu: { part: mcu-b } }
`,
    { ignore: ['not-computed', 'assumed'] },
  );
});

test('each missing key has its own path', () => {
  const { findings } = checkFindings('rails: { v: { regulator: {} } }\n', { ignore: ['missing-key'] });
  expect(findings.map(({ at }) => at)).toEqual(['rails.v.regulator.from', 'rails.v.regulator.output']);
});

test('keys without a value', () => {
  checkFindings(`
supplies: { p: { voltage: } }
#                ^^^^^^^ missing-key: has no value yet
rails:
  v3:
  #^ missing-key: It needs one of \`supply\`, \`regulator\`, \`pump\`, \`filter\`
  v5:
    supply: p
    loads:
    #^^^^ missing-key: has no value yet
`);
});

test('values of the wrong shape', () => {
  checkFindings(`
supplies: 5 V
#         ^^^ syntax: Entries with names
rails:
  v3: { pump: doubler }
  #           ^^^^^^^ syntax: A pump stands here as a map
  v5: [1]
  #   ^^^ syntax: A rail stands here as a map
include: x.yaml
#        ^^^^^^ syntax: A list stands here
board: [x]
#^^^^ syntax: One word or text
`);
});

test('effects that are not computed: one finding for each use, one for a whole entry', () => {
  checkFindings(`
supplies:
  p: { voltage: 5 V, resistance: 1 ohm, capacity: 1 Ah, bulk: 10 uF, current: 1 A }
chips: { mcu: { part: mcu-a, rail: v5 } }
clocks:
  a: { pin: mcu.GP14, timer: { input: 1 MHz, top: 99 }, rise: 1 ns, fall: 1 ns }
  b: { pin: mcu.GP15, inverse-of: a }
  c: { rail: v5, astable: { charge: 1 kohm, discharge: 1 kohm, timing: 1 nF, part: timer-a } }
  d: { rail: v5, schmitt: { resistor: 1 kohm, capacitor: 1 nF, part: gate-a } }
  e: { external: { frequency: 1 kHz, duty: 50 %, high: 5 V } }
drivers:
  stage: { input: a, rail: v5, push-pull: { npn: npn-a, pnp: pnp-a, base: { npn: 1 kohm, pnp: 1 kohm } } }
  pair: { input: a, rail: v5, mosfet-pair: { nmos: nmos-a, pmos: pmos-a, gate: 10 ohm } }
  hcs: { input: a, rail: v5, gates: { part: gate-a, parallel: 2 } }
  pins: { input: a, pins: [mcu.GP14, mcu.GP15] }
rails:
  v5: { supply: p }
  v3: { regulator: { from: v5, output: 3.3 V, ground: 1 uA, dropout: 1 V, limit: 1 A, kind: linear, efficiency: 90 %, thermal: 9 K/W } }
  vf: { filter: { from: v5, resistor: 1 ohm, capacitor: { value: 1 uF, kind: x7r, rated: 10 V } } }
  vm:
    pump:
      topology: multiplier
      stages: 3
      polarity: positive
      input: v5
      drive: [a, b]
      diode: silicon-a
      series: 1 ohm
      flying: { value: 1 uF, kind: x7r, rated: 10 V, size: 0805, negative-to: ground }
      reservoir: { value: 1 uF, kind: x7r }
      smoothing: { value: 1 uF, kind: x7r }
    needs: { voltage: 5..9 V, ripple: 1 V, start: 1 s, swing: 1 V, headroom: 1 V, discharge: 1 s }
    bleeder: 1 Mohm
    loads:
      a: 10 mW
      b: { power: 10 mW, least: 4 V, most: 9 V }
      c: { amplifier: { quiescent: 1 mA } }
bench: [{ rail: v5, load: 1 mA, voltage: 5 V }]
waivers: [{ finding: rail-low, at: rails.vm, because: fine }]
include: [a.yaml, b.yaml]
#         ^^^^^^ include-failed
#                 ^^^^^^ include-failed
`);
});

test('waivers name findings that exist', () => {
  checkFindings(
    `
rails: {}
waivers:
  - { finding: rail-lov, at: rails.v, because: fine }
  #            ^^^^^^^^ unknown-name: did you mean \`rail-low\`
  - { finding: rail-low, at: rails.v }
  # ^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^ missing-key: \`because\` is missing
`,
    { ignore: ['not-computed'] },
  );
});
