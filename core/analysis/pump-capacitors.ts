/**
 * Capacitors of a pump as variables: tolerance, temperature, series resistance and leakage belong to the part, what
 * direct voltage leaves of the value to each place where it works.
 */
import { type BiasPoint, caseHalfShare, curveHalfShare, valueLeft } from '../compute/bias-loss';
import type { Capacitor } from '../model/board';
import type { CapacitorValues } from '../pump/values';
import type { Band } from '../quantity/figure';
import type { Book, Point, Tie } from './pump-book';

export interface PlacedCapacitor {
  /** `climb`: the pump's ideal voltage at the point over the typical one; the voltage on the part grows with it. */
  values(p: Point, climb: number): CapacitorValues;
  /** `frequency`: stretching time acts like shrinking every capacitor. `leak`: the resistor beside it, if it has one. */
  tie(p: Point, index: number, leak: number | undefined, frequency: number, tie: Tie): void;
}

export interface CapacitorPart {
  /** The part where it bears `volts` on average; undefined while that is not known. */
  at(label: string, volts: number | undefined): PlacedCapacitor;
}

const sharp = { sharpens: -1 } as const;

/** Undefined when the capacitor has no usable value. `cool`: the board stays at 25 degC, where values are stated. */
export function capacitorPart(
  book: Book,
  label: string,
  capacitor: Capacitor,
  cool: boolean,
): CapacitorPart | undefined {
  const { value, esr, path } = capacitor;
  if (!value || !(value.min > 0)) return undefined;
  const kind = capacitor.kind.data;
  const farads = book.add(label, path, 'F', nominalBand(capacitor, value), sharp);
  const ohms = esr && esr.min > 0 ? book.add(`${label} ESR`, path, 'ohm', esr) : undefined;
  const change = kind?.temperature;
  const warmth =
    change && !cool && change.max > change.min
      ? book.add(
          `${label} temperature factor`,
          path,
          '1',
          {
            min: 1 + change.min,
            typical: 1 + change.typical,
            max: 1 + change.max,
          },
          sharp,
        )
      : undefined;
  const leak = leakOf(capacitor);
  const leakage = leak && book.add(`${label} leakage resistance`, path, 'ohm', leak);
  return {
    at: (place, volts) => {
      const bias = volts === undefined ? undefined : biasOf(capacitor, volts);
      const left =
        bias && book.add(`${place} value left under its direct voltage`, path, '1', bias.band, sharp);
      return {
        values: (p, climb) => ({
          farads:
            p[farads]! *
            (warmth === undefined ? 1 : p[warmth]!) *
            (left === undefined ? 1 : p[left]! * bias!.change(climb)),
          ohms: ohms === undefined ? 0 : p[ohms]!,
          ...(leakage === undefined ? {} : { leakOhms: p[leakage]! }),
        }),
        tie: (_p, index, resistor, frequency, tie) => {
          for (const variable of [farads, warmth, left, frequency]) tie(variable, { kind: 'farads', index });
          tie(ohms, { kind: 'esr', index });
          if (resistor !== undefined) tie(leakage, { kind: 'ohms', index: resistor });
        },
      };
    },
  };
}

/** The file's own band, or the nominal value with the tolerance of its kind. */
function nominalBand(capacitor: Capacitor, value: Band): Band {
  const tolerance = capacitor.toleranceGiven ? undefined : capacitor.kind.data?.tolerance;
  if (!tolerance) return value;
  const { typical } = value;
  return { min: typical * (1 + tolerance.min), typical, max: typical * (1 + tolerance.max) };
}

/** What a direct voltage leaves of the value; undefined for kinds that keep it and without a rated voltage. */
export function biasOf(
  { kind, rated, size, value }: Capacitor,
  volts: number,
): { readonly band: Band; change(climb: number): number } | undefined {
  const points = kind.data?.bias;
  if (!points || !rated || !(rated.typical > 0)) return undefined;
  const curve = (end: keyof Band): BiasPoint[] =>
    points.map(({ share, left }) => ({ share, left: left[end] }));
  // A smaller case than the curve stands for meets the same loss at a smaller share of the rating.
  const half = size && value && caseHalfShare(size.name, value.typical);
  const usual = half && curveHalfShare(curve('typical'));
  const stretch = half && usual ? usual / half : 1;
  const at = (end: keyof Band, v: number) =>
    valueLeft(curve(end), (stretch * Math.abs(v)) / rated.typical) ?? 1;
  const typical = at('typical', volts);
  return {
    band: {
      min: Math.min(at('min', volts), typical),
      typical,
      max: Math.max(at('max', volts), typical),
    },
    change: (climb) => (climb === 1 ? 1 : at('typical', volts * climb) / typical),
  };
}

/** Leakage as the resistance that draws it at the rated voltage. */
function leakOf({ kind, value, rated }: Capacitor): Band | undefined {
  const data = kind.data;
  if (data?.leakage && rated && data.leakage.max > 0) {
    const ohms = (amps: number) => rated.typical / Math.max(amps, 1e-12);
    return { min: ohms(data.leakage.max), typical: ohms(data.leakage.typical), max: ohms(data.leakage.min) };
  }
  const rate = data?.leakageRate;
  if (!rate || !value) return undefined;
  const ohms = (perSecond: number) => 1 / (Math.max(perSecond, 1e-9) * value.typical);
  return { min: ohms(rate.max), typical: ohms(rate.typical), max: ohms(rate.min) };
}
