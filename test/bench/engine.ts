/**
 * Speed and accuracy of the engine: ratios, measured side by side in one run.
 */
import { type Network, type Solved, solve } from '../../core/engine';
import type { PumpValues } from '../../core/pump/values';
import { capacitor, fromGround, networkOf, pinDrive, pump, siliconDiode } from '../support/circuits';
import { randomNumbers, randomPump } from '../support/random-circuits';
import { settle } from './brute-force';
import { bestTime, table } from './table';

const drive = pinDrive(40, 45);
const opposite = pinDrive(40, 45, true);
const diode = { ...siliconDiode, ohms: 0.6 };
const many = <T>(count: number, value: T): T[] => Array.from({ length: count }, () => value);

const chain = (stages: number, farads: number): PumpValues =>
  pump({
    stages,
    drives: stages > 1 ? [drive, opposite] : [drive],
    flying: many(stages, capacitor(farads, 0.01)),
    diodes: many(stages + 1, diode),
  });
const ladder = (stages: number): PumpValues =>
  pump({
    topology: 'ladder',
    stages,
    drives: [drive],
    flying: many(stages, capacitor(1e-6, 0.01)),
    smoothing: many(stages, capacitor(1e-6, 0.01)),
    diodes: many(2 * stages, diode),
    loads: [{ name: 'load', kind: 'current', amps: 1e-4 / stages }],
  });

const reference: readonly (readonly [string, PumpValues])[] = [
  ['doubler, slow limit', chain(1, 0.1e-6)],
  ['doubler, between the limits', chain(1, 1e-6)],
  ['doubler, fast limit', { ...chain(1, 1e-6), frequency: 100e3 }],
  ['inverter', fromGround({ ...chain(1, 1e-6), negative: true })],
  ['3-stage multiplier', chain(3, 1e-6)],
  ['4-stage ladder', ladder(4)],
  ['8-stage ladder', ladder(8)],
];

function must(network: Network, tolerance?: number): Solved {
  const solved = solve(network, tolerance === undefined ? {} : { tolerance, lineError: 1e-9 });
  if (!solved.converged) throw new Error(solved.reason);
  return solved;
}

export function benchEngine(): string {
  const doubler = networkOf(reference[1]![1]);
  const unit = bestTime(() => must(doubler.network));
  const rows = reference.map(([name, values]) => {
    const { network, output } = networkOf(values);
    const exact = must(network, 1e-7).nodes[output]!.average;
    const solved = must(network);
    const found = solved.nodes[output]!.average;
    const time = bestTime(() => must(network));
    let settled = settle(network, output, found, 1);
    const rival = bestTime(() => {
      settled = settle(network, output, found, 4_000);
    }, 1);
    return [
      name,
      String(solved.counts.stages / 2),
      `${solved.counts.coarse}+${solved.counts.fine}`,
      `${(100 * Math.abs(found / exact - 1)).toExponential(1)} %`,
      solved.balance.toExponential(1),
      `${time.toFixed(2)} ms`,
      (time / unit).toFixed(1),
      String(settled.periods),
      (rival / time).toFixed(0),
    ];
  });
  return table(
    [
      'circuit',
      'steps/period',
      'iterations',
      'error of average',
      'balance',
      'time',
      'time / doubler',
      'brute-force periods',
      'brute force / this',
    ],
    rows,
  );
}

export function benchGrowth(): string {
  const first = bestTime(() => must(networkOf(ladder(1)).network));
  const rows = [1, 2, 3, 4, 6, 8, 10].map((stages) => {
    const multiplier = bestTime(() => must(networkOf(chain(stages, 1e-6)).network));
    const tower = bestTime(() => must(networkOf(ladder(stages)).network));
    return [String(stages), (multiplier / first).toFixed(1), (tower / first).toFixed(1)];
  });
  return table(['stages', 'multiplier, time / 1-stage ladder', 'ladder, time / 1-stage ladder'], rows);
}

export function benchRandom(count: number): string {
  const random = randomNumbers(1);
  const reasons = new Map<string, number>();
  const coarse: number[] = [];
  const fine: number[] = [];
  for (let n = 0; n < count; n++) {
    const solved = solve(networkOf(randomPump(random)).network);
    if (solved.converged) {
      coarse.push(solved.counts.coarse);
      fine.push(solved.counts.fine);
    } else reasons.set(solved.reason, (reasons.get(solved.reason) ?? 0) + 1);
  }
  const at = (list: number[], share: number) =>
    String([...list].sort((a, b) => a - b)[Math.floor(share * (list.length - 1))]);
  const rows = [
    ['converged', `${coarse.length} of ${count}`],
    ['coarse iterations, median / 95 % / most', [0.5, 0.95, 1].map((p) => at(coarse, p)).join(' / ')],
    ['fine iterations, median / 95 % / most', [0.5, 0.95, 1].map((p) => at(fine, p)).join(' / ')],
    ...[...reasons].map(([reason, times]) => [`not converged: ${reason}`, String(times)]),
  ];
  return table(['random circuits', ''], rows);
}
