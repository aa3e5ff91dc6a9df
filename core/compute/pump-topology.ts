/** Names and counts that the closed forms of all pump topologies share. */

export type PumpTopology = 'doubler' | 'multiplier' | 'ladder' | 'inverter';

/** Stages of a topology: doubler and inverter have one by nature; undefined when `stages` is no positive whole number. */
export function stageCount(topology: PumpTopology, stages: number): number | undefined {
  if (topology === 'doubler' || topology === 'inverter') return 1;
  return Number.isInteger(stages) && stages >= 1 ? stages : undefined;
}

/** Diodes in the chain: N + 1 of a pump with N flying capacitors, 2 n of a ladder with n stages. */
export function diodeCount(topology: PumpTopology, stages: number): number {
  return topology === 'ladder' ? 2 * stages : stages + 1;
}
