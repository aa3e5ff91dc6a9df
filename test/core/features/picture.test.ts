import { describe, expect, it } from 'vitest';
import { inks } from '../../../core/features/picture/inks';
import type { Theme } from '../../../core/index';
import { bench } from '../../support/bench-board';
import { hoverAt } from '../../support/hover-at';

const themes: readonly Theme[] = ['light', 'dark', 'high-contrast', 'high-contrast-light'];

const parts =
  'drive: tick, diode: schottky-signal, flying: { value: 1 uF, kind: x7r }, reservoir: { value: 10 uF, kind: x7r }';
const board = (name: string, topology: string, needs: string) =>
  `${bench}
  $0${name}:
    pump: { topology: ${topology}, ${parts} }
    needs: { voltage: ${needs} }
    loads: { lamp: 2 mA }
`;

/** Relative luminance and contrast ratio: WCAG 2.1, definitions of the same names. */
function contrast(a: string, b: string): number {
  const [high = 0, low = 0] = [luminance(a), luminance(b)].sort((x, y) => y - x);
  return (high + 0.05) / (low + 0.05);
}

function luminance(colour: string): number {
  const [r = 0, g = 0, b = 0] = [1, 3, 5].map((at) => {
    const share = Number.parseInt(colour.slice(at, at + 2), 16) / 255;
    return share <= 0.04045 ? share / 12.92 : ((share + 0.055) / 1.055) ** 2.4;
  });
  return 0.2126 * r + 0.7152 * g + 0.0722 * b;
}

/** Hover backgrounds of the editor's own themes. */
const backgrounds: Readonly<Record<Theme, string>> = {
  light: '#f3f3f3',
  dark: '#252526',
  'high-contrast': '#000000',
  'high-contrast-light': '#ffffff',
};

describe('picture of where the volts go', () => {
  it('is small, well formed and says in words what it shows', () => {
    const card = hoverAt(board('up', 'doubler, input: v5', '8..10 V'))?.card;
    for (const theme of themes) {
      const picture = card?.picture?.(theme);
      expect(picture?.svg.length).toBeLessThan(10_000);
      expect(picture?.svg).toMatch(/^<svg xmlns="http:\/\/www\.w3\.org\/2000\/svg" .*<\/svg>$/s);
      expect(picture?.alternative).toMatch(/^up: ideal 10\.00 V, .*output 9\.\d\d V; needs 8\.\.10 V$/);
    }
  });

  it('lets the losses add up from the ideal voltage to the output', () => {
    const words =
      hoverAt(board('up', 'doubler, input: v5', '8..10 V'))?.card.picture?.('dark').alternative ?? '';
    const volts = [...words.split(';')[0]!.matchAll(/([−+]?)([\d.]+) V/g)].map(
      ([, sign, size]) => (sign === '−' ? -1 : 1) * Number(size),
    );
    const output = volts.pop() ?? Number.NaN;
    // Each figure is rounded to 10 mV.
    expect(Math.abs(volts.reduce((sum, value) => sum + value, 0) - output)).toBeLessThanOrEqual(
      0.005 * (volts.length + 1),
    );
  });

  it('keeps the sign of a negative rail', () => {
    const words = hoverAt(board('down', 'inverter', '-5.1..-3 V'))?.card.picture?.('light').alternative;
    expect(words).toMatch(/ideal −5\.00 V, .*diodes \+\d\.\d\d V, .*output −4\.\d\d V/);
  });

  it('escapes names from the file', () => {
    const svg = hoverAt(board('\'a<b&"c"\'', 'doubler, input: v5', '8..10 V'))?.card.picture?.('dark').svg;
    expect(svg).toContain('<title>a&lt;b&amp;&quot;c&quot;: where the volts go</title>');
  });

  it('keeps the contrast that WCAG 2.1 asks for: 4.5 for text (1.4.3), 3 for lines and fills (1.4.11)', () => {
    for (const theme of themes) {
      const ink = inks[theme];
      for (const colour of [ink.text, ink.faint, ink.need])
        expect(contrast(colour, backgrounds[theme]), `${theme} ${colour}`).toBeGreaterThanOrEqual(4.5);
      for (const colour of [ink.output, ink.loss])
        expect(contrast(colour, backgrounds[theme]), `${theme} ${colour}`).toBeGreaterThanOrEqual(3);
    }
  });
});
