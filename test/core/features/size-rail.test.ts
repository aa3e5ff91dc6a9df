import { describe, expect, it } from 'vitest';
import { analyse, applyEdits, sizeRail } from '../../../core/index';

/** A doubler on a pin with everything around it; `pump` and `needs` are what a test is about. */
function board(pump: string, needs: string): string {
  return `board: Bench
supplies: { usb: { voltage: 4.9..5.1 V } }
chips:
  mcu: { part: atmega328p, rail: v5, draws: 5 mA, pins: { PD6: {} } }
clocks:
  tick: { pin: mcu.PD6, frequency: 20 kHz, duty: 50 % }
rails:
  v5: { supply: usb }
  v8:
    pump:
      topology: doubler   # from the drawer
      input: v5
      drive: tick
      diode: schottky-signal
${pump}
    needs: ${needs}
    loads: { amplifier: 1 mA }
`;
}

const file = { file: 'rails.yaml' };

/** The lines that sizing changes, as they are afterwards; or the reason why it changes none. */
function sized(text: string, rail = 'v8'): string {
  const result = sizeRail(analyse(text, file), rail);
  if (!result.ok) return result.reason;
  const before = text.split('\n');
  const after = applyEdits(text, result.edits).split('\n');
  expect(after).toHaveLength(before.length);
  return after.filter((line, n) => line !== before[n]).join('\n');
}

/** Codes of errors and warnings about the rail after the edits. */
function complaints(text: string): string[] {
  const result = sizeRail(analyse(text, file), 'v8');
  if (!result.ok) throw new Error(result.reason);
  return analyse(applyEdits(text, result.edits), file)
    .findings.filter((f) => f.severity !== 'information' && f.at.startsWith('rails.v8'))
    .map((f) => f.code);
}

describe('size this rail', () => {
  const small = board(
    '      flying: { value: 10 nF, kind: x7r }  # too small\n      reservoir: 100 nF # and this',
    '{ voltage: 8.4..10.5 V, ripple: 5 mV }',
  );

  it('writes preferred values, keeps comments and layout, and leaves nothing to complain about', () => {
    const lines = sized(small).split('\n');
    expect(lines).toHaveLength(2);
    expect(lines[0]).toMatch(/^ {6}flying: \{ value: [\d.]+ [nu]F, kind: x7r \} {2}# too small$/);
    expect(lines[1]).toMatch(/^ {6}reservoir: [\d.]+ uF # and this$/);
    expect(complaints(small)).toEqual([]);
  });

  it('finds the smallest: one E6 step less of either misses a need', () => {
    // Outside arithmetic: no flying capacitor below I / (f * drop) can do it, since 1/(f C) is the least resistance
    // (M. D. Seeman, S. R. Sanders, IEEE Trans. Power Electronics 23(2), 2008; from memory).
    const text = sized(small);
    const flying = /value: ([\d.]+) ([nu])F/.exec(text)!;
    const farads = Number(flying[1]) * (flying[2] === 'n' ? 1e-9 : 1e-6);
    const mostDrop = 2 * 5.1 - 8.4;
    expect(farads).toBeGreaterThan(1e-3 / (20e3 * mostDrop));
    for (const [pattern, smaller] of [
      [/value: [\d.]+ [nu]F/, (v: number) => v / 1.5],
      [/reservoir: [\d.]+ uF/, (v: number) => v / 1.5],
    ] as const) {
      const result = sizeRail(analyse(small, file), 'v8');
      if (!result.ok) throw new Error(result.reason);
      const done = applyEdits(small, result.edits);
      const lessened = done.replace(pattern, (found) =>
        found.replace(/[\d.]+/, (number) => String(smaller(Number(number)))),
      );
      const codes = analyse(lessened, file)
        .findings.filter((f) => f.severity !== 'information')
        .map((f) => f.code);
      expect(codes.length, lessened).toBeGreaterThan(0);
    }
  });

  it('keeps the spelling of micro and a tolerance behind the value', () => {
    const text = board('      flying: 0.01 µF ±10 %\n      reservoir: 10 µF', '{ voltage: 8.4..10.5 V }');
    expect(sized(text)).toMatch(/flying: [\d.]+ (n|µ)F ±10 %/);
  });

  it('does not shrink the reservoir when no ripple is asked for', () => {
    const text = board('      flying: 10 nF\n      reservoir: 10 uF', '{ voltage: 8.4..10.5 V }');
    expect(sized(text)).not.toContain('reservoir');
  });

  it('says which limit stops it', () => {
    const text = board('      flying: 1 uF\n      reservoir: 10 uF', '{ voltage: 9.6..10.5 V }');
    expect(sized(text)).toMatch(/No E6 pair .* short .* fast limit.* diode drops/);
  });

  it('says so when the rail is fine, is no pump, has no needs, or is not there', () => {
    const fine = board('      flying: 10 uF\n      reservoir: 10 uF', '{ voltage: 8..10.5 V }');
    expect(sized(fine)).toMatch(/meets its needs at every corner as it is/);
    expect(sized(fine, 'v5')).toMatch(/not made by a pump/);
    expect(sized(fine, 'v9')).toMatch(/no rail named v9/);
    expect(sized(board('      flying: 1 uF\n      reservoir: 1 uF', '{}'))).toMatch(/no needs to size for/);
  });
});
