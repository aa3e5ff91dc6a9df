/**
 * A pair of MOSFETs as a driver: its resistances at the gate voltage that the clock gives, how its gates load the clock
 * and slow the edges, and what flows through both transistors meanwhile.
 */
import type { MosfetData } from '../catalog/part';
import {
  drivenResistance,
  gateCurrent,
  gatePulseRms,
  gateRamp,
  transconductance,
  unequalCrossingCharge,
} from '../compute/gate-drive';
import type { DriverStage } from '../model/board';
import type { Band } from '../quantity/figure';
import type { ClockSource } from './clock-source';
import type { DriveFigures } from './types';

type Pair = Extract<DriverStage, { kind: 'mosfet-pair' }>;

/** Gate voltage at which on-resistance and gate charge hold where a part does not say (common practice, no source), V. */
const usualGateVolts = 4.5;
/** Nearer to its threshold than this the resistance is no longer a number to rely on, V. */
const leastOverdrive = 0.1;

/** Levels of the clock's output without load, V. */
export interface ClockLevels {
  readonly high: Band;
  readonly low: Band;
}

/** What the gates of one driver ask of the clock, and what the edges cost. */
export interface GateDrive {
  /** Gate voltages while on, magnitudes, V. */
  readonly nVolts: Band;
  readonly pVolts: Band;
  /** Edges of the gates while the clock rises and falls, s, the clock's own in them. */
  readonly rise: number;
  readonly fall: number;
  /** Null where a gate charge is not known; the edges are then those of the clock. */
  readonly load: GateLoad | null;
}

export interface GateLoad {
  /** Out of and into the clock's output: typical, and with everything that takes most. */
  readonly typical: DriveFigures;
  readonly most: DriveFigures;
  readonly least: DriveFigures;
  /** Average through both transistors at once, A, and at typical values as charge per edge, C. */
  readonly cross: Band;
  readonly crossCharge: number;
}

/** On-resistances at the gate voltages, ohm: high and low side. */
export function mosfetOhms(
  n: MosfetData,
  p: MosfetData,
  { nVolts, pVolts }: Pick<GateDrive, 'nVolts' | 'pVolts'>,
): { high: Band; low: Band } {
  return { high: ohmsAt(p, pVolts), low: ohmsAt(n, nVolts) };
}

function ohmsAt(data: MosfetData, volts: Band): Band {
  const stated = statedVolts(data);
  const at = (ohms: keyof Band, gate: keyof Band) => {
    const threshold = thresholdOf(data)[ohms];
    const gateV = Math.max(volts[gate], threshold + leastOverdrive);
    return drivenResistance(data.onResistance[ohms], stated, threshold, gateV) ?? data.onResistance[ohms];
  };
  return { min: at('min', 'max'), typical: at('typical', 'typical'), max: at('max', 'min') };
}

/** A p-channel part may give its threshold with either sign. */
export function thresholdOf({ threshold }: MosfetData): Band {
  const { min, typical, max } = threshold;
  return typical >= 0 ? { min, typical, max } : { min: -max, typical: -typical, max: -min };
}

export function statedVolts({ gateVoltage }: MosfetData): number {
  return gateVoltage?.typical ?? usualGateVolts;
}

/** Gate voltages of a pair between `rail` and ground behind a clock with these levels. */
export function gateVolts(rail: Band, { high, low }: ClockLevels): Pick<GateDrive, 'nVolts' | 'pVolts'> {
  return {
    nVolts: high,
    pVolts: { min: rail.min - low.max, typical: rail.typical - low.typical, max: rail.max - low.min },
  };
}

export function gateDrive(
  pair: Pair,
  n: MosfetData,
  p: MosfetData,
  rail: Band,
  levels: ClockLevels,
  clock: ClockSource,
): GateDrive {
  const volts = gateVolts(rail, levels);
  const at = (size: End) => caseAt(pair, n, p, rail, levels, clock, size);
  const typical = at(ends.typical);
  const [most, least] = [at(ends.most), at(ends.least)];
  if (!typical || !most || !least) return { ...volts, rise: clock.rise, fall: clock.fall, load: null };
  return {
    ...volts,
    rise: typical.rise,
    fall: typical.fall,
    load: {
      typical: typical.figures,
      most: most.figures,
      least: least.figures,
      cross: {
        min: Math.min(least.cross, typical.cross),
        typical: typical.cross,
        max: Math.max(most.cross, typical.cross),
      },
      crossCharge: typical.cross / (2 * clock.frequency.typical),
    },
  };
}

/** Ends of the bands that together take typical, most and least. */
interface End {
  readonly large: keyof Band;
  readonly small: keyof Band;
}
const ends = {
  typical: { large: 'typical', small: 'typical' },
  most: { large: 'max', small: 'min' },
  least: { large: 'min', small: 'max' },
} as const;

interface CaseFigures {
  readonly rise: number;
  readonly fall: number;
  readonly figures: DriveFigures;
  readonly cross: number;
}

/** Undefined where a gate charge is not known or the clock does not swing. */
function caseAt(
  { gate }: Pair,
  n: MosfetData,
  p: MosfetData,
  rail: Band,
  { high, low }: ClockLevels,
  { output, frequency, rise, fall }: ClockSource,
  { large, small }: End,
): CaseFigures | undefined {
  if (!n.gateCharge || !p.gateCharge) return undefined;
  // Both gates hang on one resistor and move together.
  const charge = n.gateCharge[large] + p.gateCharge[large];
  const swing = high[large] - low[small];
  // Peaks want little resistance, long edges much of it: each figure takes the end that makes it largest.
  const ohms = (level: Band, end: keyof Band) => level[end] + (gate?.[end] ?? 0);
  const [up, down] = [ohms(output.highOhms, small), ohms(output.lowOhms, small)];
  const ramp = (level: Band, own: number) => {
    const length = gateRamp(ohms(level, large), charge, swing);
    return length === undefined ? undefined : Math.hypot(own, length);
  };
  const [longUp, longDown] = [ramp(output.highOhms, rise), ramp(output.lowOhms, fall)];
  const rms = gatePulseRms(frequency[large], charge, swing, up, down);
  const average = gateCurrent(charge, frequency[large]);
  if (longUp === undefined || longDown === undefined || rms === undefined || average === undefined)
    return undefined;
  const crossed = [longUp, longDown].map((length) =>
    crossing(n, p, rail[large], (length * rail[large]) / swing, small),
  );
  return {
    rise: longUp,
    fall: longDown,
    figures: {
      sourceAverage: average,
      sinkAverage: average,
      rms,
      peakSource: swing / up,
      peakSink: swing / down,
    },
    cross: frequency[large] * crossed.reduce((sum, part) => sum + part, 0),
  };
}

/** Charge of one edge with resistances and thresholds at that end of their bands, C. */
function crossing(n: MosfetData, p: MosfetData, supplyV: number, rampS: number, end: keyof Band): number {
  const [thresholdN, thresholdP] = [thresholdOf(n)[end], thresholdOf(p)[end]];
  const betaN = transconductance(n.onResistance[end], statedVolts(n), thresholdN);
  const betaP = transconductance(p.onResistance[end], statedVolts(p), thresholdP);
  if (betaN === undefined || betaP === undefined) return 0;
  return unequalCrossingCharge({ betaN, betaP, thresholdN, thresholdP, supplyV, rampS }) ?? 0;
}
