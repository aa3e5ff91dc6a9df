/**
 * Phrases about the life of a battery that the check, the card and the ledger share.
 */
import { formatDuration, formatPercent, formatQuantity } from '../quantity/write';
import type { BatteryLife, Run } from './battery';
import { originWords } from './words';

/** `6000 h` in the unit that people count it in; 0 is said as such. */
export function lifeWords({ seconds }: Run): string {
  return seconds > 0 ? formatDuration(seconds) : 'no time at all';
}

/** A clause: what ends it. */
export function endWords(
  { store }: BatteryLife,
  { ended, left, seconds, selfCurrent, current }: Run,
): string {
  if (!ended)
    return selfCurrent > current
      ? 'its charge is used up, most of it by self-discharge'
      : 'its charge is used up';
  const load = ended.mode === undefined ? 'under its load' : `under the load of mode ${ended.mode}`;
  const end = store.end === null ? undefined : formatQuantity(store.end, 'V');
  if (end === undefined) return `its resistance lets no more through ${load}`;
  if (!(seconds > 0)) return `even full it does not hold ${end} ${load}`;
  return `it falls to ${end} ${load}, ${formatPercent(left, 2)} of its charge left`;
}

/** `220 mAh of the file, 85 % of them counted`. */
export function chargeWords({ store, supply }: BatteryLife, { capacity, usable }: Run): string {
  const from = supply.capacity ? 'the file' : 'the catalogue';
  const counted = store.data ? `, ${formatPercent(usable)} of it counted on` : '';
  return `${formatQuantity(capacity, 'C')} of ${from}${counted}`;
}

/** Sentences: where the figures come from. */
export function lifeOrigins({ store, supply, samples }: BatteryLife): readonly string[] {
  const { data } = store;
  if (!data) {
    const course = store.end === null ? 'its voltage stays' : 'its band runs from full to empty';
    return [`Life: capacity of the file; ${course}; no self-discharge and no loss of capacity are counted.`];
  }
  const solved = samples.map((volts) => formatQuantity(volts, 'V')).join(', ');
  return [
    `Life: charge balance over the discharge; the board is computed at ${solved}.`,
    ...(supply.capacity ? [] : [`Capacity: ${originWords(data.capacity.origin)}.`]),
    `Part counted on: ${originWords(data.usable.origin)}.`,
    `Self-discharge: ${originWords(data.selfDischarge.origin)}.`,
    `Open voltage: ${originWords(data.openVoltage[0]!.volts.origin)}.`,
    supply.resistance
      ? 'Resistance: of the file for the full battery, rising as the catalogue says.'
      : `Resistance: ${originWords(data.agedResistance[0]!.ohms.origin)}.`,
  ];
}

/** What can go wrong with a battery; the rules of the place come first. */
export function batteryCaution({ store }: BatteryLife): string {
  const words =
    store.data?.caution ??
    'A battery can drive tens of amperes into a short circuit: fit a fuse, and charge it only as its maker says.';
  return `Caution: ${words} ${deference}`;
}

export const deference =
  'The safety rules of your place and people licensed to work under them decide what is allowed.';
