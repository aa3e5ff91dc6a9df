/**
 * "Size this rail", first form: the smallest preferred values (IEC 60063, E6) of the flying and the reservoir
 * capacitor with which a pump rail meets its needs at all its corners, as edits of the file. Every candidate is the
 * edited text itself, read and computed like any other, so that nothing is proposed that a check would object to.
 */
import { pumpLosses } from '../analysis/losses';
import { isMet, type Shortfall, shortfall } from '../analysis/needs';
import { railSolver } from '../analysis/rail-voltages';
import type { BoardAnalysis, PumpResult } from '../analysis/types';
import { volts } from '../analysis/words';
import type { Capacitor, Pump, Rail } from '../model/board';
import { readBoard } from '../model/build';
import { preferredValues } from '../quantity/preferred';
import { formatQuantity } from '../quantity/write';
import { applyEdits, type TextEdit } from '../text/edit';

export type Sizing =
  | {
      readonly ok: true;
      readonly rail: string;
      /** One sentence with both values. */
      readonly summary: string;
      readonly details: readonly string[];
      readonly edits: readonly TextEdit[];
    }
  | {
      readonly ok: false;
      readonly rail: string;
      readonly reason: string;
      readonly details: readonly string[];
    };

/** E6 values from 1 nF to 1 mF: beyond that a pump on a pin is the wrong circuit. */
const candidates: readonly number[] = Array.from({ length: 6 }, (_, decade) =>
  preferredValues.E6.map((value) => value * 10 ** (decade - 9)),
)
  .flat()
  .concat(1e-3)
  .map((value) => Number(value.toPrecision(3)));

export function sizeRail(analysis: BoardAnalysis, name: string): Sizing {
  const result = analysis.rails.get(name);
  const refuse = (reason: string, details: readonly string[] = []): Sizing => ({
    ok: false,
    rail: name,
    reason,
    details,
  });
  if (!result) return refuse(`There is no rail named ${name}.`);
  const { rail } = result;
  if (rail.origin?.kind !== 'pump')
    return refuse(`${name} is not made by a pump, so there are no capacitors to size.`);
  const { pump } = rail.origin;
  if (!rail.needs?.voltage && !rail.needs?.ripple && !rail.needs?.swing)
    return refuse(`${name} has no needs to size for: write needs with a voltage, a ripple or a swing.`);
  if (!result.pump) return refuse(`${name} cannot be sized: ${result.because ?? 'it has no solution'}.`);
  const flying = pump.flying[0];
  const { reservoir } = pump;
  if (!flying?.value?.span || !reservoir?.value?.span || pump.flying.length > 1)
    return refuse(`${name} needs one flying and one reservoir value written in this file.`);
  if (isMet(shortfall(rail.needs, result.pump)))
    return refuse(`${name} meets its needs at every corner as it is.`, [describe(result.pump)]);
  return new Search(analysis, rail, pump, flying, reservoir).run();
}

interface Candidate {
  readonly edits: readonly TextEdit[];
  readonly pump: PumpResult;
  readonly short: Shortfall;
}

class Search {
  readonly #cache = new Map<string, Candidate | undefined>();

  constructor(
    private readonly analysis: BoardAnalysis,
    private readonly rail: Rail,
    private readonly pump: Pump,
    private readonly flying: Capacitor,
    private readonly reservoir: Capacitor,
  ) {}

