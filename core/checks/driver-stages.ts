/** Stages of two transistors that drive a pump, each with the worst of its pumps. */
import type { BoardAnalysis, DriverFigures, DriverUse } from '../analysis/types';
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
