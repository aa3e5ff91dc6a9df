import { describe, expect, it } from 'vitest';
import { analyse, pumpRails, railAt } from '../../../core/index';
import { bench } from '../../support/bench-board';

const text = `${bench}
  up:
    pump: { topology: doubler, input: v5, drive: tick, diode: schottky-signal, flying: 1 uF, reservoir: 10 uF }
    loads: { lamp: 2 mA }
  broken:
    pump: { topology: doubler, input: v5 }
`;
const analysis = analyse(text, { file: 'rails.yaml' });

describe('finding rails', () => {
  it('lists pump rails with what they reach, in the order of the file', () => {
    const rails = pumpRails(analysis);
    expect(rails.map(({ name }) => name)).toEqual(['up', 'broken']);
    expect(rails[0]?.detail).toMatch(/^doubler, 9\.\d+\.\.9\.\d+\.\.9\.\d+ V$/);
    expect(text.slice(rails[0]?.span.start, rails[0]?.span.end)).toBe('up');
  });

  it('knows the rail around an offset', () => {
    expect(railAt(analysis, text.indexOf('up:'))).toBe('up');
    expect(railAt(analysis, text.indexOf('2 mA') + 1)).toBe('up');
    expect(railAt(analysis, text.indexOf('{ supply: lab }'))).toBe('v5');
    expect(railAt(analysis, text.indexOf('supplies'))).toBeUndefined();
  });
});
