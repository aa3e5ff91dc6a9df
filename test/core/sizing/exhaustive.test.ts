/**
 * The search against every design of a reduced grid, each solved at its corners and judged by all rules.
 */
import { describe, expect, it } from 'vitest';
import { railVoltages } from '../../../core/analysis/rail-voltages';
import { catalogue } from '../../../core/catalog';
import { analyse, applyEdits } from '../../../core/index';
import { readBoard } from '../../../core/model/build';
import { type Design, partCount, totalCapacitance } from '../../../core/sizing/design';
import { designEdits } from '../../../core/sizing/edits';
import { framesOf } from '../../../core/sizing/frames';
import { targetOf } from '../../../core/sizing/size';
import { sizeOf } from '../../support/size-of';

const values = [47e-9, 220e-9, 1e-6, 4.7e-6];
const board = (needs: string, amps: string) => `
supplies: { lab: { voltage: 4.8..5.2 V } }
chips: { mcu: { part: atmega328p, rail: v5, draws: 10 mA } }
stock: { capacitors: [47 nF, 220 nF, 1 uF, 4.7 uF], kinds: [film], rated: [63 V], diodes: [schottky-signal], frequencies: [100 kHz], stages: 2 }
rails:
  v5: { supply: lab }
  up:
    needs: ${needs}
    loads: { x: ${amps} }
`;

/** Parts and capacitance of the cheapest design of the grid that raises nothing; undefined when there is none. */
function cheapest(text: string): readonly [number, number] | undefined {
  const { board: plain } = readBoard(text, catalogue);
  const rail = plain.rails.get('up')!;
  const frames = framesOf(plain, rail, railVoltages(plain), catalogue, targetOf(rail)!);
  const film = catalogue.capacitors.find(({ key }) => key === 'film')!;
  let best: readonly [number, number] | undefined;
  for (const frame of frames) {
    if (best && partCount(frame) > best[0]) break;
    for (const flying of values)
      for (const reservoir of values.filter((farads) => rail.needs?.ripple || farads >= 1e-6)) {
        const plan = (farads: number) => ({ farads, kind: film, rated: 63 });
        const design: Design = { ...frame, flying: plan(flying), reservoir: plan(reservoir) };
        const edits = designEdits(text, rail, design);
        if (!edits) continue;
        const { findings } = analyse(applyEdits(text, edits), { file: 'rails.yaml' });
        if (findings.some(({ severity }) => severity !== 'information')) continue;
        const cost = [partCount(design), totalCapacitance(design)] as const;
        if (!best || cost[0] < best[0] || (cost[0] === best[0] && cost[1] < best[1])) best = cost;
      }
  }
  return best;
}

describe('the search finds what all designs together hold', () => {
  it.each([
    ['{ voltage: 7.5..10.5 V, ripple: 20 mV }', '3 mA'],
    ['{ voltage: 8.5..10.5 V }', '1 mA'],
    ['{ voltage: -5..-3 V, ripple: 10 mV }', '2 mA'],
    ['{ voltage: 8.9..10.5 V, ripple: 2 mV }', '1 mA'],
    ['{ voltage: 8..10.5 V, ripple: 50 mV }', '8 mA'],
  ])('for %s at %s', (needs, amps) => {
    const text = board(needs, amps);
    const all = cheapest(text);
    const [first] = sizeOf(text, 'up').result.choices;
    expect(first && [first.partCount, Number(first.capacitance.toPrecision(6))]).toEqual(
      all && [all[0], Number(all[1].toPrecision(6))],
    );
  });
});
