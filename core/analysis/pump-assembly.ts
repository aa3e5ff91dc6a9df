/**
 * From the board's description of a pump to its model: every capacitor, diode, pin, load and rail it stands on
 * becomes a variable, and the engine's parameters are tied to them.
 */
import type { DiodeData } from '../catalog/part';
import { saturationAtTemperature, temperatureLaws } from '../compute/diode-saturation-temperature';
import { referenceTemperature, thermalVoltage } from '../compute/thermal-voltage';
import type { Capacitor, Pump, Rail } from '../model/board';
import type { PumpNetwork } from '../pump/network';
import type { DiodeValues, PumpValues } from '../pump/values';
import { type Band, exactly, type Unit } from '../quantity/figure';
import type { Contribution, PumpModel, Variable } from './pump-model';

/** What drives one terminal of the pump. */
export interface DriveSource {
  /** `mcu.GP15`. */
  readonly label: string;
  readonly path: string;
  readonly high: { readonly railName: string; readonly band: Band };
  readonly highOhms: Band;
  readonly lowOhms: Band;
}

export interface PumpParts {
  readonly rail: Rail;
  readonly pump: Pump;
  readonly mode: string | undefined;
  readonly stages: number;
  readonly ambient: Band;
  readonly input: { readonly railName: string; readonly band: Band } | undefined;
  readonly drives: readonly DriveSource[];
  readonly clock: {
    readonly label: string;
    readonly path: string;
    readonly frequency: Band;
    readonly duty: Band;
  };
}

