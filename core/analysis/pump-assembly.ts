/**
 * From the board's description of a pump to its model: every capacitor, diode, drive, load and rail it stands on
 * becomes a variable, and the engine's parameters are tied to them.
 */
import type { DiodeData } from '../catalog/part';
import type { Capacitor, Pump, Rail } from '../model/board';
import type { LoadValues, PumpValues } from '../pump/values';
import { type Band, exactly } from '../quantity/figure';
import { activeIn } from './board-modes';
import type { DriveSource } from './drive-source';
import { Book, type Point } from './pump-book';
import { addDriveVariables } from './pump-drives';
import type { PumpModel } from './pump-model';
import { type CapacitorPart, capacitorPart, type DiodePart, diodePart } from './pump-parts';

/** A rail as the pump sees it: voltage without the pump's own current, and source resistance. */
export interface RailSource {
  readonly name: string;
  readonly band: Band;
  readonly ohms?: Band;
}

export interface PumpParts {
  readonly rail: Rail;
  readonly pump: Pump;
  readonly mode: string | undefined;
  readonly stages: number;
  readonly ambient: Band;
  /** Every rail that the pump stands on or is driven from, each once. */
  readonly rails: readonly RailSource[];
  /** Name among `rails`; absent for ground. */
  readonly input: string | undefined;
  readonly drives: readonly DriveSource[];
  readonly clock: {
    readonly label: string;
    readonly path: string;
    readonly frequency: Band;
    readonly duty: Band;
    readonly rise: number;
    readonly fall: number;
  };
  /** What other rails and chips take from the output, A. */
  readonly below: number;
}

/** Undefined when a part of the pump has no usable value. */
export function assemblePump(parts: PumpParts): PumpModel | undefined {
  const { rail, pump, stages } = parts;
  const book = new Book();
  const ladder = pump.topology === 'ladder';
  const ambient = book.add('ambient', 'conditions.ambient', 'K', parts.ambient);
  const rails = parts.rails.map((source, k) => addRail(book, source, k));
  const railIndex = (name: string) => parts.rails.findIndex((source) => source.name === name);
  const series = pump.series && book.add('series resistor', `${rail.path}.pump.series`, 'ohm', pump.series);
  const drives = parts.drives.map((source, k) =>
    addDriveVariables(book, source, k, railIndex, ambient, series),
  );
  const { clock } = parts;
  const frequency = book.add(`${clock.label} frequency`, clock.path, 'Hz', clock.frequency);
  const duty = book.add(`${clock.label} duty`, clock.path, '1', clock.duty);

  const known = new Map<Capacitor, CapacitorPart | undefined>();
  const capacitor = (label: string, item: Capacitor) => {
    if (!known.has(item)) known.set(item, capacitorPart(book, label, item));
    return known.get(item);
  };
  const column = (name: string, list: readonly Capacitor[]) =>
    Array.from({ length: stages }, (_, k) => {
      const item = list.length === 1 ? list[0] : list[k];
      return item && capacitor(list.length === 1 ? name : `${name} ${k + 1}`, item);
    });
  const flying = all(column('flying capacitor', pump.flying));
  const smoothing = ladder
    ? all(column('smoothing capacitor', pump.smoothing.length > 0 ? pump.smoothing : pump.flying))
    : [];
  const reservoir = pump.reservoir && capacitor('reservoir capacitor', pump.reservoir);
  const diodes = all(pumpDiodes(book, pump, ladder ? 2 * stages : stages + 1, ambient));
  const loads = addLoads(book, parts);
  if (!flying || !smoothing || !diodes) return undefined;
  if (pump.reservoir ? !reservoir : !ladder) return undefined;

  book.ties((p, at, tie) => {
    flying.forEach((part, k) => {
      part.tie(p, at.flying[k]!, frequency, tie);
    });
    smoothing.forEach((part, k) => {
      part.tie(p, at.smoothing[k]!, frequency, tie);
    });
    if (at.reservoir !== undefined) reservoir?.tie(p, at.reservoir, frequency, tie);
    diodes.forEach((part, k) => {
      part.tie(p, at.diodes[k]!, tie);
    });
  });

  const values = (p: Point): PumpValues => ({
    topology: ladder ? 'ladder' : 'chain',
    stages,
    negative: pump.topology === 'inverter' || pump.polarity === 'negative',
    rails: rails.map((read) => read(p)),
    ...(parts.input === undefined ? {} : { input: railIndex(parts.input) }),
    frequency: p[frequency]!,
    duty: p[duty]!,
    rise: clock.rise,
    fall: clock.fall,
    drives: drives.map((read) => read(p)),
    series: series === undefined ? 0 : p[series]!,
    flying: flying.map((part) => part.values(p)),
    smoothing: smoothing.map((part) => part.values(p)),
    ...(reservoir ? { reservoir: reservoir.values(p) } : {}),
    diodes: diodes.map((part) => part.values(p)),
    loads: loads.map((read) => read(p)),
  });
  const { name } = rail;
  return {
    variables: book.variables,
    values,
    contributions: (p, at) => book.contributions(p, at),
    keys: {
      flying: flying.map((_, k) => `${name}.flying[${k}]`),
      smoothing: smoothing.map((_, k) => `${name}.smoothing[${k}]`),
      reservoir: `${name}.reservoir`,
      diodes: diodes.map((_, k) => `${name}.diode[${k}]`),
    },
  };
}

