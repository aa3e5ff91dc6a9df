/**
 * A resistor or an inductor and a capacitor behind a rail: what the current through it costs, and what it leaves of
 * the ripple of the rail in front.
 */
import { filteredRipple } from '../compute/filtered-ripple';
import type { Filter } from '../model/board';
import type { Band } from '../quantity/figure';
import type { Waveform } from './curves';
import { biasOf } from './pump-capacitors';

/** Typical figures and the ends of the band; an inductor's own resistance is not known and counts as none. */
export function filterOhms({ resistor }: Filter): Band {
  return resistor ?? { min: 0, typical: 0, max: 0 };
}

/** Value that works at `volts`, over tolerance and direct voltage, F; undefined without a usable value. */
export function filterFarads({ capacitor }: Filter, volts: number): Band | undefined {
  const value = capacitor?.value;
  if (!capacitor || !value || !(value.min > 0)) return undefined;
  const tolerance = capacitor.toleranceGiven ? undefined : capacitor.kind.data?.tolerance;
  const left = biasOf(capacitor, volts)?.band ?? { min: 1, typical: 1, max: 1 };
  return {
    min: (tolerance ? value.typical * (1 + tolerance.min) : value.min) * left.min,
    typical: value.typical * left.typical,
    max: (tolerance ? value.typical * (1 + tolerance.max) : value.max) * left.max,
  };
}

/**
 * Ripple behind the filter, V peak to peak: weakest with the smallest parts. `wave` is one period of the rail in
 * front, `amps` the current that the load takes. Null where a part has no usable value.
 */
export function filterRipple(
  filter: Filter,
  wave: Pick<Waveform, 'time' | 'output'>,
  volts: number,
  amps: number,
): Band | null {
  const farads = filterFarads(filter, volts);
  if (!farads) return null;
  const series = filter.resistor ?? filter.inductor;
  if (!series) return null;
  // The curve's first point lies one step after the period's start, where the last one of the period before stood.
  const time = [0, ...wave.time];
  const source = [wave.output.at(-1) ?? 0, ...wave.output];
  const at = (part: keyof Band, value: keyof Band, esr: keyof Band) =>
    filteredRipple(time, source, {
      ohms: filter.resistor?.[part] ?? 0,
      henries: filter.inductor?.[part] ?? 0,
      farads: farads[value],
      esrOhms: filter.capacitor?.esr?.[esr] ?? 0,
      loadOhms: amps > 0 ? Math.abs(volts) / amps : Number.POSITIVE_INFINITY,
    });
  const [typical, least, most] = [
    at('typical', 'typical', 'typical'),
    at('max', 'max', 'min'),
    at('min', 'min', 'max'),
  ];
  if (typical === undefined || least === undefined || most === undefined) return null;
  return { min: Math.min(least, typical), typical, max: Math.max(most, typical) };
}
