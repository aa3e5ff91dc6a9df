/**
 * "Size this rail" against all designs of a reduced grid, on forty problems: eight by hand, the rest drawn by lot.
 */
import { cheapestDesign, gridBoard } from '../support/cheapest-design';
import { sizeOf } from '../support/size-of';
import { table } from './table';

type Problem = readonly [needs: string, load: string];

const byHand: readonly Problem[] = [
  ['{ voltage: 7.5..10.5 V, ripple: 20 mV }', '3 mA'],
  ['{ voltage: 8.5..10.5 V }', '1 mA'],
  ['{ voltage: -5..-3 V, ripple: 10 mV }', '2 mA'],
  ['{ voltage: 8.9..10.5 V, ripple: 2 mV }', '1 mA'],
  ['{ voltage: 8..10.5 V, ripple: 50 mV }', '8 mA'],
  ['{ voltage: 11..16 V, ripple: 40 mV }', '1 mA'],
  ['{ voltage: -9.5..-6 V }', '0.5 mA'],
  ['{ voltage: 9.9..10.5 V }', '1 mA'],
];

/** Lehmer's multiplicative generator (S. K. Park, K. W. Miller, 1988; from memory): the same problems every time. */
function drawn(count: number): readonly Problem[] {
  let state = 20_261_201;
  const next = () => {
    state = (state * 48_271) % 2_147_483_647;
    return state / 2_147_483_647;
  };
  return Array.from({ length: count }, (): Problem => {
    const negative = next() < 0.4;
    const least = negative ? 1.5 + 3 * next() : 6.5 + 3 * next();
    const most = negative ? 5.5 : 10.8;
    const window = negative ? `-${most}..-${least.toFixed(2)} V` : `${least.toFixed(2)}..${most} V`;
    const ripple = next() < 0.5 ? `, ripple: ${Math.ceil(2 + 60 * next())} mV` : '';
    return [`{ voltage: ${window}${ripple} }`, `${(0.2 + 8 * next() ** 2).toFixed(2)} mA`];
  });
}

export function benchSizing(count = 40): string {
  const tally = { same: 0, better: 0, worse: 0, none: 0 };
  let solves = 0;
  let searching = 0;
  let enumerating = 0;
  let space = 0;
  const problems = [...byHand, ...drawn(Math.max(0, count - byHand.length))].slice(0, count);
  for (const [needs, load] of problems) {
    const text = gridBoard(needs, load);
    const start = process.cpuUsage();
    const { result } = sizeOf(text, 'up');
    const searched = process.cpuUsage(start);
    const best = cheapestDesign(text);
    const both = process.cpuUsage(start);
    searching += (searched.user + searched.system) / 1000;
    enumerating += (both.user + both.system - searched.user - searched.system) / 1000;
    solves += result.solves;
    space += result.space;
    const [first] = result.choices;
    if (!best && !first) tally.none++;
    else if (!best) tally.better++;
    else if (!first) tally.worse++;
    else {
      const parts = first.partCount - best[0];
      const farads = first.capacitance / best[1] - 1;
      if (parts < 0 || (parts === 0 && farads < -1e-6)) tally.better++;
      else if (parts > 0 || farads > 1e-6) tally.worse++;
      else tally.same++;
    }
  }
  const mean = (value: number) => (value / problems.length).toFixed(0);
  return [
    `Sizing: ${problems.length} problems on a grid, the search against all designs`,
    table(
      [
        'same best',
        'better',
        'worse',
        'none in either',
        'ms a search',
        'all / search',
        'solves',
        'of designs',
      ],
      [
        [
          `${tally.same}`,
          `${tally.better}`,
          `${tally.worse}`,
          `${tally.none}`,
          mean(searching),
          (enumerating / searching).toFixed(1),
          mean(solves),
          mean(space),
        ],
      ],
    ),
  ].join('\n');
}