/** The list when every entry is there. */
function all<T>(list: readonly (T | undefined)[]): readonly T[] | undefined {
  const present = list.filter((item): item is T => item !== undefined);
  return present.length === list.length ? present : undefined;
}

function addRail(book: Book, { name, band, ohms }: RailSource, k: number) {
  const volts = book.rail(name, band);
  const resistance =
    ohms && ohms.max > 0
      ? book.add(`rail ${name} source resistance`, `rails.${name}`, 'ohm', ohms)
      : undefined;
  book.ties((_p, at, tie) => {
    const place = at.rails[k]!;
    tie(volts, { kind: 'volts', index: place.known }, 1);
    if (place.resistor !== undefined) tie(resistance, { kind: 'ohms', index: place.resistor });
  });
  return (p: Point) => ({
    name,
    volts: p[volts]!,
    ohms: resistance === undefined ? 0 : p[resistance]!,
  });
}

function pumpDiodes(book: Book, pump: Pump, count: number, ambient: number): (DiodePart | undefined)[] {
  const known = new Map<DiodeData, DiodePart>();
  return Array.from({ length: count }, (_, k) => {
    const diode = pump.diodes.length === 1 ? pump.diodes[0] : pump.diodes[k];
    if (!diode?.data) return undefined;
    const part =
      known.get(diode.data) ??
      diodePart(book, diode.ref?.name ?? `diode ${k + 1}`, diode.path, diode.data, ambient);
    known.set(diode.data, part);
    return part;
  });
}

/** Name of the load that stands for other rails and chips on this one. */
export const belowLoad = 'what stands on it';

/** Below half a volt nothing that regulates its own power still runs (common practice, no source). */
const leastPowerVoltage = 0.5;

function addLoads(book: Book, { rail, mode, below }: PumpParts): ((p: Point) => LoadValues)[] {
  const loads: ((p: Point) => LoadValues)[] = [];
  const add = (label: string, path: string, unit: 'ohm' | 'A' | 'W', band: Band) => {
    const variable = book.add(label, path, unit, band);
    const k = loads.length;
    book.ties((_p, at, tie) => {
      const { index } = at.loads[k]!;
      tie(variable, unit === 'ohm' ? { kind: 'ohms', index } : { kind: 'load', index });
    });
    return variable;
  };
  for (const load of rail.loads.values()) {
    if (!activeIn(mode, load.modes)) continue;
    const { name, path } = load;
    const label = `load ${name}`;
    if (load.resistance && load.resistance.min > 0) {
      const variable = add(label, path, 'ohm', load.resistance);
      loads.push((p) => ({ name, kind: 'resistance', ohms: p[variable]! }));
    }
    if (load.current && load.current.typical !== 0) {
      const variable = add(label, path, 'A', magnitude(load.current));
      loads.push((p) => ({ name, kind: 'current', amps: p[variable]! }));
    }
    if (load.power && load.power.typical > 0) {
      const variable = add(label, path, 'W', load.power);
      const knee = Math.max(Math.abs(load.least?.typical ?? 0), leastPowerVoltage);
      loads.push((p) => ({ name, kind: 'power', watts: p[variable]!, knee }));
    }
  }
  if (below > 0) {
    const variable = add(belowLoad, rail.path, 'A', exactly(below));
    loads.push((p) => ({ name: belowLoad, kind: 'current', amps: p[variable]! }));
  }
  if (rail.bleeder && rail.bleeder.min > 0) {
    const variable = add('bleeder', `${rail.path}.bleeder`, 'ohm', rail.bleeder);
    loads.push((p) => ({ name: 'bleeder', kind: 'resistance', ohms: p[variable]! }));
  }
  return loads;
}

/** A load's current counts by its size: on a negative rail it may be written with either sign. */
function magnitude(band: Band): Band {
  if (band.typical >= 0) return band;
  return { min: -band.max, typical: -band.typical, max: -band.min };
}
