/**
 * The steady current of a pin in the form that its limits are set against: the largest of its averages and its rms.
 */
import type { PinResult } from '../analysis/types';
import { cornerWords } from '../analysis/words';
import { formatQuantity } from '../quantity/write';

export interface SteadyCurrent {
  readonly amps: number;
  readonly what: 'average sourced' | 'average sunk' | 'rms';
}

type Figures = Pick<PinResult, 'rms' | 'sourceAverage' | 'sinkAverage' | 'peakSource' | 'peakSink'>;

/** Undefined when nothing of the pin was computed. */
export function steadyCurrent(pin: Figures): SteadyCurrent | undefined {
  const known: SteadyCurrent[] = [];
  if (pin.rms !== null) known.push({ amps: pin.rms, what: 'rms' });
  if (pin.sourceAverage !== null) known.push({ amps: pin.sourceAverage, what: 'average sourced' });
  if (pin.sinkAverage !== null) known.push({ amps: pin.sinkAverage, what: 'average sunk' });
  if (known.length === 0) return undefined;
  return known.reduce((worst, next) => (next.amps > worst.amps ? next : worst));
}

/** `18 mA rms (average 7 mA out, 7 mA in, peaks 60 mA)`: what one limit is set against, the rest beside it. */
export function currentWords(pin: Figures, { amps, what }: SteadyCurrent): string {
  const rest = [
    pin.sourceAverage === null ? '' : `average ${formatQuantity(pin.sourceAverage, 'A')} out`,
    pin.sinkAverage === null ? '' : `${formatQuantity(pin.sinkAverage, 'A')} in`,
    pin.peakSource === null && pin.peakSink === null
      ? ''
      : `peaks ${formatQuantity(Math.max(pin.peakSource ?? 0, pin.peakSink ?? 0), 'A')}`,
  ].filter((part) => part !== '');
  return `${formatQuantity(amps, 'A')} ${what} (${rest.join(', ')})`;
}

/** A pin beyond a limit: at typical values, or only at the corner that is then named. */
export interface Excess {
  readonly current: SteadyCurrent;
  /** `18 mA rms (average ...)`, with the corner behind it where there is one. */
  readonly words: string;
  readonly onlyAtCorner: boolean;
}

/** Undefined when the pin keeps the limit everywhere. */
export function excessOver(pin: PinResult, limitA: number): Excess | undefined {
  const beyond = (current: SteadyCurrent | undefined) => current && current.amps > limitA * (1 + 1e-9);
  const typical = steadyCurrent(pin);
  if (typical && beyond(typical))
    return { current: typical, words: currentWords(pin, typical), onlyAtCorner: false };
  const corner = pin.corner && steadyCurrent(pin.corner);
  if (!pin.corner || !corner || !beyond(corner)) return undefined;
  const settings = cornerWords({ value: corner.amps, settings: pin.corner.settings });
  const at = settings ? ` at the corner: ${settings}` : ' at the end of its tolerance';
  return { current: corner, words: `${currentWords(pin.corner, corner)}${at}`, onlyAtCorner: true };
}
