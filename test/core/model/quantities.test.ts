/**
 * Quantities in the file: wrong ones underlined to the letter through every YAML style, and figures that make no
 * sense where they stand.
 */
import { expect, test } from 'vitest';
import { checkFindings } from '../../support/check-findings';

test('the wrong part is underlined, in every style', () => {
  checkFindings(`
supplies:
  a: { voltage: 3.3 mA }
  #                 ^^ wrong-unit: unit of a current
  b: { voltage: "3.3 mA" }
  #                  ^^ wrong-unit
  c: { voltage: '3.3 mA' } # µΩ 😀
  #                  ^^ wrong-unit
  d:
    voltage: "3.3 \\u00b5A" # a comment
    #             ^^^^^^^ wrong-unit
  😀: { voltage: 3.3 mA }
  #                  ^^ wrong-unit
  e: { voltage: 5 }
  #             ^ wrong-unit: has no unit
  f: { voltage: 4.75 V..5.25 }
  #                     ^^^^ wrong-unit
  g: { voltage: "= 3 * 1.2 mA" }
  #              ^^^^^^^^^^^^ wrong-unit: gives a current
  h: { voltage: = 3 * foo }
  #                   ^^^ bad-quantity: no unit
  i: { voltage: 5.25..4.75 V }
  #             ^^^^^^^^^^^^ bad-quantity: write \`4.75..5.25 V\`
  j: { voltage: null }
  #             ^^^^ bad-quantity
  k: { voltage: "" }
  #             ^^ bad-quantity: missing
  l: { voltage: [5 V] }
  #    ^^^^^^^ syntax: A voltage stands here
rails: {}
`);
});

test('figures that make no sense', () => {
  checkFindings(
    `
supplies:
  a: { voltage: 5 V, current: 0 A, cells: 1.5, resistance: -1 ohm }
  #                           ^^^ bad-quantity: must be greater than 0 A
  #                                       ^^^ bad-quantity: whole number
  #                                                        ^^^^^^ bad-quantity: not be below 0 ohm
clocks:
  t: { external: { frequency: 0 Hz, duty: 150 %, high: 5 V } }
  #                           ^^^^ bad-quantity: must be greater than 0 Hz
  #                                       ^^^^^ bad-quantity: must not be above 100 %, but 150 % is.
  u: { external: { frequency: 1 kHz, duty: 50, high: 5 V } }
  #                                        ^^ bad-quantity: Write percent with their sign: \`50 %\`
modes: { a: { share: 60 % }, b: { share: 50 % } }
#^^^^ bad-quantity: add up to 110 %
rails:
  v:
    supply: a
    needs: { voltage: 5 V, ripple: 0 V }
    #                              ^^^ bad-quantity: must be greater
    loads: { x: -1 mA, y: 47, z: { current: 3 V } }
    #           ^^^^^ bad-quantity: Write the magnitude
    #                     ^^ wrong-unit: a current, a resistance or a power
    #                                         ^ wrong-unit
  w:
    pump: { topology: doubler, input: v, drive: t, diode: silicon-a, flying: -1 uF, reservoir: 0 uF, stages: 1.5 }
    #                                                                        ^^^^^ bad-quantity: \`flying\` must be greater than 0 F
    #                                                                                          ^^^^ bad-quantity
    #                                                                                                        ^^^ bad-quantity: whole number
`,
    { ignore: ['not-computed', 'assumed'] },
  );
});

test('expressions with a comma in a flow map say how to write them', () => {
  const { findings } = checkFindings(
    'supplies: { a: { current: = max(1 mA, 2 mA), voltage: 5 V } }\nrails: {}\n',
    {
      ignore: ['unknown-key', 'missing-key', 'bad-quantity', 'syntax'],
    },
  );
  expect(
    findings.some(({ message }) => message.includes('an expression with a comma stands in quotes')),
  ).toBe(true);
});

test('a refused figure is absent from the board, never zero', () => {
  const { board } = checkFindings(`
supplies: { a: { voltage: 5 mA } }
#                           ^^ wrong-unit
rails: {}
`);
  expect(board.supplies.get('a')).toBeDefined();
  expect('voltage' in board.supplies.get('a')!).toBe(false);
});