  run(): Sizing {
    const last = candidates.length - 1;
    // With a large reservoir only the flying capacitor decides whether the voltage can be had.
    const reaches = (f: number) => this.#at(f, this.#roomy(f))?.short.weak === 0;
    const least = firstTrue(0, last, reaches);
    if (least === undefined) return this.#stopped(this.#at(last, last));
    for (let f = least; f <= last; f++) {
      const r = firstTrue(this.#leastReservoir(), last, (index) => {
        const short = this.#at(f, index)?.short;
        return short !== undefined && short.weak === 0 && short.ripple === 0;
      });
      const found = r === undefined ? undefined : this.#at(f, r);
      if (found && isMet(found.short)) return this.#found(f, r!, found);
      // A larger flying capacitor only makes a rail stronger.
      if (found && found.short.strong > 0) return this.#stopped(found);
    }
    return this.#stopped(this.#at(last, last));
  }

  /** Without a need for ripple nothing says how small the reservoir may become: it does not shrink. */
  #leastReservoir(): number {
    if (this.rail.needs?.ripple) return 0;
    const present = this.reservoir.value!.typical;
    const index = candidates.findIndex((farads) => farads >= present * (1 - 1e-9));
    return index < 0 ? candidates.length - 1 : index;
  }

  /** Index of a reservoir far above the flying capacitor. */
  #roomy(f: number): number {
    return Math.min(candidates.length - 1, f + 12);
  }

  #at(f: number, r: number): Candidate | undefined {
    const key = `${f} ${r}`;
    if (this.#cache.has(key)) return this.#cache.get(key);
    const edits = [
      replaceValue(this.analysis.text, this.flying, candidates[f]!),
      replaceValue(this.analysis.text, this.reservoir, candidates[r]!),
    ];
    // The catalogue of the reading holds included parts too.
    const { board } = readBoard(applyEdits(this.analysis.text, edits), this.analysis.reading.catalogue);
    const solver = railSolver(board);
    solver.voltage(this.rail.name);
    const pump = solver.pumps.get(this.rail.name);
    const result = pump && { edits, pump, short: shortfall(this.rail.needs, pump) };
    this.#cache.set(key, result);
    return result;
  }

  #found(f: number, r: number, { edits, pump }: Candidate): Sizing {
    const { text } = this.analysis;
    return {
      ok: true,
      rail: this.rail.name,
      summary: `${this.rail.name}: flying ${formatQuantity(candidates[f]!, 'F')}, reservoir ${formatQuantity(candidates[r]!, 'F')}`,
      details: [
        'the smallest E6 values that meet its needs at every corner',
        describe(pump),
        ...(this.rail.needs?.ripple ? [] : ['no ripple need is written: the reservoir was not made smaller']),
        `computed ${this.#cache.size} pairs of values, corners included`,
      ],
      edits: edits.filter((edit) => text.slice(edit.span.start, edit.span.end) !== edit.text),
    };
  }

  #stopped(best: Candidate | undefined): Sizing {
    const reason = best ? stopReason(this.rail, this.pump, best) : 'no pair of values has a steady state';
    return {
      ok: false,
      rail: this.rail.name,
      reason: `No E6 pair up to ${formatQuantity(candidates.at(-1)!, 'F')} meets the needs of ${this.rail.name}: ${reason}.`,
      details: best ? [`best tried: ${describe(best.pump)}`] : [],
    };
  }
}

/** Index of the first candidate for which a test holds that stays true once it is; undefined if it never is. */
function firstTrue(low: number, high: number, test: (index: number) => boolean): number | undefined {
  if (!test(high)) return undefined;
  let from = low;
  let to = high;
  while (from < to) {
    const middle = (from + to) >> 1;
    if (test(middle)) to = middle;
    else from = middle + 1;
  }
  return to;
}

/** The new value in the file's own spelling of micro; a tolerance written behind the value stays. */
function replaceValue(text: string, capacitor: Capacitor, farads: number): TextEdit {
  const span = capacitor.value!.span!;
  const old = text.slice(span.start, span.end);
  const written = formatQuantity(farads, 'F');
  const value = old.includes('µ') || old.includes('μ') ? written : written.replace('µ', 'u');
  const tolerance = /\s*(?:±|\+-|\+\s*\d).*$/s.exec(old)?.[0] ?? '';
  return { span, text: value + tolerance };
}

function describe(pump: PumpResult): string {
  const { lowest, highest } = pump.voltage;
  const range = `${formatQuantity(lowest.value, 'V')} to ${formatQuantity(highest.value, 'V')}`;
  return `${range} over the corners, ripple up to ${formatQuantity(pump.ripple.highest.value, 'V')}`;
}

/** Which limit holds the rail back when capacitors alone cannot help. */
function stopReason(rail: Rail, pump: Pump, { pump: result, short }: Candidate): string {
  const at = formatQuantity(result.heaviest.loadCurrent, 'A');
  if (short.strong > 0)
    return (
      `it would pass the upper edge by ${volts(short.strong)} where it still has to reach the lower one, since ` +
      'the spread of the other parts is wider than the window'
    );
  if (short.weak > 0) {
    const losses = pumpLosses(pump, result);
    if (!losses)
      return `the load asks for ${formatQuantity(result.heaviest.askedCurrent, 'A')} and the pump carries only ${at}`;
    const path = `drive and diodes make ${formatQuantity(losses.fastOhm, 'ohm')} (the fast limit)`;
    const drops = `${losses.diodes} diode drops take ${volts(losses.diodes * losses.diodeV)}`;
    return `it stays ${volts(short.weak)} short at ${at} because ${path} and ${drops}, which no capacitor changes`;
  }
  if (short.ripple > 0) {
    const esr = rail.origin?.kind === 'pump' ? rail.origin.pump.reservoir?.esr : undefined;
    const cause = esr ? `, with ${formatQuantity(esr.typical, 'ohm')} in series with the reservoir` : '';
    return `the ripple stays ${volts(short.ripple)} above its limit${cause}`;
  }
  return 'the values that reach the voltage leave too much ripple';
}
