/**
 * What would bring a weak pump up to its need, with figures: one or two sentences that name the loss that holds it
 * down and tell a remedy that works from one that cannot. Estimates; the sizing command computes exactly.
 */

import { capacitanceFactor, type PumpLosses, pumpLosses } from '../analysis/losses';
import type { RailResult } from '../analysis/types';
import { volts } from '../analysis/words';
import type { Pump } from '../model/board';
import { nextPreferredUp } from '../quantity/preferred';
import { formatQuantity } from '../quantity/write';

export function pumpCure(result: RailResult, missingV: number): string {
  if (result.rail.origin?.kind !== 'pump' || result.pump === undefined) return originCure(result);
  const { pump } = result.rail.origin;
  const losses = pumpLosses(pump, result.pump);
  if (losses === undefined) return 'The pump is overloaded: lighten the load or lower its output resistance.';
  return `${sentenceAboutLoss(losses)} ${sentenceAboutRemedy(pump, losses, missingV)}`;
}

function originCure({ rail }: RailResult): string {
  switch (rail.origin?.kind) {
    case 'regulator':
      return 'Choose another output of the regulator, or widen the need.';
    case 'supply':
      return 'Choose another supply, or a pump or regulator between it and the load.';
    default:
      return 'Lighten the load, or change what feeds this rail.';
  }
}

function sentenceAboutLoss(losses: PumpLosses): string {
  const { largest, slowOhm, fastOhm, diodes, diodeV, currentA } = losses;
  const at = formatQuantity(currentA, 'A');
  switch (largest) {
    case 'capacitance':
      return `The slow limit dominates: moving charge at 1/(f C) makes ${formatQuantity(slowOhm, 'ohm')}, ${volts(currentA * slowOhm)} at ${at}.`;
    case 'resistance':
      return `The fast limit dominates: drive, diodes and ESR make ${formatQuantity(fastOhm, 'ohm')}, ${volts(currentA * fastOhm)} at ${at}.`;
    case 'diodes':
      return `The diodes cost most: ${diodes} drops of ${volts(diodeV)}.`;
  }
}

function sentenceAboutRemedy(pump: Pump, losses: PumpLosses, missingV: number): string {
  const diode = diodeRemedy(pump, losses);
  // The diodes first where they are the trouble: no capacitor gives back what the cold takes.
  if (losses.largest === 'diodes' && diode !== undefined && diode.winsV >= missingV) return `${diode.words}.`;
  const flying = flyingRemedy(pump, losses, missingV);
  if (flying !== undefined) return flying;
  const { capacitanceWinsV, resistanceWinsV } = losses;
  const useless = `More capacitance or frequency wins ${volts(capacitanceWinsV)} at most`;
  if (resistanceWinsV >= 1.1 * missingV) {
    return `${useless}; a stronger drive (pin setting, pins in parallel, a driver stage) can win up to ${volts(resistanceWinsV)}.`;
  }
  if (diode !== undefined && diode.winsV + resistanceWinsV >= missingV) return `${useless}; ${diode.words}.`;
  return `${useless} and a stronger drive ${volts(resistanceWinsV)}: it takes another stage, a higher input or a lighter load.`;
}

function flyingRemedy(pump: Pump, losses: PumpLosses, missingV: number): string | undefined {
  // A tenth more than is missing, since this is an estimate.
  const factor = capacitanceFactor(losses, 1.1 * missingV);
  const present = pump.flying[0]?.value?.typical;
  if (factor === undefined || present === undefined || factor > 100) return undefined;
  const proposed = nextPreferredUp(present * factor, 'E6');
  return `About ${formatQuantity(proposed, 'F')} instead of ${formatQuantity(present, 'F')} flying capacitance, or ${Number(factor.toPrecision(2))} times the frequency, would do.`;
}

/** What Schottky diodes would win over silicon: the usual difference of the two at small currents. */
function diodeRemedy(pump: Pump, { diodes }: PumpLosses): { words: string; winsV: number } | undefined {
  const silicon = pump.diodes.some((diode) => diode.data?.kind === 'silicon');
  if (!silicon) return undefined;
  const winsV = diodes * schottkyGainV;
  return { words: `Schottky diodes would win about ${volts(winsV)}`, winsV };
}

/** Common practice: about 0.6 V of silicon against 0.3 V of a small Schottky diode. */
const schottkyGainV = 0.3;
