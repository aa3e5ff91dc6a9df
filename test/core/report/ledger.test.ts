import { describe, expect, it } from 'vitest';
import { analyse, ledgerText } from '../../../core/index';
import { bench } from '../../support/bench-board';

const parts =
  'drive: tick, diode: schottky-signal, flying: { value: 1 uF, kind: x7r }, reservoir: { value: 10 uF, kind: x7r }';
const board = `board: Bench lamp
${bench}
  up:
    pump: { topology: doubler, input: v5, ${parts} }
    needs: { voltage: 9.5..10 V }
    loads: { lamp: 2 mA }
  fine:
    pump: { topology: inverter, ${parts} }
    needs: { voltage: -5..-3 V }
    loads: { bias: 1 mA }
`;

function ledger(text: string, width = 120, colour = false): string {
  return ledgerText(analyse(text, { file: 'lamp/rails.yaml' }), { colour, width });
}

describe('ledger', () => {
  it('prints rails, pins, supplies, findings and a sum', () => {
    const lines = ledger(board).split('\n');
    expect(lines[0]).toBe('Bench lamp  lamp/rails.yaml');
    const heads = lines.filter((line) => /^[A-Z]\w+$/.test(line));
    expect(heads).toEqual(['Rails', 'Pins', 'Supplies', 'Findings']);
    expect(lines.find((line) => line.includes('✗  up'))).toMatch(/9\.5\.\.10 .*2 mA .*doubler on v5$/);
    expect(lines.find((line) => line.includes('✓  fine'))).toMatch(/-4\.\d\d/);
    expect(lines.find((line) => /^ {2}mcu\.P1/.test(line))).toMatch(/3 mA +3 mA .*up, fine$/);
    expect(lines.find((line) => /^ {2}lab/.test(line))).toContain('5 V');
    expect(lines.at(-2)).toMatch(/^1 error, 3 notes\.$/);
  });

  it('writes a finding as file:line:column severity code message, on one line', () => {
    const finding = ledger(board)
      .split('\n')
      .find((line) => line.includes(' error '));
    const line = board.split('\n').findIndex((row) => row.includes('9.5..10 V')) + 1;
    expect(finding).toMatch(
      new RegExp(`^lamp/rails\\.yaml:${line}:23 error rail-low up reaches only 9\\.\\d+ V`),
    );
  });

  it('keeps its tables within 100 and, without what it can spare, within 80 columns', () => {
    for (const width of [100, 80]) {
      const tables = ledger(board, width).split('Findings')[0] ?? '';
      for (const line of tables.split('\n')) expect([...line].length, line).toBeLessThanOrEqual(width);
    }
  });

  it('differs in colour by colour codes only', () => {
    const coloured = ledger(board, 120, true);
    expect(coloured).toContain('\u001b[31m');
    // biome-ignore lint/suspicious/noControlCharactersInRegex: the codes are what is looked for
    expect(coloured.replace(/\u001b\[\d+m/g, '')).toBe(ledger(board, 120, false));
  });

  it('says why a rail has no voltage, and that nothing was found', () => {
    expect(ledger(board.replace('topology: doubler', 'topology: ladder'))).toMatch(
      / {2}up is not computed: /,
    );
    expect(
      ledger(
        'supplies: { lab: { voltage: 5 V, current: 1 A } }\nrails: { v5: { supply: lab, loads: { x: 1 mA } } }\n',
      ),
    ).toMatch(/No findings\.\n$/);
  });

  it('prints something for a text that is no board', () => {
    expect(ledger('')).toContain('lamp/rails.yaml');
    expect(ledger('{')).toContain('syntax');
  });

  it('says how long a battery lasts, until what, and whose capacity that is', () => {
    const text = `supplies: { cell: { battery: lithium-coin, capacity: 220 mAh, life: 100 d } }
rails: { vb: { supply: cell, loads: { radio: { current: 10 mA, in: [send] }, clock: { current: 5 uA, in: [wait] } } } }
modes: { send: { share: 1 % }, wait: { share: 99 % } }
`;
    const lines = ledger(text, 80).split('\n');
    const at = lines.findIndex((line) => line.startsWith('  cell lasts'));
    // Charge balance by hand, 104.95 uA and 220 mAh * 0.85: 74.2 days, less what 10 mA leave behind at the end.
    expect(lines[at]).toMatch(/^ {2}cell lasts 7[0-4]\.\d days, \d\d\.\d days at worst, 100 days needed$/);
    expect(lines[at + 1]).toMatch(/^ {4}until it falls to 2 V under the load of mode send, [\d.]+ % of its/);
    expect(lines[at + 2]).toBe('    220 mAh of the file, 85 % of it counted on');
    expect(ledger(text.replace('capacity: 220 mAh, ', ''))).toContain('220 mAh of the catalogue');
    for (const line of lines.slice(at, at + 3)) expect(line.length).toBeLessThanOrEqual(80);
  });

  it('says why the life of a battery is not computed', () => {
    expect(
      ledger('supplies: { cell: { voltage: 3 V, capacity: 1 Ah } }\nrails: { vb: { supply: cell } }\n'),
    ).toContain('  how long cell lasts is not computed: nothing draws from cell');
  });
});
