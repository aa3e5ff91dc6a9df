/**
 * From the board's description of a pump to its model: every capacitor, diode, drive, load and rail it stands on
 * becomes a variable, and the engine's parameters are tied to them.
 */
import type { DiodeData } from '../catalog/part';
import { equivalentJunction } from '../compute/junction-capacitance';
import { referenceTemperature } from '../compute/thermal-voltage';
import type { Capacitor, Pump, Rail } from '../model/board';
import { idealVoltage, type LoadValues, type PumpValues } from '../pump/values';
import type { Band } from '../quantity/figure';
import { activeIn } from './board-modes';
import type { DriveSource } from './drive-source';
import { steadyLoad } from './load-current';
import { Book, type Point, sourceLabel } from './pump-book';
import { type CapacitorPart, capacitorPart, type PlacedCapacitor } from './pump-capacitors';
import { addDriveVariables } from './pump-drives';
import type { PumpModel } from './pump-model';
import { type DiodePart, diodePart } from './pump-parts';

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
  readonly below: Band;
  /** Average voltage across each capacitor, magnitude, by report key: what it keeps of its value follows from it. */
  readonly bears?: ReadonlyMap<string, number>;
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
  const frequency = book.add(`${clock.label} frequency`, clock.path, 'Hz', clock.frequency, { sharpens: -1 });
  const duty = book.add(`${clock.label} duty`, clock.path, '1', clock.duty);

  const known = new Map<Capacitor, CapacitorPart | undefined>();
  const cool = parts.ambient.min === parts.ambient.max && parts.ambient.min === referenceTemperature;
  const place = (key: string, name: string, placeName: string, item: Capacitor) => {
    if (!known.has(item)) known.set(item, capacitorPart(book, name, item, cool));
    return known.get(item)?.at(placeName, parts.bears?.get(`${rail.name}.${key}`));
  };
  const column = (key: string, name: string, list: readonly Capacitor[]) =>
    Array.from({ length: stages }, (_, k) => {
      const item = list.length === 1 ? list[0] : list[k];
      const single = list.length === 1 ? name : `${name} ${k + 1}`;
      return item && place(`${key}[${k}]`, single, stages === 1 ? name : `${name} ${k + 1}`, item);
    });
  const flying = all(column('flying', 'flying capacitor', pump.flying));
  const smoothing: readonly PlacedCapacitor[] | undefined = ladder
    ? all(
        column('smoothing', 'smoothing capacitor', pump.smoothing.length > 0 ? pump.smoothing : pump.flying),
      )
    : [];
  const reservoir =
    pump.reservoir && place('reservoir', 'reservoir capacitor', 'reservoir capacitor', pump.reservoir);
  const diodes = all(pumpDiodes(book, parts, ladder ? 2 * stages : stages + 1, ambient));
  const loads = addLoads(book, parts);
  if (!flying || !smoothing || !diodes) return undefined;
  if (pump.reservoir ? !reservoir : !ladder) return undefined;

  book.ties((p, at, tie) => {
    flying.forEach((part, k) => {
      part.tie(p, at.flying[k]!, at.leaks.flying[k], frequency, tie);
    });
    smoothing.forEach((part, k) => {
      part.tie(p, at.smoothing[k]!, at.leaks.smoothing[k], frequency, tie);
    });
    if (at.reservoir !== undefined) reservoir?.tie(p, at.reservoir, at.leaks.reservoir, frequency, tie);
    diodes.forEach((part, k) => {
      const leak = at.leaks.diodes[k];
      const junction = at.junctions[k];
      part.tie(
        p,
        {
          index: at.diodes[k]!,
          ...(leak === undefined ? {} : { leak }),
          ...(junction === undefined ? {} : { junction }),
        },
        tie,
      );
    });
  });

  const frame = (p: Point) => ({
    topology: ladder ? ('ladder' as const) : ('chain' as const),
    stages,
    negative: pump.topology === 'inverter' || pump.polarity === 'negative',
    rails: rails.map((read) => read(p)),
    ...(parts.input === undefined ? {} : { input: railIndex(parts.input) }),
    drives: drives.map((read) => read(p)),
  });
  const usualIdeal = Math.abs(idealVoltage(frame(book.variables.map(({ band }) => band.typical))));
  const values = (p: Point): PumpValues => {
    const outline = frame(p);
    const climb = usualIdeal > 0 ? Math.abs(idealVoltage(outline)) / usualIdeal : 1;
    return {
      ...outline,
      frequency: p[frequency]!,
      duty: p[duty]!,
      rise: clock.rise,
      fall: clock.fall,
      series: series === undefined ? 0 : p[series]!,
      flying: flying.map((part) => part.values(p, climb)),
      smoothing: smoothing.map((part) => part.values(p, climb)),
      ...(reservoir ? { reservoir: reservoir.values(p, climb) } : {}),
      diodes: diodes.map((part) => part.values(p)),
      loads: loads.map((read) => read(p)),
    };
  };
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
    ohms && ohms.max > 0 ? book.add(sourceLabel(name), `rails.${name}`, 'ohm', ohms) : undefined;
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

