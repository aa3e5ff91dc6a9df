/**
 * The search against every design of a reduced grid; the benchmark does the same for forty problems.
 */
import { describe, expect, it } from 'vitest';
import { cheapestDesign, gridBoard } from '../../support/cheapest-design';
import { sizeOf } from '../../support/size-of';

describe('the search finds what all designs together hold', () => {
  it.each([
    ['{ voltage: 7.5..10.5 V, ripple: 20 mV }', '3 mA'],
    ['{ voltage: 8.5..10.5 V }', '1 mA'],
    ['{ voltage: -5..-3 V, ripple: 10 mV }', '2 mA'],
    ['{ voltage: 8.9..10.5 V, ripple: 2 mV }', '1 mA'],
  ])('for %s at %s', (needs, amps) => {
    const text = gridBoard(needs, amps);
    const all = cheapestDesign(text);
    const [first] = sizeOf(text, 'up').result.choices;
    expect(first && [first.partCount, Number(first.capacitance.toPrecision(6))]).toEqual(
      all && [all[0], Number(all[1].toPrecision(6))],
    );
  });
});
