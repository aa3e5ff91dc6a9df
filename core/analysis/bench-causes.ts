/**
 * What usually makes a bench differ from a prediction when no tolerance does, fitted to the sign of the difference.
 * Common practice, no source.
 */
import { formatQuantity } from '../quantity/write';
import type { Target } from './pump-corners';
import type { BenchComparison, BenchResult } from './types';
import { volts } from './words';

/** Causes told at once: more are a textbook. */
const mostTold = 4;

/** Clauses for a list, the most common first; empty without a comparison of the target. */
export function usualCauses(result: BenchResult, target: Target): readonly string[] {
  const comparison = result[target];
  if (!comparison) return [];
  const list = target === 'ripple' ? rippleCauses(comparison) : voltageCauses(result, comparison);
  return list.slice(0, mostTold);
}

function voltageCauses(result: BenchResult, comparison: BenchComparison): readonly string[] {
  const { measured, predicted } = comparison;
  if (measured.typical * predicted.typical < 0)
    return [
      `a sign: this rail is ${predicted.typical < 0 ? 'negative' : 'positive'}, or the leads were swapped`,
    ];
  const weak = Math.abs(measured.typical) < Math.abs(predicted.typical);
  switch (result.rail?.origin?.kind) {
    case 'pump':
      return weak
        ? [
            ...loading(result, comparison),
            'a flying capacitor that lost capacitance to its d.c. bias, or is of another kind',
            'a supply below its nominal voltage',
            'resistance of leads and breadboard contacts in the path of the drive',
            'diodes with a larger drop than named here',
          ]
        : [
            'a supply above its nominal voltage',
            'a load that draws less than entered',
            'diodes with a smaller drop than named here',
          ];
    case 'regulator':
      return weak
        ? [
            'resistance of leads and breadboard contacts between the regulator and the meter',
            'an input that sags below the output and the dropout',
            'a regulator at its current limit',
          ]
        : ['a load below the least one that the regulator needs', 'a ground lead that carries current'];
    default:
      return weak
        ? [
            'a supply below its nominal voltage',
            'resistance of leads and breadboard contacts',
            ...loading(result, comparison),
          ]
        : ['a supply above its nominal voltage', 'a load that draws less than entered'];
  }
}

/** Input resistance of a scope's plain probe; a handheld meter's is ten times as large. */
const probeOhms = 1e6;
/** Less than this share of the deviation is not worth a word. */
const worthTelling = 0.1;

function loading(
  { outputResistance }: BenchResult,
  { measured, deviation }: BenchComparison,
): readonly string[] {
  const amps = Math.abs(measured.typical) / probeOhms;
  const drop = amps * (outputResistance ?? 0);
  if (!(drop >= worthTelling * Math.abs(deviation))) return [];
  return [
    `the probe as a load (1 Mohm takes ${formatQuantity(amps, 'A', 2)}, which costs ${volts(drop)} here)`,
  ];
}

function rippleCauses({ deviation }: BenchComparison): readonly string[] {
  return deviation > 0
    ? [
        'a long ground lead of the probe that picks up the edges of the clock',
        'a reservoir that lost capacitance to its d.c. bias, or has more series resistance than its kind',
        'a load that draws in pulses',
      ]
    : [
        'a bandwidth limit or an averaging meter that hides the peaks',
        'more capacitance on the rail than the file names, such as that of the load',
        'a load that draws less than entered',
      ];
}
