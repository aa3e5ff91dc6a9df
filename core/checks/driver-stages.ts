/** Stages of two transistors or two MOSFETs that drive a pump, each with the worst of its pumps. */
import type { BoardAnalysis, DriverFigures, DriverUse, PairFigures } from '../analysis/types';
import type { Driver } from '../model/board';

export interface StageInUse {
  readonly driver: Driver;
  readonly use: DriverUse;
  readonly stage: DriverFigures;
}

/** One for each driver that has such a stage and a solved pump: the use with the largest dissipation. */
export function stagesOf(analysis: BoardAnalysis): readonly StageInUse[] {
  return [...analysis.drivers.values()].flatMap(({ driver, uses }) => {
    const staged = uses.flatMap((use) => (use.stage ? [{ driver, use, stage: use.stage }] : []));
    const worst = staged.sort((a, b) => b.stage.dissipation - a.stage.dissipation)[0];
    return worst ? [worst] : [];
  });
}

export interface PairInUse {
  readonly driver: Driver;
  readonly use: DriverUse;
  readonly pair: PairFigures;
}

/** The same for pairs of MOSFETs. */
export function pairsOf(analysis: BoardAnalysis): readonly PairInUse[] {
  return [...analysis.drivers.values()].flatMap(({ driver, uses }) => {
    const paired = uses.flatMap((use) => (use.pair ? [{ driver, use, pair: use.pair }] : []));
    const worst = paired.sort((a, b) => b.pair.dissipation - a.pair.dissipation)[0];
    return worst ? [worst] : [];
  });
}
