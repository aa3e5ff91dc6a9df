/**
 * Polarised capacitors whose voltage turns round.
 */
import { type Polarity, polarities, sideWords } from '../analysis/polarity';
import { formatQuantity } from '../quantity/write';
import type { Check } from './check';
import type { Finding } from './finding';
import { replaceWith } from './fixes';
import { worstByPath } from './worst-parts';

/** Reverse voltage that a wet electrolytic bears for good, and for moments, V (from memory: confirm). */
const steadyLimit = 0.1;
const momentLimit = 0.5;

export const capacitorPolarity: Check = {
  code: 'capacitor-polarity',
  title: 'Polarised capacitor the wrong way round',
  severity: 'error',
  why: 'A reversed electrolytic or tantalum capacitor heats up, leaks and may burst or burn.',
  run: (analysis) =>
    [...analysis.rails.values()].flatMap((result) =>
      worstByPath(
        polarities(result),
        ({ capacitor }) => capacitor.path,
        ({ steady, switching }) => Math.max(steady, switching),
      ).flatMap((polarity) => judge(polarity)),
    ),
};

function judge(polarity: Polarity): readonly Finding[] {
  const { capacitor, key, positive, assumed, stated, steady, switching } = polarity;
  const always = steady > steadyLimit;
  if (!always && !(switching > momentLimit)) return [];
  const volts = formatQuantity(always ? steady : switching, 'V', 2);
  const plus = sideWords(key, positive);
  const minus = sideWords(key, positive === 'away' ? 'diodes' : 'away');
  const turned = positive === assumed;
  const where = stated
    ? `with its negative terminal at ${capacitor.negativeTo!.name}`
    : `with its positive terminal at ${sideWords(key, assumed === 'away' ? 'diodes' : 'away')}, as it is usually drawn,`;
  const when = always ? '' : ' while switching on or off';
  const cure = turned
    ? `Turn it round: positive to ${plus}, negative to ${minus}. A ceramic or film capacitor has no polarity.`
    : 'Its voltage changes sign: use a ceramic or film capacitor there.';
  return [
    {
      code: 'capacitor-polarity',
      severity: always ? 'error' : 'warning',
      at: stated ? `${capacitor.path}.negative-to` : capacitor.path,
      span: capacitor.negativeTo?.span ?? capacitor.span,
      message: `${key} ${where} bears ${volts} in reverse${when}. ${cure} Reversed electrolytic capacitors may burst: check the board before power goes on.`,
      expected: `at most ${formatQuantity(always ? steadyLimit : momentLimit, 'V')} in reverse`,
      actual: `${volts} in reverse`,
      source: 'solution of the circuit; limits from memory: confirm with the data sheet',
      fixes:
        stated && turned && assumed === 'diodes'
          ? replaceWith('Turn it round: negative to ground', capacitor.negativeTo?.span, 'ground')
          : [],
    },
  ];
}
