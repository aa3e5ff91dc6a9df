/**
 * What stays on a rail after switch-off: longer than it may, or more than hands should meet. A caution, with the
 * resistor that takes it away.
 */

import type { BoardAnalysis, RailResult } from '../analysis/types';
import { bleeder, dischargeTime } from '../compute/stored-energy';
import { touchableCapacitance } from '../compute/touch-limit';
import { nextPreferredDown } from '../quantity/preferred';
import { formatQuantity } from '../quantity/write';
import { insertFirst } from '../text/insert-key';
import type { Check } from './check';
import type { Finding, Fix } from './finding';
import { plainQuantity, replaceWith } from './fixes';

/** Energy in a short circuit from which metal melts and skin burns, J (common practice, no source). */
const burning = 10;
/** Time after which a place that people reach is usually measured, s (IEC 62368-1; from memory: confirm). */
const reached = 2;
const touchable = 60;

export const storedCharge: Check = {
  code: 'stored-charge',
  title: 'Charge that stays after switch-off',
  severity: 'error',
  why: 'Capacitors of a pump keep their voltage when the power is gone; nothing on the board tells that to the hand that touches it.',
  run: (analysis) =>
    [...analysis.rails.values()].flatMap(
      (result) => tooSlow(analysis, result) ?? dangerous(analysis, result),
    ),
};

/** Undefined when the rail has no such need, or meets it. */
function tooSlow(analysis: BoardAnalysis, result: RailResult): readonly Finding[] | undefined {
  const { rail, pump, transients } = result;
  const allowed = rail.needs?.discharge;
  if (!allowed || !pump || !transients) return undefined;
  const course = transients();
  if (!course) return undefined;
  const { dischargeTime: time, dischargeLevel: level } = course;
  if (time !== null && time <= allowed.max) return undefined;
  const took = time === null ? 'longer than anybody waits' : formatQuantity(time, 's');
  const resistor = bleederFor(result, level, allowed.max);
  return [
    {
      code: 'stored-charge',
      severity: 'error',
      at: `${rail.path}.needs.discharge`,
      span: allowed.span ?? rail.nameSpan,
      message: `${rail.name} takes ${took} to fall below ${formatQuantity(level, 'V')} after switch-off, and ${formatQuantity(allowed.max, 's')} are allowed. ${resistor.words}`,
      expected: `within ${formatQuantity(allowed.max, 's')}`,
      actual: took,
      source: 'switch-off from the heaviest mode at typical values, clock low, loads as they are',
      fixes: bleederFix(analysis, result, resistor.ohms),
    },
  ];
}

function dangerous(analysis: BoardAnalysis, result: RailResult): readonly Finding[] {
  const { rail, pump, storedEnergy } = result;
  if (!pump) return [];
  const { volts, farads } = stored(result);
  const limit = touchableCapacitance(volts) ?? Number.POSITIVE_INFINITY;
  const quick =
    rail.bleeder &&
    (dischargeTime(rail.bleeder.max, farads, volts, Math.min(volts, touchable)) ?? 0) <= reached;
  if (farads > limit && !quick) {
    const resistor = bleederFor(result, touchable, reached);
    return [
      {
        code: 'stored-charge',
        severity: 'warning',
        at: rail.path,
        span: rail.nameSpan,
        message: `${rail.name} may keep ${formatQuantity(volts, 'V')} on ${formatQuantity(farads, 'F', 2)} after switch-off, more than a place within reach should (${formatQuantity(limit, 'F', 2)} at that voltage). ${resistor.words} Discharge and measure before touching; the electrical safety rules of your place and people licensed to work under them decide what is allowed.`,
        expected: `at most ${formatQuantity(limit, 'F', 2)}, or below 60 V within ${reached} s`,
        actual: formatQuantity(farads, 'F', 2),
        source: 'IEC 62368-1, charged capacitors; from memory: confirm',
        fixes: bleederFix(analysis, result, resistor.ohms),
      },
    ];
  }
  if (!(storedEnergy !== null && storedEnergy > burning)) return [];
  return [
    {
      code: 'stored-charge',
      severity: 'information',
      at: rail.path,
      span: rail.nameSpan,
      message: `${rail.name} stores ${Number(storedEnergy.toPrecision(2))} J: a short circuit of its capacitors welds and burns, at any voltage. Discharge it through a resistor before working on it.`,
      actual: `${Number(storedEnergy.toPrecision(2))} J`,
      source: 'common practice, no source',
    },
  ];
}

/** Highest voltage without load, and the capacitance that stands on the output at most, cautious. */
function stored({ pump }: RailResult): { volts: number; farads: number } {
  const { heaviest, voltage } = pump!;
  const volts = Math.max(
    Math.abs(voltage.lowest.value),
    Math.abs(voltage.highest.value),
    ...pump!.points.map(({ ideal }) => Math.abs(ideal)),
  );
  const reservoir = heaviest.capacitors.filter(({ key }) => key.endsWith('.reservoir'));
  const column =
    reservoir.length > 0 ? reservoir : heaviest.capacitors.filter(({ key }) => key.includes('.smoothing'));
  // A column of smoothing capacitors stands in series.
  const farads = 1 / column.reduce((sum, { effective }) => sum + 1 / effective, 0);
  return { volts, farads: Number.isFinite(farads) ? farads : 0 };
}

function bleederFor(result: RailResult, level: number, seconds: number): { words: string; ohms?: number } {
  const volts = Math.max(stored(result).volts, Math.abs(result.voltage?.typical ?? 0));
  // Whatever a flying capacitor can still give follows the reservoir through the last diode.
  const farads = result.pump!.heaviest.capacitors.reduce((sum, { effective }) => sum + effective, 0);
  const found = bleeder(farads, volts, level, seconds);
  if (!found) return { words: 'A bleeder across it takes the charge away.' };
  const ohms = nextPreferredDown(found.resistanceOhm, 'E12');
  const watts = volts ** 2 / ohms;
  return {
    ohms,
    words: `A bleeder of ${formatQuantity(ohms, 'ohm')} does it, at ${formatQuantity(watts, 'W', 2)} and ${formatQuantity(volts / ohms, 'A', 2)} all the time.`,
  };
}

function bleederFix({ text }: BoardAnalysis, { rail }: RailResult, ohms: number | undefined): readonly Fix[] {
  if (ohms === undefined) return [];
  const value = plainQuantity(ohms, 'ohm');
  const title = `Put a bleeder of ${value} across ${rail.name}`;
  if (rail.bleeder) return replaceWith(title, rail.bleeder.span, value);
  const edit = insertFirst(text, rail.keys.values(), 'bleeder', value);
  return edit ? [{ title, edits: [edit], preferred: true }] : [];
}
