/**
 * A memory changes the work, never the numbers.
 */
import { describe, expect, it } from 'vitest';
import { analyse, newMemory } from '../../../core/index';

/** Pumps side by side on one supply that gives way, and one that stands on the first of them. */
function board(count: number, first = '1 uF', extra = '', resistance = '0.1 mohm'): string {
  const pump = (input: string, k: number, flying: string) =>
    `  r${k}:\n    pump: { topology: doubler, input: ${input}, drive: c, diode: schottky-signal, flying: ${flying}, reservoir: 10 uF }\n    loads: { x: ${(1 + k / 10).toFixed(1)} mA }\n`;
  const rails = Array.from({ length: count }, (_, k) => pump('v5', k, k === 0 ? first : '1 uF'));
  return `supplies: { lab: { voltage: 4.8..5.2 V, resistance: ${resistance} } }
parts: { chips: { plain: { pins: { high-resistance: 20..30 ohm, low-resistance: 20 ohm } } } }
chips: { mcu: { part: plain, rail: v5 } }
clocks: { c: { pin: mcu.P1, frequency: 100 kHz, duty: 50 % } }
rails:
  v5: { supply: lab }
${rails.join('')}${pump('r0', count, '1 uF')}${extra}`;
}

describe('a memory', () => {
  it('solves each pump once, and after an edit only what the edit reaches', () => {
    const memory = newMemory();
    analyse(board(12), { file: 'rails.yaml', memory });
    const edited = analyse(board(12, '2.2 uF'), { file: 'rails.yaml', memory });
    // The edited pump and the one that stands on it; each may take a second round when its own load settles.
    expect(memory.solved).toBeGreaterThanOrEqual(2);
    expect(memory.solved).toBeLessThanOrEqual(4);
    expect(edited.report).toEqual(analyse(board(12, '2.2 uF'), { file: 'rails.yaml' }).report);
  });

  it('solves nothing for an edit of words, needs or places', () => {
    const memory = newMemory();
    analyse(board(3), { file: 'rails.yaml', memory });
    const text = `# a comment moves everything down\n${board(3, '1 uF', '    needs: { voltage: 30..40 V }\n')}`;
    const { findings } = analyse(text, { file: 'rails.yaml', memory });
    expect(memory.solved).toBe(0);
    const low = findings.find(({ code }) => code === 'rail-low');
    expect(text.slice(low!.span.start, low!.span.end)).toBe('30..40 V');
  });

  it('forgets pumps that nobody has asked for in a while', () => {
    const memory = newMemory();
    analyse(board(20), { file: 'rails.yaml', memory });
    const most = memory.size;
    for (let k = 0; k < 20; k++) analyse(board(1), { file: 'rails.yaml', memory });
    expect(memory.size).toBeLessThan(most / 2);
  });

  it('the work of a board grows with its rails, not with their square', () => {
    const solved = (count: number) => {
      const memory = newMemory();
      // Soft enough for a second round on either board.
      analyse(board(count, '1 uF', '', '50 mohm'), { file: 'rails.yaml', memory });
      return memory.solved;
    };
    const [few, many] = [solved(20), solved(80)];
    expect(many / few).toBeLessThan(4.8);
  });
});