function pumpDiodes(book: Book, parts: PumpParts, count: number, ambient: number): (DiodePart | undefined)[] {
  const { pump } = parts;
  const known = new Map<DiodeData, DiodePart>();
  return Array.from({ length: count }, (_, k) => {
    const diode = pump.diodes.length === 1 ? pump.diodes[0] : pump.diodes[k];
    if (!diode?.data) return undefined;
    const part =
      known.get(diode.data) ??
      diodePart(
        book,
        diode.ref?.name ?? `diode ${k + 1}`,
        diode.path,
        diode.data,
        ambient,
        junctionOf(parts, diode.data),
      );
    known.set(diode.data, part);
    return part;
  });
}

/** Below this share of the smallest flying capacitor a junction's charge is not seen in the result. */
const seenJunction = 5e-4;

/** Junction capacitance over the swing of the drive, where it takes a visible share of the pumped charge. */
function junctionOf({ rails, pump }: PumpParts, data: DiodeData): Band | undefined {
  const { junction, kind } = data;
  const smallest = Math.min(...pump.flying.map(({ value }) => value?.min ?? Number.POSITIVE_INFINITY));
  if (!junction || !(junction.max > seenJunction * smallest)) return undefined;
  const swing = Math.max(...rails.map(({ band }) => Math.abs(band.typical)), 0);
  const at = (farads: number) => equivalentJunction(farads, swing, kind) ?? farads;
  return { min: at(junction.min), typical: at(junction.typical), max: at(junction.max) };
}

/** Name of the load that stands for other rails and chips on this one. */
export const belowLoad = 'what stands on it';

/** Below half a volt nothing that regulates its own power still runs (common practice, no source). */
const leastPowerVoltage = 0.5;

function addLoads(book: Book, { rail, mode, below }: PumpParts): ((p: Point) => LoadValues)[] {
  const loads: ((p: Point) => LoadValues)[] = [];
  const add = (label: string, path: string, unit: 'ohm' | 'A' | 'W', band: Band) => {
    const variable = book.add(label, path, unit, band, { draws: unit === 'ohm' ? -1 : 1 });
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
    const steady = steadyLoad(load);
    if (steady && steady.typical > 0) {
      const variable = add(label, path, 'A', steady);
      loads.push((p) => ({ name, kind: 'current', amps: p[variable]! }));
    }
    if (load.power && load.power.typical > 0) {
      const variable = add(label, path, 'W', load.power);
      const knee = Math.max(Math.abs(load.least?.typical ?? 0), leastPowerVoltage);
      loads.push((p) => ({ name, kind: 'power', watts: p[variable]!, knee }));
    }
  }
  if (below.max > 0) {
    const variable = add(belowLoad, rail.path, 'A', below);
    loads.push((p) => ({ name: belowLoad, kind: 'current', amps: p[variable]! }));
  }
  if (rail.bleeder && rail.bleeder.min > 0) {
    const variable = add('bleeder', `${rail.path}.bleeder`, 'ohm', rail.bleeder);
    loads.push((p) => ({ name: 'bleeder', kind: 'resistance', ohms: p[variable]! }));
  }
  return loads;
}
