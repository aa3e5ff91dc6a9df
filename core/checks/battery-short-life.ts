/**
 * A battery that is empty too soon: before the time that the file asks for, or within a day; and one whose resistance
 * strands much of its charge.
 */
import type { BatteryLife, Run } from '../analysis/battery';
import { whyEndless } from '../analysis/battery-store';
import { chargeWords, endWords, lifeWords } from '../analysis/battery-words';
import { isGap } from '../analysis/gap';
import type { SupplyResult } from '../analysis/types';
import type { Figure } from '../quantity/figure';
import { formatDuration, formatPercent, formatQuantity } from '../quantity/write';
import { batteryCure } from './battery-cure';
import type { Check } from './check';
import type { Finding, Related } from './finding';

/** What is charged or changed more often than once a day is rarely meant (common practice, no source). */
const aDay = 24 * 3600;
/** Charge left behind that is worth a word (common practice, no source). */
const much = 0.2;

export const batteryShortLife: Check = {
  code: 'battery-short-life',
  title: 'Battery that is empty too soon',
  severity: 'error',
  why: 'A battery has less charge than its label says, its voltage falls as it goes, and a heavy mode ends it while charge is left.',
  run: (analysis) => [...analysis.supplies.values()].flatMap(judge),
};

function judge({ supply, life }: SupplyResult): readonly Finding[] {
  const needed = supply.life;
  const found = life?.();
  const place = {
    code: 'battery-short-life',
    at: needed ? `${supply.path}.life` : supply.path,
    span: needed?.span ?? supply.battery?.ref?.span ?? supply.capacity?.span ?? supply.nameSpan,
  } as const;
  if (!found || isGap(found)) {
    // Without a need the missing figure is reported with the others that are not computed.
    if (!needed) return [];
    const because = found?.because ?? whyEndless(supply);
    return [
      {
        ...place,
        severity: 'warning',
        message: `It is not known whether ${supply.name} lasts ${formatDuration(needed.min)}: ${because}.`,
        expected: `at least ${formatDuration(needed.min)}`,
      },
    ];
  }
  const verdict = verdictOf(found, needed);
  const stranded = found.typical.ended && found.typical.left > much;
  if (!verdict) {
    if (!stranded) return [];
    return [
      {
        ...place,
        severity: 'information',
        message: `${supply.name} lasts ${lifeWords(found.typical)}, then ${endWords(found, found.typical)}. ${strandedWords(found, found.typical)}`,
        actual: `${formatPercent(found.typical.left, 2)} of the charge left`,
        related: related(found),
      },
    ];
  }
  const { run, severity, wanted, source } = verdict;
  const corner =
    run === found.typical
      ? ''
      : ' with the smallest capacity, the most current and the highest resistance together';
  const told = needed
    ? `, where ${formatDuration(wanted)} are needed`
    : run.seconds > 0
      ? ', less than a day; write `life` when that is enough'
      : '';
  return [
    {
      ...place,
      severity,
      message: [
        `${supply.name} lasts ${lifeWords(run)}${corner}${told}: ${endWords(found, run)} (${chargeWords(found, run)}).`,
        ...topWords(found, run),
        ...(run.ended && run.left > much ? [strandedWords(found, run)] : []),
        ...batteryCure(found, run, wanted),
      ].join(' '),
      expected: `at least ${formatDuration(wanted)}`,
      actual: lifeWords(run),
      source,
      related: related(found),
    },
  ];
}

interface Verdict {
  readonly run: Run;
  readonly severity: Finding['severity'];
  readonly wanted: number;
  readonly source: string;
}

function verdictOf({ typical, least }: BatteryLife, needed: Figure | undefined): Verdict | undefined {
  const short = (run: Run, wanted: number) => run.seconds < wanted * (1 - 1e-9);
  if (!needed) {
    if (!short(typical, aDay)) return undefined;
    const severity = typical.seconds > 0 ? 'information' : 'warning';
    return { run: typical, severity, wanted: aDay, source: 'common practice, no source' };
  }
  const wanted = needed.min;
  const source = 'charge balance over the discharge';
  if (short(typical, wanted)) return { run: typical, severity: 'error', wanted, source };
  if (least && short(least, wanted)) return { run: least, severity: 'warning', wanted, source };
  return undefined;
}

function topWords({ consumer }: BatteryLife, { top, current }: Run): readonly string[] {
  if (!(current > 0)) return [];
  const who = consumer
    ? `${consumer.name} on ${consumer.rail} (${formatQuantity(consumer.amps, 'A')}) draws most`
    : '';
  if (top.mode === undefined)
    return who ? [`Of the ${formatQuantity(current, 'A')} that the board takes ${who}.`] : [];
  const taken = `Mode ${top.mode} takes ${formatPercent(top.charge, 2)} of the charge in ${formatPercent(top.time, 2)} of the time`;
  return [`${taken}${who ? `; ${who} there` : ''}.`];
}

function strandedWords({ store }: BatteryLife, { ended, left }: Run): string {
  const { amps, ohms } = ended!;
  const drop = formatQuantity(amps * ohms, 'V', 2);
  return `Its resistance limits it: ${formatQuantity(amps, 'A')} through ${formatQuantity(ohms, 'ohm', 2)} take ${drop} from the ${formatQuantity(store.open(left), 'V')} that it still has. Cells in parallel or of lower resistance, or a large capacitor across it that carries the pulse, would make use of the rest.`;
}

function related({ consumer }: BatteryLife): readonly Related[] {
  if (!consumer) return [];
  return [
    {
      span: consumer.span,
      message: `${consumer.name} draws most: ${formatQuantity(consumer.amps, 'A')} from ${consumer.rail}`,
    },
  ];
}
