/**
 * Clocks that run at another frequency than the file says, or faster than their timer can.
 */
import type { BoardAnalysis, ClockResult } from '../analysis/types';
import { formatPercent, formatQuantity } from '../quantity/write';
import type { Check } from './check';
import type { Finding } from './finding';

/** Written and real frequency count as the same within this share. */
const same = 5e-3;

export const clockFrequency: Check = {
  code: 'clock-frequency',
  title: 'Clock at another frequency than meant',
  severity: 'error',
  why: 'Every current a pump can deliver goes with its frequency, and a timer beyond its limit makes no clean square wave.',
  run: (analysis: BoardAnalysis) =>
    [...analysis.clocks.values()].flatMap((result) => [...asWritten(result), ...tooFast(result)]),
};

function asWritten({ clock, frequency }: ClockResult): Finding[] {
  const written = clock.timer && clock.frequency;
  if (!written || !frequency) return [];
  const off = frequency.typical / written.typical - 1;
  if (Math.abs(off) <= same) return [];
  const real = formatQuantity(frequency.typical, 'Hz', 4);
  return [
    {
      code: 'clock-frequency',
      severity: 'warning',
      at: `${clock.path}.frequency`,
      span: written.span ?? clock.nameSpan,
      message: `The registers of ${clock.name} make ${real}, ${formatPercent(Math.abs(off), 2)} ${off > 0 ? 'above' : 'below'} the ${formatQuantity(written.typical, 'Hz', 4)} written here; the registers count. Correct one of them, or delete frequency.`,
      expected: real,
      actual: formatQuantity(written.typical, 'Hz', 4),
      source: 'input / (prescaler x (top + 1))',
      related: clock.timer ? [{ span: clock.timer.span, message: 'registers' }] : [],
    },
  ];
}

function tooFast({ clock, frequency }: ClockResult): Finding[] {
  const fastest = clock.astable?.part?.data?.fastest;
  if (!fastest || !frequency || frequency.typical <= fastest.max) return [];
  const most = formatQuantity(fastest.max, 'Hz');
  return [
    {
      code: 'clock-frequency',
      severity: 'error',
      at: `${clock.path}.astable`,
      span: clock.astable?.timing?.span ?? clock.nameSpan,
      message: `${clock.name} would run at ${formatQuantity(frequency.typical, 'Hz')}, faster than the ${most} of its timer. A larger timing capacitor slows it down.`,
      expected: `at most ${most}`,
      actual: formatQuantity(frequency.typical, 'Hz'),
      source: fastest.origin.note ?? fastest.origin.kind,
    },
  ];
}
