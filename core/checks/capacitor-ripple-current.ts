/**
 * The current that goes through a capacitor in each period against its rating, or the heat that makes against what a
 * part of its kind bears.
 */
import { type StressedCapacitor, stressedParts } from '../analysis/pump-stress';
import { originWords } from '../analysis/words';
import { formatQuantity } from '../quantity/write';
import type { Check } from './check';
import type { Finding } from './finding';
import { worstByPath } from './worst-parts';

export const capacitorRippleCurrent: Check = {
  code: 'capacitor-ripple-current',
  title: 'Ripple current beyond what the capacitor bears',
  severity: 'warning',
  why: 'The current heats the series resistance; an electrolytic dries out in a fraction of its life, half of it for each 10 K.',
  run: (analysis) =>
    [...analysis.rails.values()].flatMap((result) =>
      worstByPath(
        stressedParts(result).capacitors,
        ({ capacitor }) => capacitor.path,
        ({ highestHeat }) => highestHeat,
      ).flatMap((part) => byRating(part) ?? byHeat(part)),
    ),
};

/** Undefined for a capacitor without a rating of its own. */
function byRating(part: StressedCapacitor): readonly Finding[] | undefined {
  const { capacitor, figures, highestRms } = part;
  const rating = capacitor.ripple;
  if (!rating) return undefined;
  if (highestRms <= rating.min) return [];
  const typical = figures.rmsCurrent > rating.min;
  const amps = formatQuantity(typical ? figures.rmsCurrent : highestRms, 'A');
  return [
    {
      code: 'capacitor-ripple-current',
      severity: typical ? 'error' : 'warning',
      at: `${capacitor.path}.ripple`,
      span: rating.span ?? capacitor.span,
      message: `${figures.key} carries ${amps} rms${typical ? '' : ' at its strongest corner'}, more than the ${formatQuantity(rating.min, 'A')} it is rated for. Two in parallel share it; a part of lower series resistance bears more.`,
      expected: `at most ${formatQuantity(rating.min, 'A')} rms`,
      actual: `${amps} rms`,
      source: 'rating of the file',
    },
  ];
}

function byHeat({ capacitor, figures, highestHeat }: StressedCapacitor): readonly Finding[] {
  const heat = capacitor.kind.data?.heat;
  if (!heat || highestHeat <= heat.min) return [];
  const watts = formatQuantity(highestHeat, 'W', 2);
  const ohms = capacitor.esr ? ` in its ${formatQuantity(capacitor.esr.max, 'ohm', 2)}` : '';
  return [
    {
      code: 'capacitor-ripple-current',
      severity: 'warning',
      at: capacitor.path,
      span: capacitor.span,
      message: `The ripple current of ${figures.key}, ${formatQuantity(figures.rmsCurrent, 'A')} rms, makes up to ${watts} of heat${ohms}; about ${formatQuantity(heat.typical, 'W')} is what a usual part of this kind bears. Choose one of lower series resistance, or write its rating as \`ripple\`.`,
      expected: `at most ${formatQuantity(heat.min, 'W')}`,
      actual: watts,
      source: originWords(heat.origin),
    },
  ];
}
