/**
 * Capacitance that stands on a supply the moment it is connected: what its rail reaches through diode chains and through
 * filters that do not limit the surge. Regulators and pins stand between it and the rest.
 */
import type { Board, Capacitor, Rail, Supply } from '../model/board';
import type { SupplyResult } from './types';

export interface Attached {
  readonly rail: Rail;
  /** `up.flying[0]`, or the rail's name for a filter's capacitor. */
  readonly key: string;
  readonly farads: number;
}

export function attachedTo(board: Board, { supply, voltage, limit }: SupplyResult): readonly Attached[] {
  const reached = new Set(railsOf(board, supply));
  const list: Attached[] = [];
  // Rails may stand on rails that stand further down in the file: as often as anything new is reached.
  for (let grown = true; grown; ) {
    grown = false;
    for (const rail of board.rails.values()) {
      if (reached.has(rail.name)) continue;
      const found = attachedBy(rail, reached, Math.abs(voltage?.max ?? 0), limit?.min);
      if (!found) continue;
      reached.add(rail.name);
      list.push(...found);
      grown = true;
    }
  }
  return list;
}

function railsOf(board: Board, supply: Supply): readonly string[] {
  return [...board.rails.values()].flatMap(({ name, origin }) =>
    origin?.kind === 'supply' && origin.supply.name === supply.name ? [name] : [],
  );
}

/** Undefined for a rail that is not reached. */
function attachedBy(
  rail: Rail,
  reached: ReadonlySet<string>,
  volts: number,
  limitA: number | undefined,
): readonly Attached[] | undefined {
  const { origin } = rail;
  if (origin?.kind === 'filter') {
    const { from, resistor, capacitor } = origin.filter;
    if (!from || !reached.has(from.name)) return undefined;
    const limited = resistor && limitA !== undefined && volts / resistor.min <= limitA;
    return limited ? undefined : one(rail, rail.name, capacitor);
  }
  if (origin?.kind !== 'pump') return undefined;
  const { pump } = origin;
  if (!pump.input || !reached.has(pump.input.name)) return undefined;
  const stages = Math.max(1, Math.round(pump.stages?.typical ?? 1));
  const column = (name: string, capacitors: readonly Capacitor[]) =>
    Array.from({ length: stages }, (_, k) =>
      one(rail, `${rail.name}.${name}[${k}]`, capacitors.length === 1 ? capacitors[0] : capacitors[k]),
    ).flat();
  const smoothing = pump.smoothing.length > 0 ? pump.smoothing : pump.flying;
  return [
    ...column('flying', pump.flying),
    ...(pump.topology === 'ladder' ? column('smoothing', smoothing) : []),
    ...one(rail, `${rail.name}.reservoir`, pump.reservoir),
  ];
}

function one(rail: Rail, key: string, capacitor: Capacitor | undefined): Attached[] {
  return capacitor?.value ? [{ rail, key, farads: capacitor.value.typical }] : [];
}