/** Constants of the model; undefined when a part of the pump has no usable value. */
export function assemblePump(parts: PumpParts): PumpModel | undefined {
  const { rail, pump, stages } = parts;
  const book = new Book();
  const ladder = pump.topology === 'ladder';
  const ambient = book.add('ambient', 'conditions.ambient', 'K', parts.ambient);
  const input = parts.input && book.rail(parts.input.railName, parts.input.band);
  const drives = parts.drives.map((drive) => ({
    high: book.rail(drive.high.railName, drive.high.band),
    highOhms: book.add(`${drive.label} high resistance`, drive.path, 'ohm', drive.highOhms),
    lowOhms: book.add(`${drive.label} low resistance`, drive.path, 'ohm', drive.lowOhms),
  }));
  const frequency = book.add(`${parts.clock.label} frequency`, parts.clock.path, 'Hz', parts.clock.frequency);
  const duty = book.add(`${parts.clock.label} duty`, parts.clock.path, '1', parts.clock.duty);
  const series = pump.series && book.add('series resistor', `${rail.path}.pump.series`, 'ohm', pump.series);
  const column = (name: string, list: readonly Capacitor[]) =>
    Array.from({ length: stages }, (_, k) => {
      const capacitor = list.length === 1 ? list[0] : list[k];
      return capacitor && book.capacitor(stages > 1 ? `${name} ${k + 1}` : name, capacitor);
    });
  const flying = column('flying capacitor', pump.flying);
  const smoothing = ladder
    ? column('smoothing capacitor', pump.smoothing.length > 0 ? pump.smoothing : pump.flying)
    : [];
  const reservoir = pump.reservoir && book.capacitor('reservoir capacitor', pump.reservoir);
  const positions = ladder ? 2 * stages : stages + 1;
  const diodes = Array.from({ length: positions }, (_, k) => {
    const diode = pump.diodes.length === 1 ? pump.diodes[0] : pump.diodes[k];
    return diode?.data && book.diode(diode.ref?.name ?? `diode ${k + 1}`, diode.path, diode.data);
  });
  const loads = bookLoads(book, parts);
  if ([...flying, ...smoothing, ...diodes].includes(undefined)) return undefined;
  if (pump.reservoir && !reservoir) return undefined;
  if (!ladder && !reservoir) return undefined;
  type Known<T> = Exclude<T, undefined>;
  const known = <T>(list: readonly T[]) => list as readonly Known<T>[];

  const values = (p: readonly number[]): PumpValues => {
    const capacitor = (c: CapacitorVariables) => ({
      farads: p[c.farads]!,
      ohms: c.ohms === undefined ? 0 : p[c.ohms]!,
    });
    return {
      topology: ladder ? 'ladder' : 'chain',
      stages,
      negative: pump.topology === 'inverter' || pump.polarity === 'negative',
      input: input === undefined ? 0 : p[input]!,
      frequency: p[frequency]!,
      duty: p[duty]!,
      drives: drives.map((d) => ({
        high: p[d.high]!,
        low: 0,
        highOhms: p[d.highOhms]!,
        lowOhms: p[d.lowOhms]!,
      })),
      series: series === undefined ? 0 : p[series]!,
      flying: known(flying).map(capacitor),
      smoothing: known(smoothing).map(capacitor),
      ...(reservoir ? { reservoir: capacitor(reservoir) } : {}),
      diodes: known(diodes).map((d) => diodeAt(d, p, p[ambient]!)),
      loads: loads.map((load) =>
        load.kind === 'resistance'
          ? { name: load.name, kind: 'resistance', ohms: p[load.variable]! }
          : { name: load.name, kind: 'current', amps: p[load.variable]! },
      ),
    };
  };

  const contributions = (p: readonly number[], at: PumpNetwork): Contribution[] => {
    const list: Contribution[] = [];
    const tie = (variable: number | undefined, parameter: Contribution['parameter'], weight?: number) => {
      if (variable !== undefined) list.push({ variable, parameter, weight: weight ?? 1 / p[variable]! });
    };
    if (input !== undefined) tie(input, { kind: 'volts', index: ~at.input }, 1);
    drives.forEach((d, k) => {
      const place = at.drives[k]!;
      tie(d.high, { kind: 'volts', index: place.known, share: k === 0 ? [1, 0] : [0, 1] }, 1);
      tie(d.highOhms, { kind: 'ohms', index: place.resistor, segment: k });
      tie(d.lowOhms, { kind: 'ohms', index: place.resistor, segment: 1 - k });
      if (place.series !== undefined) tie(series, { kind: 'ohms', index: place.series });
    });
    const capacitor = (c: CapacitorVariables, index: number) => {
      tie(c.farads, { kind: 'farads', index });
      tie(c.ohms, { kind: 'esr', index });
      // Stretching time acts like shrinking every capacitor.
      tie(frequency, { kind: 'farads', index });
    };
    known(flying).forEach((c, k) => {
      capacitor(c, at.flying[k]!);
    });
    known(smoothing).forEach((c, k) => {
      capacitor(c, at.smoothing[k]!);
    });
    if (reservoir && at.reservoir !== undefined) capacitor(reservoir, at.reservoir);
    known(diodes).forEach((d, k) => {
      const index = at.diodes[k]!;
      tie(d.saturation, { kind: 'saturation', index });
      tie(d.resistance, { kind: 'diode-ohms', index });
      // Ideality and temperature act on slope and saturation at once; the law is smooth, a small step serves.
      for (const variable of [d.ideality, ambient]) {
        const step = 1e-4 * p[variable]!;
        const moved = [...p];
        moved[variable] = p[variable]! + step;
        const before = diodeAt(d, p, p[ambient]!);
        const after = diodeAt(d, moved, moved[ambient]!);
        tie(variable, { kind: 'saturation', index }, Math.log(after.saturation / before.saturation) / step);
        tie(variable, { kind: 'slope', index }, Math.log(after.slope / before.slope) / step);
      }
    });
    loads.forEach((load, k) => {
      const { index } = at.loads[k]!;
      tie(load.variable, load.kind === 'resistance' ? { kind: 'ohms', index } : { kind: 'load', index });
    });
    return list;
  };

  const name = rail.name;
  return {
    variables: book.variables,
    values,
    contributions,
    keys: {
      flying: flying.map((_, k) => `${name}.flying[${k}]`),
      smoothing: smoothing.map((_, k) => `${name}.smoothing[${k}]`),
      reservoir: `${name}.reservoir`,
      diodes: diodes.map((_, k) => `${name}.diode[${k}]`),
    },
  };
}

interface CapacitorVariables {
  readonly farads: number;
  readonly ohms: number | undefined;
}

