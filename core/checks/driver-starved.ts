/**
 * A stage that is not driven hard enough: base current that cannot bring its output to the rail before the phase ends, or a
 * gate voltage too near the threshold.
 */
import { statedVolts, thresholdOf } from '../analysis/mosfet-stage';
import type { BoardAnalysis, DriverUse } from '../analysis/types';
import { originWords } from '../analysis/words';
import type { MosfetData } from '../catalog/part';
import type { Driver, Use } from '../model/board';
import type { Band } from '../quantity/figure';
import { formatQuantity } from '../quantity/write';
import type { Check } from './check';
import { stagesOf } from './driver-stages';
import type { Finding } from './finding';

/** A saturated transistor stays below this (common practice, no source), V. */
const saturated = 0.5;

export const driverStarved: Check = {
  code: 'driver-starved',
  title: 'Driver without enough base current or gate voltage',
  severity: 'error',
  why: 'Base current times gain is all that a transistor can carry: when the pump asks for more, the output stops short of its rail and every stage of the pump loses that.',
  run: (analysis) => [...stages(analysis), ...pairs(analysis)],
};

function stages(analysis: BoardAnalysis): readonly Finding[] {
  return stagesOf(analysis).flatMap(({ driver, use, stage }): Finding[] => {
    if (driver.stage?.kind !== 'push-pull' || driver.stage.sharedBase) return [];
    if (stage.shortOf <= saturated) return [];
    return [
      {
        code: 'driver-starved',
        severity: 'error',
        at: driver.path,
        span: driver.nameSpan,
        message: `${driver.name} ends a phase ${formatQuantity(stage.shortOf, 'V')} short of its rail or ground while it pumps ${use.railName}: ${formatQuantity(stage.baseCurrent, 'A')} of base current at a gain of ${Number(stage.forcedGain.toPrecision(2))} is all it carries. Smaller base resistors, transistors of higher gain or a lower load would let it saturate.`,
        expected: `output within ${saturated} V of its rail and ground`,
        actual: formatQuantity(stage.shortOf, 'V'),
        source: 'solution of the circuit at typical values',
      },
    ];
  });
}

/** At its threshold a MOSFET carries a quarter of a milliampere: it wants this much more (common practice, no source), V. */
const overdrive = 0.5;

function pairs(analysis: BoardAnalysis): readonly Finding[] {
  return [...analysis.drivers.values()].flatMap(({ driver, uses }): readonly Finding[] => {
    const use = uses.find(({ gates }) => gates);
    const { stage } = driver;
    if (!use?.gates || stage?.kind !== 'mosfet-pair') return [];
    const { nVolts, pVolts } = use.gates;
    return [
      ...weakGate(driver, use, 'nmos', stage.nmos, nVolts),
      ...weakGate(driver, use, 'pmos', stage.pmos, pVolts),
    ];
  });
}

function weakGate(
  driver: Driver,
  { clock }: DriverUse,
  which: 'nmos' | 'pmos',
  part: Use<MosfetData> | undefined,
  volts: Band,
): readonly Finding[] {
  const data = part?.data;
  if (!data) return [];
  const threshold = thresholdOf(data);
  const typical = volts.typical - threshold.typical < overdrive;
  if (!typical && volts.min - threshold.max >= overdrive) return [];
  const [gate, limit] = typical ? [volts.typical, threshold.typical] : [volts.min, threshold.max];
  const needed = formatQuantity(limit + overdrive, 'V');
  const where = which === 'nmos' ? 'n-channel' : 'p-channel';
  return [
    {
      code: 'driver-starved',
      severity: typical ? 'error' : 'warning',
      at: `${driver.path}.mosfet-pair.${which}`,
      span: part.span,
      message: `${driver.name}: ${clock.clock.name} gives the gate of its ${where} MOSFET ${formatQuantity(gate, 'V')}${typical ? '' : ' at a corner'}, and ${typical ? 'its' : 'a'} threshold ${typical ? 'is' : 'may be'} ${formatQuantity(limit, 'V')}: less than ${overdrive} V beyond it the transistor is not on. ${data.title} holds its ${formatQuantity(data.onResistance.typical, 'ohm')} at ${formatQuantity(statedVolts(data), 'V')}. Use one of lower threshold, or a clock and a driver rail of higher level.`,
      expected: `at least ${needed} at the gate`,
      actual: formatQuantity(gate, 'V'),
      source: originWords(data.threshold.origin),
      related: [{ span: clock.clock.nameSpan, message: 'the clock that drives it' }],
    },
  ];
}
