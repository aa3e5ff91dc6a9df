/**
 * The answer of "Size this rail": a handful of truly different ways, each with its figures and what limits it; or how far
 * the best one is off, and the single change that would allow it.
 */
import { pumpLosses } from '../analysis/losses';
import { swingNeed } from '../analysis/swing-need';
import type { BoardAnalysis, PumpResult } from '../analysis/types';
import { volts } from '../analysis/words';
import type { Rail } from '../model/board';
import { formatPercent, formatQuantity } from '../quantity/write';
import type { TextEdit } from '../text/edit';
import { billOf } from './bill';
import { type Design, partCount, totalCapacitance } from './design';
import type { Target } from './frames';
import { type Candidate, type Found, type Progress, search, type Verified } from './search';

export interface SizeChoice {
  /** What it is best at: `fewest parts`, `lowest pin load`. */
  readonly best: readonly string[];
  /** `doubler on v5, driven by tick`. */
  readonly title: string;
  /** V; weakest and strongest corner and typical. */
  readonly voltage: { readonly min: number; readonly typical: number; readonly max: number };
  /** V peak to peak at the worst corner. */
  readonly ripple: number;
  readonly efficiency: number | null;
  readonly pins: readonly {
    readonly pin: string;
    readonly rms: number | null;
    readonly use: number | null;
  }[];
  readonly parts: readonly { readonly count: number; readonly part: string }[];
  readonly partCount: number;
  /** F. */
  readonly capacitance: number;
  /** One sentence. */
  readonly limit: string;
  readonly edits: readonly TextEdit[];
}

export interface SizeResult {
  readonly rail: string;
  /** By cost; empty when nothing works. */
  readonly choices: readonly SizeChoice[];
  /** Why there are none: one sentence each. */
  readonly because: readonly string[];
  readonly solves: number;
  /** Designs that there are in all: frames times values. */
  readonly space: number;
}

const mostChoices = 5;

/** One step for each frame, so that a host can show progress and stop. Never throws. */
export function* sizing(analysis: BoardAnalysis, name: string): Generator<Progress, SizeResult> {
  const refuse = (because: string): SizeResult => ({
    rail: name,
    choices: [],
    because: [because],
    solves: 0,
    space: 0,
  });
  const result = analysis.rails.get(name);
  if (!result) return refuse(`There is no rail named ${name}.`);
  const { rail } = result;
  const { origin } = rail;
  if (origin && origin.kind !== 'pump')
    return refuse(
      `${name} comes from a ${origin.kind}: only rails of a pump, or without an origin, are sized.`,
    );
  const target = targetOf(rail);
  if (!target) return refuse(`${name} has no needs to size for: write needs with a voltage or a swing.`);
  if (origin?.pump.flying && origin.pump.flying.length > 1)
    return refuse(`${name} has a list of flying capacitors: size one value for all stages, then refine.`);
  const found = yield* search(analysis, rail, target);
  return {
    rail: name,
    choices: choicesOf(found),
    because: found.verified.length > 0 ? [] : reasons(rail, target, found),
    solves: found.solves,
    space: found.space,
  };
}

export function targetOf({ needs }: Rail): Target | undefined {
  const window = needs?.voltage;
  const negative = window ? window.max <= 0 : false;
  const swing = swingNeed(needs, negative);
  if (!window && !swing) return undefined;
  const edges = window ? [Math.abs(window.min), Math.abs(window.max)] : [0];
  const open = !window || window.min === window.max;
  return {
    negative,
    least: Math.max(Math.min(...edges), swing ? Math.abs(swing.limit) : 0),
    most: open ? Number.POSITIVE_INFINITY : Math.max(...edges),
  };
}

/** The cheapest, and the best in each other respect; each once. */
function choicesOf({ verified }: Found): readonly SizeChoice[] {
  const [first] = verified;
  if (!first) return [];
  const by = (value: (v: Verified) => number) => verified.reduce((a, b) => (value(b) < value(a) ? b : a));
  const named: readonly (readonly [string, Verified])[] = [
    ['fewest parts', first],
    ['lowest pin load', by(pinLoad)],
    ['lowest ripple', by(({ pump }) => pump.ripple.highest.value)],
    ['best efficiency', by((v) => -(v.analysis.rails.get(railName(v))?.efficiency ?? 0))],
    ['least capacitance', by(({ design }) => totalCapacitance(design))],
  ];
  const chosen = new Map<Verified, string[]>();
  for (const [word, item] of named) chosen.set(item, [...(chosen.get(item) ?? []), word]);
  return [...chosen].slice(0, mostChoices).map(([item, best]) => choice(item, best));
}

function railName({ pump }: Verified): string {
  return pump.heaviest.capacitors[0]?.key.replace(/\.(flying|smoothing|reservoir).*$/, '') ?? '';
}

