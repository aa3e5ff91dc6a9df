/**
 * All rules in one list, sorted by code: adding a rule is one file and one line. No rule depends on the order.
 */
import type { BoardAnalysis } from '../analysis/types';
import { batteryShortLife } from './battery-short-life';
import { benchDisagrees } from './bench-disagrees';
import { capacitorDerated } from './capacitor-derated';
import { capacitorPolarity } from './capacitor-polarity';
import { capacitorRating } from './capacitor-rating';
import { capacitorRippleCurrent } from './capacitor-ripple-current';
import type { Check } from './check';
import { chipOverLimit } from './chip-over-limit';
import { chipVoltage } from './chip-voltage';
import { clockFrequency } from './clock-frequency';
import { clockLevel } from './clock-level';
import { diodeCurrent } from './diode-current';
import { diodeReverse } from './diode-reverse';
import { driverOverLimit } from './driver-over-limit';
import { driverSharedBase } from './driver-shared-base';
import { driverShootThrough } from './driver-shoot-through';
import { driverStarved } from './driver-starved';
import type { Finding } from './finding';
import { groupOverLimit } from './group-over-limit';
import { inrushPin } from './inrush-pin';
import { inrushSupply } from './inrush-supply';
import { loadVoltage } from './load-voltage';
import { notComputed } from './not-computed';
import { over60Volts } from './over-60-volts';
import { pinOverAbsolute } from './pin-over-absolute';
import { pinOverRecommended } from './pin-over-recommended';
import { pinPeak } from './pin-peak';
import { railHigh } from './rail-high';
import { railLow } from './rail-low';
import { railStalls } from './rail-stalls';
import { regulatorDropout } from './regulator-dropout';
import { regulatorHot } from './regulator-hot';
import { regulatorOverLimit } from './regulator-over-limit';
import { rippleHigh } from './ripple-high';
import { startSlow } from './start-slow';
import { storedCharge } from './stored-charge';
import { supplyOverLimit } from './supply-over-limit';
import { unused } from './unused';

export const checks: readonly Check[] = [
  batteryShortLife,
  benchDisagrees,
  capacitorDerated,
  capacitorPolarity,
  capacitorRating,
  capacitorRippleCurrent,
  chipOverLimit,
  chipVoltage,
  clockFrequency,
  clockLevel,
  diodeCurrent,
  diodeReverse,
  driverOverLimit,
  driverSharedBase,
  driverShootThrough,
  driverStarved,
  groupOverLimit,
  inrushPin,
  inrushSupply,
  loadVoltage,
  notComputed,
  over60Volts,
  pinOverAbsolute,
  pinOverRecommended,
  pinPeak,
  railHigh,
  railLow,
  railStalls,
  regulatorDropout,
  regulatorHot,
  regulatorOverLimit,
  rippleHigh,
  startSlow,
  storedCharge,
  supplyOverLimit,
  unused,
];

/** What all rules say about a board, in the order of the text. */
export function runChecks(analysis: BoardAnalysis): readonly Finding[] {
  return sortFindings(checks.flatMap((check) => check.run(analysis)));
}

/** By place in the text, then by code and path, so that the same board always gives the same list. */
export function sortFindings(findings: readonly Finding[]): readonly Finding[] {
  return [...findings].sort(
    (a, b) =>
      a.span.start - b.span.start ||
      a.span.end - b.span.end ||
      compare(a.code, b.code) ||
      compare(a.at, b.at) ||
      compare(a.message, b.message),
  );
}

function compare(a: string, b: string): number {
  return a < b ? -1 : a > b ? 1 : 0;
}
