import { describe, expect, it } from 'vitest';
import { analyse, hoverCard } from '../../../core/index';
import { bench } from '../../support/bench-board';

const text = `${bench}
  up:
    pump: { topology: doubler, input: v5, drive: tick, diode: schottky-signal, flying: { value: 1 uF, kind: x7r, rated: 10 V }, reservoir: { value: 10 uF, kind: aluminium, rated: 16 V } }
    loads: { x: 2 mA }
  two:
    pump: { topology: ladder, stages: 2, input: v5, drive: tick, diode: schottky-signal, flying: 1 uF, reservoir: 10 uF }
    loads: { x: 0.1 mA }
`;
const analysis = analyse(text, { file: 'rails.yaml' });
const at = (words: string, inside = 0) => hoverCard(analysis, text.indexOf(words) + inside)!;

describe('the card of a capacitor', () => {
  it('tells what direct voltage leaves of it, on the key in front', () => {
    const card = at('flying: { value');
    expect(card.title).toBe('up.flying[0] · Ceramic, class 2, X7R');
    // Half is lost at 0.9 of the rating: 1 / (1 + (4.6 / 9)^2) is 79 % at the 4.6 V across it.
    expect(card.answer).toMatch(/^Works as 79\d nF, (79|80) % of its value\.$/);
    expect(card.rows[0]).toHaveLength(5);
    expect(text.slice(card.span.start, card.span.end)).toBe('flying');
  });
  it('tells which terminal is the positive one', () => {
    const card = at('reservoir: { value');
    expect(card.answer).toMatch(/whole 10 µF; positive terminal at the rail\.$/);
    expect(card.origins.join(' ')).toMatch(/reversed/);
    expect(card.state).toBe('good');
  });
  it('shows all places that a bare value stands for', () => {
    const card = at('flying: 1 uF', 8);
    expect(card.title).toBe('two.flying[0] to two.smoothing[1] · Ceramic, class 2, X7R');
    expect(card.rows.map(([name]) => name)).toEqual([
      'flying[0]',
      'flying[1]',
      'smoothing[0]',
      'smoothing[1]',
    ]);
    expect(card.origins[0]).toMatch(/No rated voltage/);
  });
});
