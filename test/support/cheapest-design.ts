/**
 * Sizing problems on a reduced grid, and the cheapest design of the whole grid, each solved at its corners and judged by
 * all rules.
 */
import { railVoltages } from '../../core/analysis/rail-voltages';
import { catalogue } from '../../core/catalog';
import { analyse, applyEdits } from '../../core/index';
import { readBoard } from '../../core/model/build';
import { type Design, partCount, totalCapacitance } from '../../core/sizing/design';
import { designEdits } from '../../core/sizing/edits';
import { framesOf } from '../../core/sizing/frames';
import { targetOf } from '../../core/sizing/size';

const values = [47e-9, 220e-9, 1e-6, 4.7e-6];
/** `loads` is one current. */
export const gridBoard = (needs: string, amps: string) => `
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
export function cheapestDesign(text: string): readonly [number, number] | undefined {
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
