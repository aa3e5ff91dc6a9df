/**
 * A rail behind a filter with the load that stood on it at the bench: the rail in front carries that load beside its
 * own, and the filter's resistor takes its share.
 */
import type { BenchPoint, Filter, Rail } from '../model/board';
import type { Band, Figure } from '../quantity/figure';
import {
  type BenchModel,
  type BenchReading,
  type BenchSite,
  plainModel,
  typicals,
  variable,
} from './bench-model';
import { benchLoad, pumpModel } from './bench-pump';
import { filterOhms } from './filters';
import { type Gap, isGap } from './gap';
import { once } from './once';
import type { Variable } from './pump-model';

export function filterModel(
  site: BenchSite,
  rail: Rail,
  filter: Filter,
  point: BenchPoint,
  load: Figure,
): BenchModel | Gap {
  const { board, solved } = site;
  const front = filter.from && board.rails.get(filter.from.name);
  if (!front) return { because: `the filter of ${rail.name} has no rail in front` };
  const ohms = filterOhms(filter);
  const resistor = variable('filter resistor', `${rail.path}.filter.resistor`, 'ohm', ohms);
  // To the rail in front the load and the resistor before it are one resistor, and a current stays a current.
  const seen: Figure = load.unit === 'ohm' ? { ...load, ...added(load, ohms) } : load;
  if (front.origin?.kind === 'pump') {
    const below = (mode: string | undefined) =>
      without(solved.around(front).below(mode), solved.drawn.total(rail.name, mode));
    const loads = [...front.loads.values(), benchLoad(point, seen)];
    const inner = pumpModel(site, front, front.origin.pump, loads, below);
    return isGap(inner) ? inner : behind(inner, `${point.path}.load`, resistor);
  }
  const known = solved.voltages.get(front.name) ?? { because: `${front.name} is not known` };
  if (isGap(known)) return known;
  const variables = [
    variable(`rail ${front.name}`, front.path, 'V', known),
    resistor,
    variable('load on the bench', `${point.path}.load`, load.unit, seen),
  ];
  return plainModel(variables, ([volts = 0, series = 0, drawn = 0]) => left(volts, series, drawn, load.unit));
}

/** Volts behind the resistor; a load in ohms includes it. */
function left(volts: number, ohms: number, drawn: number, unit: Figure['unit']): number {
  if (unit === 'ohm') return drawn > 0 ? volts * (1 - Math.min(1, ohms / drawn)) : volts;
  return Math.sign(volts) * Math.max(0, Math.abs(volts) - ohms * drawn);
}

/** The model of the rail in front with the resistor as one more variable, the last one. */
function behind(inner: BenchModel, loadPath: string, resistor: Variable): BenchModel {
  const variables = [...inner.variables, resistor];
  const last = inner.variables.length;
  const place = inner.variables.findIndex(({ path }) => path === loadPath);
  const load = inner.variables[place];
  const output = (volts: number, ohms: number, drawn: number) =>
    load ? left(volts, ohms, drawn, load.unit) : volts;
  const read = ({ voltage, slopes }: BenchReading, values: readonly number[]): BenchReading => {
    const at = [voltage, values[last]!, values[place] ?? 0] as const;
    const slope = (k: 0 | 1 | 2) => {
      const step = 1e-5 * Math.max(Math.abs(at[k]), 1e-6);
      const moved = (by: number) =>
        output(at[0] + (k === 0 ? by : 0), at[1] + (k === 1 ? by : 0), at[2] + (k === 2 ? by : 0));
      return (moved(step) - moved(-step)) / (2 * step);
    };
    const own = slopes.voltage.map((inside, k) => inside * slope(0) + (k === place ? slope(2) : 0));
    return {
      voltage: output(...at),
      ripple: null,
      slopes: { voltage: [...own, slope(1)], ripple: variables.map(() => 0) },
    };
  };
  const typical = once(() => read(inner.typical(), typicals(variables)));
  /** With the load and the resistor at the ends that take most, or least. */
  const end = (volts: number, most: boolean) => {
    const heavy = most === (load?.unit === 'A');
    return output(
      volts,
      most ? resistor.band.max : resistor.band.min,
      load?.band[heavy ? 'max' : 'min'] ?? 0,
    );
  };
  return {
    ...inner,
    variables,
    typical,
    at: (values) => {
      const reading = inner.at(values.slice(0, last));
      return reading && read(reading, values);
    },
    bands: () => {
      const { min, typical: middle, max } = inner.bands().voltage;
      const ends = [end(min, min > 0), end(max, max < 0)];
      return {
        voltage: {
          min: Math.min(...ends),
          typical: output(middle, resistor.band.typical, load?.band.typical ?? 0),
          max: Math.max(...ends),
        },
        ripple: null,
      };
    },
    withProbe: (ohms) => {
      const volts = inner.withProbe(ohms);
      return volts === undefined ? undefined : output(volts, resistor.band.typical, load?.band.typical ?? 0);
    },
  };
}

function added(a: Band, b: Band): Band {
  return { min: a.min + b.min, typical: a.typical + b.typical, max: a.max + b.max };
}

/** What is left of a current without a part of it, never less than nothing. */
function without(whole: Band, part: Band): Band {
  return {
    min: Math.max(0, whole.min - part.min),
    typical: Math.max(0, whole.typical - part.typical),
    max: Math.max(0, whole.max - part.max),
  };
}
