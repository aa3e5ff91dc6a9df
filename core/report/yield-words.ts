/**
 * The words and table rows of a Monte Carlo run, once for a terminal and for a document.
 */
import type { Outcome, RailYield, Seen, YieldResult } from '../analysis/yield-result';
import type { Column } from './table';

export interface YieldTable {
  readonly title: string;
  readonly columns: readonly Column[];
  readonly rows: readonly (readonly string[])[];
}

/** Share as percent that is 100 or 0 only where every sample is; rounded to what so many samples can tell. */
export function sharePercent(share: number, samples: number, direction: 'near' | 'down' | 'up'): string {
  const digits = Math.max(1, Math.ceil(Math.log10(samples)) - 2);
  const round = { near: Math.round, down: Math.floor, up: Math.ceil }[direction];
  const scale = 10 ** digits;
  return `${round(share * 100 * scale * (1 + (direction === 'up' ? -1e-12 : 1e-12))) / scale} %`;
}

export function intervalWords({ interval }: Outcome, samples: number): string {
  const low = sharePercent(interval.low, samples, 'down');
  return `${low.slice(0, -2)}..${sharePercent(interval.high, samples, 'up')}`;
}

export function headWords({ samples, seed, distribution, quantities }: YieldResult): string {
  const count = samples === 1 ? '1 sample' : `${samples} samples`;
  const drawn =
    quantities === 0
      ? 'nothing on it has a tolerance, so that all are alike'
      : `${quantities} ${quantities === 1 ? 'quantity' : 'quantities'} drawn, ${distribution} within each band`;
  return `${count}, seed ${seed}; ${drawn}.`;
}

/** One sentence on the board as a whole. */
export function boardWords({ outcome, samples, rails }: YieldResult): string {
  if (rails.length === 0)
    return 'No rail states a voltage or ripple that it needs, so there is nothing to judge.';
  const missing = rails.filter((rail) => rail.outcome === null).map(({ rail }) => rail);
  if (!outcome) return `No yield of the board: ${missing.join(', ')} could not be computed.`;
  const { met, unsolved } = outcome;
  const open = unsolved === 0 ? '' : `; ${unsolved} found no steady state`;
  return (
    `${sharePercent(outcome.yield, samples, 'near')} of the boards meet every need ` +
    `(${met} of ${samples}${open}; 95 % confidence: ${intervalWords(outcome, samples)}).`
  );
}

const left = (head: string): Column => ({ head, align: 'left' });
const right = (head: string): Column => ({ head, align: 'right' });

/** Yield and misses of each rail. */
export function yieldTable({ rails, samples }: YieldResult): YieldTable {
  return {
    title: 'Rails',
    columns: [
      left('rail'),
      right('yield'),
      { ...right('95 % interval'), spare: 1 },
      right('too weak'),
      right('too strong'),
      right('ripple'),
      right('unsolved'),
      { ...left('weakest seen'), spare: 2 },
      { ...left('strongest seen'), spare: 3 },
    ],
    rows: rails.map(({ rail, outcome, misses, weakest, strongest }) => [
      rail,
      outcome ? sharePercent(outcome.yield, samples, 'near') : '?',
      outcome ? intervalWords(outcome, samples) : '',
      countWords(misses.low),
      countWords(misses.high),
      countWords(misses.ripple),
      outcome && outcome.unsolved > 0 ? String(outcome.unsolved) : '',
      seenWords(weakest),
      seenWords(strongest),
    ]),
  };
}

/** Quantiles of voltage and ripple, a row for each rail and mode. */
export function spreadTables({ rails }: YieldResult): readonly YieldTable[] {
  const table = (title: string, key: 'voltage' | 'ripple', scale: number): YieldTable => {
    const rows = rails.flatMap(({ rail, modes }) =>
      modes.flatMap(({ mode, [key]: spread }) =>
        spread
          ? [
              [
                rail,
                mode ?? '',
                ...[spread.min, ...spread.quantiles.map(({ value }) => value), spread.max].map((value) =>
                  figure(value * scale),
                ),
              ],
            ]
          : [],
      ),
    );
    const shares = rails.flatMap(({ modes }) => modes.flatMap(({ voltage }) => voltage?.quantiles ?? []));
    const heads = [...new Set(shares.map(({ share }) => `${Number((100 * share).toPrecision(6))} %`))];
    const columns = [
      left('rail'),
      left('mode'),
      right('lowest'),
      ...heads.map((head) => right(head)),
      right('highest'),
    ];
    return { title, columns, rows };
  };
  return [table('Voltage, V', 'voltage', 1), table('Ripple, mV', 'ripple', 1000)].filter(
    ({ rows }) => rows.length > 0,
  );
}

/** `vneg: ambient (+0.82), diode saturation current (+0.31)`, a line for each rail that has any. */
export function leadingWords({ rails }: YieldResult): readonly { rail: string; words: string }[] {
  return rails.flatMap(({ rail, leading }) =>
    leading.length === 0
      ? []
      : [
          {
            rail,
            words: leading
              .map(
                ({ label, correlation }) =>
                  `${label} (${correlation < 0 ? '' : '+'}${correlation.toFixed(2)})`,
              )
              .join(', '),
          },
        ],
  );
}

/** What so many samples can and cannot tell, and what the run takes for granted. */
export function confidenceWords(result: YieldResult): readonly string[] {
  const { confidence, samples, notJudged, outcome } = result;
  const { oneSided, twoSided, mayFail } = confidence;
  const percent = (share: number, direction: 'down' | 'up') => sharePercent(share, samples, direction);
  return [
    ...(oneSided === null || !outcome
      ? []
      : [
          `With 95 % confidence at least ${percent(oneSided, 'down')} of all such boards lie above the lowest value seen` +
            `${twoSided === null ? '' : `, and ${percent(twoSided, 'down')} between the lowest and the highest`} (Wilks).`,
        ]),
    ...(mayFail === null
      ? []
      : [
          `No sample missed a need: up to ${percent(mayFail, 'up')} of all boards may still do so (about 3/N, 95 % confidence).`,
        ]),
    ...(notJudged.length === 0
      ? []
      : [`Not judged here: ${notJudged.map(({ rail, need }) => `needs.${need} of ${rail}`).join(', ')}.`]),
    'Parts are drawn independently of each other, and what the file states once for several parts is drawn once. ' +
      'Parts from one reel may all lie at the same end: see the corners for the worst. ' +
      'What rails take from each other is drawn between its least and its most.',
  ];
}

function countWords(count: number | null): string {
  return count === null ? '' : String(count);
}

function seenWords(seen: Seen | null): string {
  if (!seen) return '';
  return `${figure(seen.value)} V${seen.mode === undefined ? '' : ` ${seen.mode}`} (no. ${seen.sample})`;
}

/** Four digits without an exponent; what is smaller than any meter sees is only said to be so. */
function figure(value: number): string {
  const size = Math.abs(value);
  if (size > 0 && size < 1e-3) return '<0.001';
  return size >= 1e4 ? String(Math.round(value)) : value.toPrecision(4);
}

export function becauseWords(rails: readonly RailYield[]): readonly string[] {
  return rails.flatMap(({ rail, because }) =>
    because === undefined ? [] : [`${rail} is not computed: ${because}`],
  );
}
