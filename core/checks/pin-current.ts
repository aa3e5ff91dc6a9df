/**
 * The steady current of a pin in the form that its limits are set against: the largest of its averages and its rms.
 */
import type { PinResult } from '../analysis/types';
import { formatQuantity } from '../quantity/write';

export interface SteadyCurrent {
  readonly amps: number;
  readonly what: 'average sourced' | 'average sunk' | 'rms';
}

/** Undefined when nothing of the pin was computed. */
export function steadyCurrent(pin: PinResult): SteadyCurrent | undefined {
  const known: SteadyCurrent[] = [];
  if (pin.rms !== null) known.push({ amps: pin.rms, what: 'rms' });
  if (pin.sourceAverage !== null) known.push({ amps: pin.sourceAverage, what: 'average sourced' });
  if (pin.sinkAverage !== null) known.push({ amps: pin.sinkAverage, what: 'average sunk' });
  if (known.length === 0) return undefined;
  return known.reduce((worst, next) => (next.amps > worst.amps ? next : worst));
}

/** `18 mA rms (average 7 mA out, 7 mA in, peaks 60 mA)`: what one limit is set against, the rest beside it. */
export function currentWords(pin: PinResult, { amps, what }: SteadyCurrent): string {
  const rest = [
    pin.sourceAverage === null ? '' : `average ${formatQuantity(pin.sourceAverage, 'A')} out`,
    pin.sinkAverage === null ? '' : `${formatQuantity(pin.sinkAverage, 'A')} in`,
    pin.peakSource === null && pin.peakSink === null
      ? ''
      : `peaks ${formatQuantity(Math.max(pin.peakSource ?? 0, pin.peakSink ?? 0), 'A')}`,
  ].filter((part) => part !== '');
  return `${formatQuantity(amps, 'A')} ${what} (${rest.join(', ')})`;
}
