import { describe, expect, it } from 'vitest';
import { useBar, windowStrip } from '../../../core/report/bar';
import { colourPalette } from '../../../core/report/paint';
import { tableLines } from '../../../core/report/table';

const plain = (text: string) => text;

describe('terminal table', () => {
  const columns = [
    { head: 'rail', align: 'left' },
    { head: 'V', align: 'right' },
    { head: 'never', align: 'left' },
    { head: 'from', align: 'left', spare: 1 },
    { head: 'strip', align: 'left', spare: 2 },
  ] as const;
  const rows = [
    [{ text: 'v5' }, { text: '5.00' }, { text: '' }, { text: 'supply lab' }, { text: '..|..' }],
    [{ text: 'vµΩ' }, { text: '-12.0' }, { text: '' }, { text: 'pump' }, { text: '|' }],
  ];

  it('aligns, and leaves out columns without content', () => {
    expect(tableLines(columns, rows, plain, 100)).toEqual([
      '  rail      V  from        strip',
      '  v5     5.00  supply lab  ..|..',
      '  vµΩ   -12.0  pump        |',
    ]);
  });

  it('drops what it can spare until it fits, and no more', () => {
    expect(tableLines(columns, rows, plain, 27)[0]).toBe('  rail      V  from');
    expect(tableLines(columns, rows, plain, 15)[0]).toBe('  rail      V');
    expect(tableLines(columns, rows, plain, 5)[0]).toBe('  rail      V');
  });

  it('paints words, not the blanks between them', () => {
    const painted = tableLines(
      [{ head: 'a', align: 'right' }],
      [[{ text: 'x', paint: colourPalette.bad }], [{ text: 'long' }]],
      plain,
      80,
    );
    expect(painted[1]).toBe('     \u001b[31mx\u001b[0m');
  });
});

describe('bars', () => {
  it('fills in proportion and marks what is beyond', () => {
    expect(useBar(0)).toBe('░░░░░░░░░░');
    expect(useBar(0.5)).toBe('█████░░░░░');
    expect(useBar(1)).toBe('██████████');
    expect(useBar(1.2)).toBe('█████████▶');
  });

  it('shows a rail inside, across and outside of its window', () => {
    const window = { min: 4, typical: 5, max: 6 };
    expect(windowStrip(window, { min: 4.6, typical: 5, max: 5.4 }, 13)).toBe('···[·─●─·]···'.slice(0, 13));
    expect(windowStrip(window, { min: 3.5, typical: 3.6, max: 4.5 }, 13)).toMatch(/^··?●/);
    expect(windowStrip(window, { min: 20, typical: 21, max: 22 }, 13)).toBe('···[·····]··●');
    expect(windowStrip({ min: -6, typical: -5, max: -4 }, { min: -9, typical: -8, max: -7.5 }, 13)).toMatch(
      /^●··\[/,
    );
  });
});
