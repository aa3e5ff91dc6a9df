/**
 * A stage whose two transistors conduct at once: because the clock has a short high level, because saturation stores
 * charge, or because the gates of MOSFETs are slow.
 */

import type { BoardAnalysis } from '../analysis/types';
import { formatQuantity } from '../quantity/write';
import type { Check } from './check';
import { pairsOf, type StageInUse, stagesOf } from './driver-stages';
import type { Finding } from './finding';

/** Below this, and below this share of what the stage delivers, nobody would look for it (common practice, no source). */
const leastCurrent = 1e-4;
const leastShare = 0.05;
/** A transistor is off below this base-emitter voltage at room temperature (common practice, no source), V. */
const offVolts = 0.45;

export const driverShootThrough: Check = {
  code: 'driver-shoot-through',
  title: 'Both transistors of a stage conduct at once',
  severity: 'warning',
  why: 'Current from the supply straight to ground heats the stage and empties the battery without moving any charge.',
  run: (analysis) => [...stages(analysis), ...pairs(analysis)],
};

function stages(analysis: BoardAnalysis): readonly Finding[] {
  return stagesOf(analysis).flatMap((found): Finding[] => {
    const { driver, stage } = found;
    const { crossCurrent } = stage;
    if (driver.stage?.kind === 'push-pull' && driver.stage.sharedBase) return [];
    if (crossCurrent < leastCurrent || crossCurrent < leastShare * stage.railCurrent) return [];
    return [
      {
        code: 'driver-shoot-through',
        severity: 'warning',
        at: driver.path,
        span: driver.nameSpan,
        message: `${driver.name}: ${formatQuantity(crossCurrent, 'A')} on average flow through both transistors, ${formatQuantity(stage.crossCharge, 'C')} for each edge, and heat them with ${formatQuantity(stage.dissipation, 'W')}. ${cause(analysis, found)}`,
        expected: `less than ${formatQuantity(leastCurrent, 'A')} and ${100 * leastShare} % of its supply current`,
        actual: formatQuantity(crossCurrent, 'A'),
        source:
          stage.overlapCurrent > 0
            ? 'solution of the circuit at typical values, and charge control for what saturation stores'
            : 'solution of the circuit at typical values',
        related: [{ span: found.use.clock.clock.nameSpan, message: 'the clock that drives it' }],
      },
    ];
  });
}

/** MOSFETs on one gate signal conduct together while it passes the middle. */
function pairs(analysis: BoardAnalysis): readonly Finding[] {
  return pairsOf(analysis).flatMap(({ driver, use, pair }): Finding[] => {
    const { crossCurrent, crossCharge, railCurrent, edgeTime } = pair;
    if (crossCurrent < leastCurrent || crossCurrent < leastShare * railCurrent) return [];
    const gate = driver.stage?.kind === 'mosfet-pair' ? driver.stage.gate?.typical : undefined;
    const slow = gate ? `a gate resistor below its ${formatQuantity(gate, 'ohm')}` : 'a stronger clock';
    return [
      {
        code: 'driver-shoot-through',
        severity: 'warning',
        at: driver.path,
        span: driver.nameSpan,
        message: `${driver.name}: its gates take up to ${formatQuantity(edgeTime, 's', 2)} for an edge, and meanwhile both MOSFETs conduct: ${formatQuantity(crossCharge, 'C', 2)} for each edge, ${formatQuantity(crossCurrent, 'A', 2)} on average, somewhat less under load. Smaller MOSFETs with less gate charge, ${slow} or a lower frequency shorten it; separate gate signals with a pause between them avoid it.`,
        expected: `less than ${formatQuantity(leastCurrent, 'A')} and ${100 * leastShare} % of its supply current`,
        actual: formatQuantity(crossCurrent, 'A'),
        source: 'closed form for an unloaded pair, H. J. M. Veendrick, 1984 (from memory: confirm)',
        related: [{ span: use.clock.clock.nameSpan, message: 'the clock that drives it' }],
      },
    ];
  });
}

/** A stage is saturated at this ratio of collector to base current, with a margin (common practice, no source). */
const designGain = 10;

/** Charge that saturation stores: less base current stores less, as far as it still saturates. */
function storageCause({ driver, stage }: StageInUse): string {
  const base = driver.stage?.kind === 'push-pull' ? driver.stage.base : undefined;
  const peak = Math.max(stage.collectorPeaks.npn, stage.collectorPeaks.pnp);
  const factor = (designGain * stage.baseCurrent) / peak;
  const present = Math.min(base?.npn?.typical ?? 0, base?.pnp?.typical ?? 0);
  const resistors =
    present > 0 && factor > 1.5
      ? `Base resistors of about ${formatQuantity(present * factor, 'ohm', 2)} instead of ${formatQuantity(present, 'ohm', 2)} still saturate it and store less;`
      : 'Transistors of shorter storage time cure it;';
  return `Most of it flows for up to ${formatQuantity(stage.overlapTime, 's', 2)} after each edge, until the charge of saturation is gone. ${resistors} a resistor from base to emitter, a small capacitor across each base resistor or a lower frequency helps too.`;
}

/** What keeps the upper transistor on while it should be off, and the resistor that would turn it off. */
function cause(analysis: BoardAnalysis, found: StageInUse): string {
  const { driver, use, stage } = found;
  if (stage.overlapCurrent > 0.5 * stage.crossCurrent) return storageCause(found);
  const high = analysis.clocks.get(use.clock.clock.name)?.high;
  const railName = driver.rail?.name ?? use.clock.output.railName;
  const rail = railName === undefined ? undefined : analysis.rails.get(railName)?.voltage?.typical;
  if (high === null || high === undefined || rail === undefined)
    return 'Look at the levels and edges of its clock.';
  const gap = rail - high;
  if (gap < offVolts) return 'The levels of its clock are far enough apart: faster edges would shorten it.';
  const base = driver.stage?.kind === 'push-pull' ? driver.stage.base?.pnp?.typical : undefined;
  const resistor =
    base === undefined
      ? ''
      : ` A resistor of ${formatQuantity((base * offVolts) / (gap - offVolts), 'ohm', 2)} or less from the base of the pnp to its emitter turns it off (and takes base current);`;
  return `The clock's high level of ${formatQuantity(high, 'V')} stays ${formatQuantity(gap, 'V')} below the driver's rail, which leaves the pnp partly on.${resistor} a clock that reaches the rail, or a driver rail of ${formatQuantity(high + offVolts, 'V')} or less, does too.`;
}
