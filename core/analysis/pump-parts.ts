/**
 * Diodes and transistors of a pump as variables: values at a point, and ties to the engine.
 */
import type { DiodeData, TransistorData } from '../catalog/part';
import { saturationAtTemperature, temperatureLaws } from '../compute/diode-saturation-temperature';
import { referenceTemperature, thermalVoltage } from '../compute/thermal-voltage';
import type { Parameter } from '../engine';
import type { DiodeValues, TransistorValues } from '../pump/values';
import { type Band, exactly } from '../quantity/figure';
import type { Book, Point, Tie } from './pump-book';

export interface DiodePart {
  values(p: Point): DiodeValues;
  tie(p: Point, place: { index: number; leak?: number; junction?: number }, tie: Tie): void;
}

/** Leakage doubles with this many kelvin (common practice, no source). */
const leakageDoubling = 10;

export function diodePart(
  book: Book,
  label: string,
  path: string,
  data: DiodeData,
  ambient: number,
  /** Junction capacitance over the swing of the pump; left out where it makes no difference. */
  junction?: Band,
): DiodePart {
  const saturation = book.add(`${label} saturation current`, path, 'A', data.saturation);
  const ideality = book.add(`${label} ideality`, path, '1', data.ideality);
  const resistance = book.add(
    `${label} resistance`,
    path,
    'ohm',
    data.resistance.min > 0 ? data.resistance : exactly(1e-3),
  );
  const { leakage, reverse } = data;
  const leak =
    leakage && reverse && leakage.min > 0 ? book.add(`${label} leakage`, path, 'A', leakage) : undefined;
  const charge = junction && book.add(`${label} junction capacitance`, path, 'F', junction);
  const values = (p: Point): DiodeValues => ({
    ...junctionAt(p[saturation]!, p[ideality]!, p[ambient]!, data.kind),
    ohms: p[resistance]!,
    ...(leak === undefined
      ? {}
      : {
          leakOhms:
            reverse!.typical / (p[leak]! * 2 ** ((p[ambient]! - referenceTemperature) / leakageDoubling)),
        }),
    ...(charge === undefined ? {} : { junctionFarads: p[charge]! }),
  });
  return {
    values,
    tie: (p, { index, leak: resistor, junction: capacitor }, tie) => {
      if (resistor !== undefined && leak !== undefined) {
        tie(leak, { kind: 'ohms', index: resistor }, -1 / p[leak]!);
        tie(ambient, { kind: 'ohms', index: resistor }, -Math.LN2 / leakageDoubling);
      }
      if (capacitor !== undefined) tie(charge, { kind: 'farads', index: capacitor });
      tie(saturation, { kind: 'saturation', index });
      tie(resistance, { kind: 'diode-ohms', index });
      for (const variable of [ideality, ambient]) tieJunction(p, variable, index, values, tie);
    },
  };
}

export interface TransistorPart {
  values(p: Point): TransistorValues;
  tie(p: Point, place: { emitterJunction: number; collectorJunction: number }, tie: Tie): void;
}

export function transistorPart(
  book: Book,
  label: string,
  path: string,
  data: TransistorData,
  ambient: number,
): TransistorPart {
  const saturation = book.add(`${label} saturation current`, path, 'A', data.saturation);
  const gain = book.add(`${label} gain`, path, '1', data.gain);
  const storage = data.storage && book.still(`${label} storage time`, path, 's', data.storage);
  const values = (p: Point): TransistorValues => ({
    ...junctionAt(p[saturation]!, 1, p[ambient]!, 'silicon'),
    gain: p[gain]!,
    reverseGain: data.reverseGain?.typical ?? 5,
    baseOhms: data.baseResistance?.typical ?? 10,
    collectorOhms: data.collectorResistance?.typical ?? 1,
    emitterOhms: data.emitterResistance?.typical ?? 0.1,
    ...(storage === undefined ? {} : { storageSeconds: p[storage]! }),
  });
  return {
    values,
    tie: (p, { emitterJunction, collectorJunction }, tie) => {
      for (const index of [emitterJunction, collectorJunction]) {
        tie(saturation, { kind: 'saturation', index });
        tieJunction(p, ambient, index, values, tie);
      }
      // alpha = gain / (gain + 1), and the emitter junction's own saturation current is that of the model over alpha.
      const byGain = 1 / (p[gain]! + 1) ** 2;
      tie(gain, { kind: 'alpha', index: emitterJunction }, byGain);
      tie(gain, { kind: 'saturation', index: emitterJunction }, (-byGain * (p[gain]! + 1)) / p[gain]!);
    },
  };
}

function junctionAt(saturation: number, ideality: number, kelvin: number, kind: DiodeData['kind']) {
  const law = temperatureLaws[kind];
  return {
    saturation:
      saturationAtTemperature(saturation, ideality, law, referenceTemperature, kelvin) ?? saturation,
    slope: ideality * (thermalVoltage(kelvin) ?? Number.NaN),
  };
}

/** Ideality and temperature act on slope and saturation at once; the laws are smooth, a small step serves. */
function tieJunction(
  p: Point,
  variable: number,
  index: number,
  values: (p: Point) => { readonly saturation: number; readonly slope: number },
  tie: Tie,
): void {
  const step = 1e-4 * p[variable]!;
  const moved = [...p];
  moved[variable] = p[variable]! + step;
  const before = values(p);
  const after = values(moved);
  const relative = (key: 'saturation' | 'slope') => Math.log(after[key] / before[key]) / step;
  const parameter = (kind: 'saturation' | 'slope'): Parameter => ({ kind, index });
  tie(variable, parameter('saturation'), relative('saturation'));
  tie(variable, parameter('slope'), relative('slope'));
}
