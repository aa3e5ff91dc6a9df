/**
 * From a pump rail of the board to its solved pump, or to the reason why there is none.
 */
import type { Board, Pump, Rail } from '../model/board';
import type { Band } from '../quantity/figure';
import { weightedModes } from './board-modes';
import { chainEdges, type DriveChain, driveChains } from './drive-chain';
import { type Gap, isGap } from './gap';
import type { SolvedPump } from './memory';
import { assemblePump, type PumpParts, type RailSource } from './pump-assembly';
import { settlePump } from './pump-bias';
import { type SettledMode, solvePump } from './pump-result';
import type { PumpResult } from './types';

/** Voltage of another rail, or why it has none. */
export type RailVoltage = (name: string) => Band | Gap;

/** How the rest of the board looks from one pump. */
export interface Surroundings {
  readonly voltage: RailVoltage;
  /** A rail as this pump sees it in a mode: without the pump's own current, with its source resistance. */
  source(name: string, mode: string | undefined): RailSource | Gap;
  /** What other rails and chips take from this pump's output in a mode, A. */
  below(mode: string | undefined): Band;
}

export interface PumpSetup {
  /** One for each mode. */
  readonly parts: readonly PumpParts[];
  readonly chains: readonly DriveChain[];
}

export function setUpPump(board: Board, rail: Rail, pump: Pump, around: Surroundings): PumpSetup | Gap {
  const stages = stageCount(pump);
  if (typeof stages !== 'number') return stages;
  const chains = driveChains(board, rail, pump, around.voltage);
  if (isGap(chains)) return chains;
  const input = inputName(pump);
  if (input !== undefined && typeof input !== 'string') return input;
  const parts: PumpParts[] = [];
  for (const { name: mode } of weightedModes(board)) {
    const rails = railSources(chains, input, mode, around);
    if (isGap(rails)) return rails;
    const { root, frequency, duty } = chains[0]!.clock;
    parts.push({
      rail,
      pump,
      mode,
      stages,
      ambient: plain(board.ambient),
      rails,
      input,
      drives: chains.map((chain) => chain.source),
      clock: { label: root.name, path: root.path, frequency, duty, ...chainEdges(chains) },
      below: around.below(mode),
    });
  }
  return { parts, chains };
}

/** All modes of a pump solved; `models` is empty when a part of it has no usable value. */
export function solveParts(pump: Pump, parts: readonly PumpParts[]): SolvedPump {
  const modes: SettledMode[] = [];
  for (const each of parts) {
    const { mode } = each;
    const settled = settlePump(pump, mode, (bears) => assemblePump(bears ? { ...each, bears } : each));
    if (!settled) return { models: [], result: { reason: noValue } };
    modes.push({ mode, ...settled });
  }
  const result = solvePump(pump.topology!, modes);
  return { models: modes.map(({ mode, model }) => ({ mode, model })), result };
}

const noValue = 'a capacitor or a diode of it has no usable value';

/** The result, or the gap that it leaves on the board. */
export function pumpResultOf(rail: Rail, { result, models }: SolvedPump): PumpResult | Gap {
  if (!('reason' in result)) return result;
  if (models.length === 0) return { because: result.reason };
  return {
    because: `no steady state was found: ${result.reason}`,
    finding: {
      code: 'not-converged',
      severity: 'error',
      at: `${rail.path}.pump`,
      span: rail.nameSpan,
      message:
        `${rail.name}: no steady state was found (${result.reason}), so it has no voltage. ` +
        'Look for a value that is far off, such as a capacitor or a frequency with a wrong prefix.',
    },
  };
}

function plain({ min, typical, max }: Band): Band {
  return { min, typical, max };
}

function stageCount({ topology, stages }: Pump): number | Gap {
  if (!topology) return { because: 'it has no topology' };
  if (topology === 'doubler' || topology === 'inverter') return 1;
  const count = stages?.typical;
  return count !== undefined && count >= 1
    ? Math.round(count)
    : { because: `a ${topology} needs its number of stages` };
}

/** Undefined for ground, where everything that pumps down or climbs a ladder may start. */
function inputName(pump: Pump): string | undefined | Gap {
  if (pump.input) return pump.input.name === 'ground' ? undefined : pump.input.name;
  const fromGround =
    pump.topology === 'inverter' || pump.topology === 'ladder' || pump.polarity === 'negative';
  return fromGround ? undefined : { because: 'it has no input' };
}

/** Every rail that the pump stands on or is driven from, each once. */
function railSources(
  chains: readonly DriveChain[],
  input: string | undefined,
  mode: string | undefined,
  around: Surroundings,
): RailSource[] | Gap {
  const rails = new Map<string, RailSource>();
  for (const { source } of chains)
    if (source.highVolts) rails.set(source.railName, { name: source.railName, band: source.highVolts });
  const names = [...chains.flatMap(({ source }) => [source.railName, source.driver?.railName]), input].filter(
    (name) => name !== undefined,
  );
  for (const name of names) {
    if (rails.has(name)) continue;
    const source = around.source(name, mode);
    if (isGap(source)) return source;
    rails.set(name, source);
  }
  return [...rails.values()];
}
