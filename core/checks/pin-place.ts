/**
 * Where the file speaks of a pin: its drive setting, its entry, or the clock that uses it, whichever is the
 * smallest thing to change.
 */
import type { BoardAnalysis, PinResult } from '../analysis/types';
import type { Span } from '../text/span';
import type { Related } from './finding';

export interface PinPlace {
  readonly at: string;
  readonly span: Span;
}

export function pinPlace(analysis: BoardAnalysis, pin: PinResult): PinPlace {
  const listed = pin.chip.pins.get(pin.name);
  if (listed?.strength) return { at: `${listed.path}.strength`, span: listed.strength.span };
  if (listed) return { at: listed.path, span: listed.nameSpan };
  for (const clock of analysis.reading.board.clocks.values()) {
    if (clock.pin?.chip === pin.chip.name && clock.pin.pin === pin.name)
      return { at: `${clock.path}.pin`, span: clock.pin.span };
  }
  return { at: pin.chip.path, span: pin.chip.nameSpan };
}

/** The rails whose pumps the pin drives, as second places. */
export function drivenRails(analysis: BoardAnalysis, pin: PinResult): readonly Related[] {
  return pin.drives.flatMap((name) => {
    const rail = analysis.rails.get(name)?.rail;
    return rail ? [{ span: rail.nameSpan, message: `${pin.key} drives the pump of ${name}` }] : [];
  });
}
