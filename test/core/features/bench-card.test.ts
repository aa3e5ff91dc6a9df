import { describe, expect, it } from 'vitest';
import { bench } from '../../support/bench-board';
import { hoverAt } from '../../support/hover-at';

const text = (entry: string) => `${bench}  up:
    pump: { topology: doubler, input: v5, drive: tick, diode: schottky-signal, flying: { value: 22 nF +-20 %, kind: film }, reservoir: { value: 10 uF +-10 %, kind: film, esr: 5 mohm } }
    loads: { lamp: 5 mA }
bench:
  - { rail: up, ${entry}, note: 'board 3, bench meter' }
`;

describe('hover on a bench entry', () => {
  it('answers with the deviation and the band, and says what would explain it', () => {
    const card = hoverAt(text('load: 1 mA, voltage: $09.0 V'));
    expect(card?.over).toMatch(/^\{ rail: up, .*bench meter' \}$/);
    expect(card?.title).toBe('bench[0] · up with 1 mA');
    expect(card?.answer).toMatch(/^9 V at 1 mA, \d+ mV below prediction, inside the band\.$/);
    expect(card?.state).toBe('good');
    expect(card?.body).toMatch(
      /^ \| measured \| lowest \| predicted \| highest \| off \| \nvoltage \| 9 V \| /,
    );
    expect(card?.body).toMatch(
      /Within tolerance this would explain the voltage: flying capacitor at 19\.\d nF instead of 22 nF/,
    );
    expect(card?.body).toContain('Note: board 3, bench meter');
    expect(card?.body).toContain('in place of all loads of up');
  });

  it('turns bad outside the band, with the usual causes', () => {
    const card = hoverAt(text('load: 1 mA$0, voltage: 8.2 V, ripple: 9 mV'));
    expect(card?.state).toBe('bad');
    expect(card?.answer).toMatch(/0\.\d+ V outside the band; ripple 9 mV, \d\.\d mV above prediction, /);
    expect(card?.body).toContain('Usual for such a voltage (common practice): a flying capacitor');
    expect(card?.body).toContain('Usual for such a ripple (common practice): a long ground lead');
    expect(card?.body).toContain('One quantity alone would explain the voltage: ');
  });

  it('says why nothing is compared', () => {
    const card = hoverAt(text('load: 1 mA, voltage: $09 V').replace('topology: doubler', 'topology: ladder'));
    expect(card?.state).toBe('neutral');
    expect(card?.answer).toMatch(/^9 V at 1 mA, not compared: /);
  });

  it('leaves keys and the name of the rail to their own cards', () => {
    expect(hoverAt(text('load: 1 mA, vol$0tage: 9 V'))?.answer).toBe('Measured voltage.');
    expect(hoverAt(text('load: 1 mA, voltage: 9 V').replace('rail: up', 'rail: $0up'))?.title).toMatch(
      /^up · doubler/,
    );
  });

  it('shows in the card of the rail', () => {
    const card = hoverAt(text('load: 1 mA, voltage: 9.02 V').replace('up:', '$0up:'));
    expect(card?.body).toMatch(/^Bench: 9\.02 V at 1 mA, \d+ mV below prediction, inside the band\.$/m);
  });
});