interface DiodeVariables {
  readonly saturation: number;
  readonly ideality: number;
  readonly resistance: number;
  readonly kind: DiodeData['kind'];
}

function diodeAt(d: DiodeVariables, p: readonly number[], kelvin: number): DiodeValues {
  const ideality = p[d.ideality]!;
  const saturation = p[d.saturation]!;
  const law = temperatureLaws[d.kind];
  return {
    saturation:
      saturationAtTemperature(saturation, ideality, law, referenceTemperature, kelvin) ?? saturation,
    slope: ideality * (thermalVoltage(kelvin) ?? Number.NaN),
    ohms: p[d.resistance]!,
  };
}

function bookLoads(book: Book, { rail, mode }: PumpParts) {
  const loads: { name: string; kind: 'resistance' | 'current'; variable: number }[] = [];
  for (const load of rail.loads.values()) {
    if (mode !== undefined && load.modes && !load.modes.some((m) => m.name === mode)) continue;
    if (load.resistance && load.resistance.min > 0)
      loads.push({
        name: load.name,
        kind: 'resistance',
        variable: book.add(`load ${load.name}`, load.path, 'ohm', load.resistance),
      });
    if (load.current && load.current.typical !== 0)
      loads.push({
        name: load.name,
        kind: 'current',
        variable: book.add(`load ${load.name}`, load.path, 'A', magnitude(load.current)),
      });
  }
  if (rail.bleeder && rail.bleeder.min > 0)
    loads.push({
      name: 'bleeder',
      kind: 'resistance',
      variable: book.add('bleeder', `${rail.path}.bleeder`, 'ohm', rail.bleeder),
    });
  return loads;
}

/** A load's current counts by its size: on a negative rail it may be written with either sign. */
function magnitude(band: Band): Band {
  if (band.typical >= 0) return band;
  return { min: -band.max, typical: -band.typical, max: -band.min };
}

/** Collects variables; a rail or a part that serves twice is one variable, since it cannot sit at both ends. */
class Book {
  readonly variables: Variable[] = [];
  readonly #rails = new Map<string, number>();
  readonly #capacitors = new Map<Capacitor, CapacitorVariables>();
  readonly #diodes = new Map<DiodeData, DiodeVariables>();

  add(label: string, path: string, unit: Unit, { min, typical, max }: Band): number {
    return this.variables.push({ label, path, unit, band: { min, typical, max } }) - 1;
  }

  rail(name: string, band: Band): number {
    const known = this.#rails.get(name);
    if (known !== undefined) return known;
    const index = this.add(`rail ${name}`, `rails.${name}`, 'V', band);
    this.#rails.set(name, index);
    return index;
  }

  capacitor(label: string, capacitor: Capacitor): CapacitorVariables | undefined {
    const { value, esr } = capacitor;
    if (!value || !(value.min > 0)) return undefined;
    const known = this.#capacitors.get(capacitor);
    if (known) return known;
    const tolerance = capacitor.toleranceGiven ? undefined : capacitor.kind.data?.tolerance;
    const band = tolerance
      ? {
          min: value.typical * (1 + tolerance.min),
          typical: value.typical,
          max: value.typical * (1 + tolerance.max),
        }
      : value;
    const made = {
      farads: this.add(label, capacitor.path, 'F', band),
      ohms: esr && esr.min > 0 ? this.add(`${label} ESR`, capacitor.path, 'ohm', esr) : undefined,
    };
    this.#capacitors.set(capacitor, made);
    return made;
  }

  diode(label: string, path: string, data: DiodeData): DiodeVariables {
    const known = this.#diodes.get(data);
    if (known) return known;
    const made = {
      kind: data.kind,
      saturation: this.add(`${label} saturation current`, path, 'A', data.saturation),
      ideality: this.add(`${label} ideality`, path, '1', data.ideality),
      resistance: this.add(
        `${label} resistance`,
        path,
        'ohm',
        data.resistance.min > 0 ? data.resistance : exactly(1e-3),
      ),
    };
    this.#diodes.set(data, made);
    return made;
  }
}
