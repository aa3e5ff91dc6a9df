/**
 * A caution, not a fault: somewhere on the board more than 60 V d.c. may stand, under which touch is usually taken
 * to be harmless in dry surroundings.
 */
import type { RailResult } from '../analysis/types';
import { formatQuantity } from '../quantity/write';
import type { Check } from './check';
import type { Finding } from './finding';

/** Extra-low voltage, d.c., as common standards draw the line (from memory: confirm). */
const cautionV = 60;
/** Upper edge of the next class of IEC 62368-1 (from memory: confirm). */
const benchV = 120;

export const over60Volts: Check = {
  code: 'over-60-volts',
  title: 'More than 60 V direct voltage',
  severity: 'warning',
  why: 'Above this voltage insulation, spacing and touch are matters of safety rules, and a pump’s capacitors keep their charge after power-off.',
  run: (analysis) => [...analysis.rails.values()].flatMap(judge),
};

function judge(result: RailResult): readonly Finding[] {
  const places = highest(result);
  const worst = places.reduce((a, b) => (b.volts > a.volts ? b : a), { what: '', volts: 0 });
  if (!(worst.volts > cautionV)) return [];
  const { path, nameSpan } = result.rail;
  return [
    {
      code: 'over-60-volts',
      severity: 'warning',
      at: path,
      span: nameSpan,
      message: `${worst.what} can reach ${formatQuantity(worst.volts, 'V')}, above 60 V d.c.${worst.volts > benchV ? ' and beyond what belongs on an open bench' : ''}. Plan insulation, spacing, discharge and covers; the electrical safety rules of your place and people licensed to work under them decide what is allowed.`,
      expected: 'up to 60 V d.c. without further precautions',
      actual: formatQuantity(worst.volts, 'V'),
      source: 'usual limit of extra-low voltage; from memory: confirm',
    },
  ];
}

function highest(result: RailResult): readonly { readonly what: string; readonly volts: number }[] {
  const { rail, voltage, pump } = result;
  const rows = voltage
    ? [{ what: rail.name, volts: Math.max(Math.abs(voltage.min), Math.abs(voltage.max)) }]
    : [];
  if (pump === undefined) return rows;
  for (const { value } of [pump.voltage.lowest, pump.voltage.highest])
    rows.push({ what: rail.name, volts: Math.abs(value) });
  for (const point of pump.points) {
    // Without its load a pump climbs towards the ideal.
    rows.push({ what: `${rail.name} without its load`, volts: Math.abs(point.ideal) });
    for (const { key, voltage: volts } of point.capacitors) rows.push({ what: key, volts });
  }
  return rows;
}
