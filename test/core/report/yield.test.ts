import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { yieldMarkdown, yieldText } from '../../../core/index';
import { sharePercent } from '../../../core/report/yield-words';
import { yieldOf } from '../../support/yield-of';

const demo = readFileSync(new URL('../../../media/demo/rails.yaml', import.meta.url), 'utf8');
const result = yieldOf(demo, { samples: 100 });
const text = (width = 120, colour = false) => yieldText(result, { colour, width });

describe('the yield as text', () => {
  it('has the board, its rails, quantiles of voltage and ripple, and what moves them', () => {
    const lines = text().split('\n');
    expect(lines[0]).toBe('Yield of River level gauge, rev B  rails.yaml');
    expect(lines[2]).toMatch(
      /^0 % of the boards meet every need \(0 of 100; 95 % confidence: 0\.\.3\.7 %\)\.$/,
    );
    const heads = lines.filter((line) => /^[A-Z]/.test(line)).slice(1);
    expect(heads).toEqual([
      'Rails',
      'Voltage, V',
      'Ripple, mV',
      'What the voltage goes with (correlation)',
      'How sure',
    ]);
    expect(lines.find((line) => line.includes('✓  vamp'))).toMatch(
      /100 % .* \d\.\d{3} V measure \(no\. \d+\)/,
    );
    expect(lines.find((line) => line.includes('✗  vhorn'))).toMatch(/ 0 % .* 100 /);
    // A row for each rail and mode, its figures in rising order.
    const rows = lines.filter((line) => /^ {2}v\w+ +(sleep|measure) /.test(line));
    expect(rows).toHaveLength(12);
    for (const row of rows.slice(0, 6)) {
      const figures = row.trim().split(/ +/).slice(2).map(Number);
      expect(figures).toHaveLength(7);
      expect([...figures].sort((a, b) => a - b)).toEqual(figures);
    }
    expect(text()).toMatch(/ {2}vamp: v5 regulator output \(\+0\.\d\d\)/);
  });

  it('keeps its tables within 80 columns', () => {
    const tables = text(80).split('What the voltage')[0] ?? '';
    for (const line of tables.split('\n').slice(4)) expect([...line].length, line).toBeLessThanOrEqual(80);
  });

  it('differs in colour by colour codes only', () => {
    const coloured = text(120, true);
    expect(coloured).toContain('\u001b[31m');
    // biome-ignore lint/suspicious/noControlCharactersInRegex: the codes are what is looked for
    expect(coloured.replace(/\u001b\[\d+m/g, '')).toBe(text());
  });
});

describe('the yield as Markdown', () => {
  it('has the same figures in tables', () => {
    const page = yieldMarkdown(result);
    const rows = page.split('\n').filter((line) => line.startsWith('| v'));
    expect(rows).toHaveLength(3 + 6 + 6);
    const plain = text().split('\n');
    for (const row of rows) {
      const cells = row
        .slice(2, -2)
        .split(' | ')
        .filter((cell) => cell !== '')
        .map((cell) => cell.replace(/\\/g, ''));
      expect(
        plain.some((line) => cells.every((cell) => line.includes(cell))),
        row,
      ).toBe(true);
    }
  });

  it('shows words of the file as they are', () => {
    const page = yieldMarkdown(
      yieldOf(
        'board: "[a](http://b) *c* | <d>"\nsupplies: { a: { voltage: 5 V } }\nrails: { x_y: { supply: a, needs: { voltage: 4 V } } }',
      ),
    );
    expect(page.split('\n')[0]).toBe('# Yield of \\[a\\](http://b) \\*c\\* \\| \\<d\\>');
    expect(page).toContain('| x\\_y | 100 % |');
  });
});

describe('percent of samples', () => {
  it('is 100 or 0 only where every sample is', () => {
    for (const samples of [7, 100, 1000, 9999, 123_456]) {
      expect(sharePercent(1, samples, 'near')).toBe('100 %');
      expect(sharePercent(0, samples, 'near')).toBe('0 %');
      expect(sharePercent((samples - 1) / samples, samples, 'near')).not.toBe('100 %');
      expect(sharePercent(1 / samples, samples, 'near')).not.toBe('0 %');
    }
  });

  it('rounds bounds outward', () => {
    expect(sharePercent(0.97349, 1000, 'down')).toBe('97.3 %');
    expect(sharePercent(0.97341, 1000, 'up')).toBe('97.4 %');
    expect(sharePercent(0.973, 1000, 'down')).toBe('97.3 %');
    expect(sharePercent(0.973, 1000, 'up')).toBe('97.3 %');
  });
});
