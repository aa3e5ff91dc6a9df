/**
 * From the rail that a bench entry names to its model: a pump, a filter, a supply behind its resistance, a regulator.
 */
import type { BenchPoint, Board, Rail } from '../model/board';
import { exactly, type Figure } from '../quantity/figure';
import { filterModel } from './bench-filter';
import { type BenchModel, type BenchSite, plainModel, variable } from './bench-model';
import { benchLoad, pumpModel } from './bench-pump';
import { type Gap, isGap } from './gap';
import type { RailVoltages } from './rail-voltages';
import { regulatedVoltage } from './regulators';
import { supplyResistance, supplyVoltage } from './supply-voltage';

export function benchModel(site: BenchSite, rail: Rail, point: BenchPoint, load: Figure): BenchModel | Gap {
  const { origin } = rail;
  switch (origin?.kind) {
    case 'pump':
      return pumpModel(site, rail, origin.pump, [benchLoad(point, load)], () => exactly(0));
    case 'filter':
      return filterModel(site, rail, origin.filter, point, load);
    case 'supply':
      return supplyModel(site.board, origin.supply.name, point, load);
    default:
      return heldModel(site.solved, rail);
  }
}

/** Ohm's law behind the source resistance; a current that the supply cannot give leaves nothing. */
function supplyModel(board: Board, name: string, point: BenchPoint, load: Figure): BenchModel | Gap {
  const supply = board.supplies.get(name);
  const open = supply && supplyVoltage(supply);
  if (!open) return { because: `the voltage of ${name} is not known` };
  const ohms = supplyResistance(supply);
  const at = (key: string) => (supply.keys.has(key) ? `${supply.path}.${key}` : supply.path);
  const variables = [variable(`supply ${name} voltage`, at('voltage'), 'V', open)];
  if (ohms) {
    variables.push(variable(`supply ${name} resistance`, at('resistance'), 'ohm', ohms));
    variables.push(variable('load on the bench', `${point.path}.load`, load.unit, load));
  }
  return plainModel(variables, ([volts = 0, source = 0, drawn = 0]) => {
    if (load.unit === 'ohm') return drawn > 0 ? (volts * drawn) / (drawn + source) : volts;
    return Math.sign(volts) * Math.max(0, Math.abs(volts) - source * drawn);
  });
}

/** A rail that does not give way under load: what a regulator holds on its input, else the band that is known. */
function heldModel(solved: RailVoltages, rail: Rail): BenchModel | Gap {
  const known = solved.voltages.get(rail.name) ?? { because: `${rail.name} is not known` };
  if (isGap(known)) return known;
  const regulator = rail.origin?.kind === 'regulator' ? rail.origin.regulator : undefined;
  const { output, dropout, from } = regulator ?? {};
  if (!regulator || !output)
    return plainModel([variable(`rail ${rail.name}`, rail.path, 'V', known)], ([volts = 0]) => volts);
  const variables = [variable('regulator output', `${rail.path}.regulator.output`, 'V', output)];
  const input = from && solved.voltages.get(from.name);
  if (from && input && !isGap(input) && dropout) {
    variables.push(variable(`rail ${from.name}`, `rails.${from.name}`, 'V', input));
    variables.push(variable('dropout', `${rail.path}.regulator.dropout`, 'V', dropout));
  }
  const fixed = (figure: Figure, value: number): Figure => ({ ...figure, ...exactly(value) });
  return plainModel(variables, ([held = 0, above, drop]) => {
    if (above === undefined || drop === undefined || !dropout) return held;
    const moved = { ...regulator, output: fixed(output, held), dropout: fixed(dropout, drop) };
    return regulatedVoltage(moved, exactly(above))?.typical ?? held;
  });
}
