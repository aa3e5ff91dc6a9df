/**
 * Clocks whose levels do not switch the gates or MOSFETs that they drive.
 */
import type { BoardAnalysis, DriverResult } from '../analysis/types';
import { formatQuantity } from '../quantity/write';
import type { Check } from './check';
import type { Finding } from './finding';

export const clockLevel: Check = {
  code: 'clock-level',
  title: 'Clock level that does not switch its driver',
  severity: 'error',
  why: 'A gate below its threshold does not switch, and a p-channel MOSFET stays on as long as its gate is a threshold below its source.',
  run: (analysis) => [...analysis.drivers.values()].flatMap((result) => levels(analysis, result)),
};

function levels(analysis: BoardAnalysis, { driver, uses }: DriverResult): Finding[] {
  const use = uses[0];
  const { stage } = driver;
  if (!use || !stage) return [];
  const clock = analysis.clocks.get(use.clock.clock.name);
  const railName = driver.rail?.name ?? use.clock.output.railName;
  const rail = railName === undefined ? undefined : analysis.rails.get(railName)?.voltage?.typical;
  if (!clock || clock.high === null || clock.low === null || rail === undefined) return [];
  const high = formatQuantity(clock.high, 'V');
  const finding = (message: string, expected: string): Finding => ({
    code: 'clock-level',
    severity: 'error',
    at: `${driver.path}.input`,
    span: driver.input?.span ?? driver.nameSpan,
    message,
    expected,
    actual: high,
    source: 'levels of the clock without load',
    related: [{ span: clock.clock.nameSpan, message: 'the clock that drives it' }],
  });
  if (stage.kind === 'mosfet-pair') {
    const threshold = Math.abs(stage.pmos?.data?.threshold.typical ?? Number.POSITIVE_INFINITY);
    if (rail - clock.high <= threshold) return [];
    const needed = formatQuantity(rail - threshold, 'V');
    return [
      finding(
        `${clock.clock.name} reaches only ${high}, so the p-channel MOSFET of ${driver.name} never turns off: it needs more than ${needed}. Use a clock on the driver's rail or a level shifter.`,
        `above ${needed}`,
      ),
    ];
  }
  if (stage.kind !== 'gates') return [];
  const { rising, thresholdSupply } = stage.part?.data ?? {};
  if (!rising) return [];
  const scale = thresholdSupply ? rail / thresholdSupply.typical : 1;
  const needed = scale * rising.max;
  if (clock.high >= needed) return [];
  return [
    finding(
      `${clock.clock.name} reaches only ${high}; the gates of ${driver.name} switch for sure only above ${formatQuantity(needed, 'V')}. Use a clock on the gates' rail or gates with lower thresholds.`,
      `at least ${formatQuantity(needed, 'V')}`,
    ),
  ];
}