function pinLoad(item: Verified): number {
  const pins = pinsOf(item);
  return pins.length === 0 ? 0 : Math.max(...pins.map(({ rms }) => rms ?? 0));
}

function pinsOf(item: Verified): SizeChoice['pins'] {
  const name = railName(item);
  return [...item.analysis.pins.values()]
    .filter(({ drives }) => drives.includes(name))
    .map(({ key, rms, use }) => ({ pin: key, rms, use }));
}

function choice(item: Verified, best: readonly string[]): SizeChoice {
  const { design, pump, edits } = item;
  return {
    best,
    title: titleOf(design),
    voltage: {
      min: pump.voltage.lowest.value,
      typical: pump.heaviest.voltage,
      max: pump.voltage.highest.value,
    },
    ripple: pump.ripple.highest.value,
    efficiency: item.analysis.rails.get(railName(item))?.efficiency ?? null,
    pins: pinsOf(item),
    parts: billOf(design),
    partCount: partCount(design),
    capacitance: totalCapacitance(design),
    limit: limitOf(item),
    edits,
  };
}

export function titleOf({ topology, stages, input, drive, negative }: Design): string {
  const what = stages > 1 ? `${topology} of ${stages} stages${negative ? ' below ground' : ''}` : topology;
  return `${what}${topology === 'inverter' ? '' : ` on ${input}`}, driven by ${drive.label}`;
}

/** What holds the output down, from the closed forms beside the solution. */
function limitOf({ design, pump }: Candidate): string {
  const losses = pumpLosses({ topology: design.topology, stages: { typical: design.stages } }, pump);
  if (!losses) return 'The load takes what the pump can give.';
  const at = formatQuantity(losses.currentA, 'A');
  switch (losses.largest) {
    case 'capacitance':
      return `The slow limit holds it down: ${formatQuantity(losses.slowOhm, 'ohm')} at ${at}.`;
    case 'resistance':
      return `The resistance of drive and diodes holds it down: ${formatQuantity(losses.fastOhm, 'ohm')} at ${at}.`;
    case 'diodes':
      return `The diodes cost most: ${losses.diodes} drops of ${volts(losses.diodeV)}.`;
  }
}

/** The best found, which need it misses and by how much, and what single change would allow it. */
function reasons(rail: Rail, target: Target, { nearest, objections }: Found): readonly string[] {
  if (!nearest)
    return [
      `No pump from the rails, clocks and pins of this board reaches ${formatQuantity(target.least, 'V')} within ${formatQuantity(target.most, 'V')}: more stages (stock.stages), a higher input rail, or a free pin on a chip that is known would allow it.`,
    ];
  const { short, pump, design } = nearest;
  const head = `The nearest is a ${titleOf(design)}`;
  if (short.weak > 0)
    return [
      `${head}: at its weakest corner it stays ${volts(short.weak)} short with every capacitor in stock at its largest.`,
      weakCure(pump, design, target, short.weak),
    ];
  if (short.strong > 0)
    return [
      `${head}: where it reaches the lower edge it passes the upper one by ${volts(short.strong)}.`,
      `A bleeder or a wider window (up to ${formatQuantity(target.most + short.strong, 'V')}) would allow it, or a regulator behind a higher rail.`,
    ];
  if (short.ripple > 0)
    return [
      `${head}: its ripple stays ${volts(short.ripple)} too high.`,
      'A larger reservoir in stock, one of lower series resistance or a higher frequency would allow it.',
    ];
  return [
    `${head} and meets the needs, but the board would then have: ${objections[0] ?? 'other findings'}`,
    `${rail.name} stays as it is.`,
  ];
}

function weakCure(
  { heaviest, estimate }: PumpResult,
  { stages }: Design,
  { most }: Target,
  missing: number,
): string {
  const lighter = heaviest.outputResistance > 0 ? missing / heaviest.outputResistance : 0;
  const share = heaviest.loadCurrent > 0 ? lighter / heaviest.loadCurrent : 1;
  if (share < 0.6)
    return `A load lighter by ${formatQuantity(lighter, 'A', 2)} (${formatPercent(share, 2)}) would allow it; so would a stronger drive, which is worth up to ${volts(heaviest.loadCurrent * (estimate?.fastLimit ?? 0))}.`;
  const higher = volts(missing / (stages + 1));
  const another = (Math.abs(heaviest.ideal) * (stages + 2)) / (stages + 1);
  if (another > 1.1 * most)
    return `An input rail ${higher} higher would allow it; one stage more would pass ${formatQuantity(most, 'V')} without its load, unless a regulator follows it.`;
  return `One stage more (stock.stages) or an input rail ${higher} higher would allow it.`;
}
