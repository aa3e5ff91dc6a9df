/**
 * How the work of a whole board grows with its rails, and what an edit costs against it.
 */
import { analyse, newMemory } from '../../core/index';
import { table } from './table';

/** Doublers side by side on one regulated rail; `changed` is the flying capacitor of the one in the middle. */
function board(count: number, changed: string): string {
  const clocks = Array.from(
    { length: Math.min(count, 50) },
    (_, k) => `  c${k}: { pin: mcu.P${k}, frequency: 100 kHz, duty: 50 % }`,
  );
  const rails = Array.from({ length: count }, (_, k) => {
    const flying = k === Math.floor(count / 2) ? changed : '1 uF';
    return `  r${k}:
    pump: { topology: doubler, input: v5, drive: c${k % 50}, diode: d, flying: { value: ${flying}, kind: x7r, rated: 16 V }, reservoir: { value: 10 uF, kind: x7r, rated: 25 V } }
    needs: { voltage: 8..10 V }
    loads: { x: ${(1 + (k % 10) / 10).toFixed(1)} mA }`;
  });
  return `conditions: { ambient: -20..50 degC }
supplies: { lab: { voltage: 9 V, resistance: 10 mohm } }
parts:
  diodes: { d: { kind: schottky, saturation: 9..22..44 nA, ideality: 1.03, resistance: 1.15 ohm } }
  chips: { plain: { pins: { high-resistance: 15..20..40 ohm, low-resistance: 20 ohm, recommended: 20 mA, absolute: 40 mA } } }
chips: { mcu: { part: plain, rail: v5, draws: 1 mA } }
clocks:
${clocks.join('\n')}
rails:
  vin: { supply: lab }
  v5: { regulator: { from: vin, output: 5 V +-2 %, dropout: 0.3 V, ground: 50 uA } }
${rails.join('\n')}
`;
}

/** Milliseconds of processor time, which other work on the machine disturbs least. */
function busy(run: () => void): number {
  const start = process.cpuUsage();
  run();
  const { user, system } = process.cpuUsage(start);
  return (user + system) / 1000;
}

interface Cost {
  readonly count: number;
  readonly whole: number;
  readonly solved: number;
  readonly edit: number;
  readonly edited: number;
}

function costOf(count: number): Cost {
  const rounds = Math.max(1, Math.round(100 / count));
  let whole = Number.POSITIVE_INFINITY;
  let edit = Number.POSITIVE_INFINITY;
  let solved = 0;
  let edited = 0;
  for (let round = 0; round < rounds; round++) {
    const memory = newMemory();
    whole = Math.min(
      whole,
      busy(() => analyse(board(count, '1 uF'), { file: 'rails.yaml', memory })),
    );
    solved = memory.solved;
    edit = Math.min(
      edit,
      busy(() => analyse(board(count, '2.2 uF'), { file: 'rails.yaml', memory })),
    );
    edited = memory.solved;
  }
  return { count, whole, solved, edit, edited };
}

/** Ratios to the smallest board, so that a straight line shows as equal numbers. */
export function benchBoardGrowth(counts: readonly number[] = [10, 100, 1000]): string {
  // Once before the clock runs, so that the first board is not the one that pays for loading.
  costOf(20);
  const costs = counts.map(costOf);
  const first = costs[0]!;
  const rows = costs.map(({ count, whole, solved, edit, edited }) => [
    `${count}`,
    `${(whole / count / (first.whole / first.count)).toFixed(2)}`,
    `${(whole / count).toFixed(2)}`,
    `${solved}`,
    `${edited}`,
    `${(edit / whole).toFixed(3)}`,
  ]);
  return [
    'Whole boards: cost of a rail against the smallest board, and of an edit of one rail against the whole',
    table(['rails', 'per rail, ratio', 'ms per rail', 'pumps solved', 'after an edit', 'edit / whole'], rows),
  ].join('\n');
}
