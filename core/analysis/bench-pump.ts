/**
 * A pump with the load that stood on it at the bench.
 */
import type { BenchPoint, Board, Load, Pump, Rail } from '../model/board';
import type { Band, Figure } from '../quantity/figure';
import type { BenchModel, BenchReading } from './bench-model';
import { pumpVoltage } from './curves';
import { type Gap, isGap } from './gap';
import { assemblePump, type PumpParts } from './pump-assembly';
import { settlePump } from './pump-bias';
import { corner, type Target } from './pump-corners';
import { typicalPoint } from './pump-model';
import { type SolvedPoint, solvePoint } from './pump-point';
import { setUpPump } from './pump-solution';
import type { RailVoltages } from './rail-voltages';

/** The load of the entry as a load of the rail. */
export function benchLoad({ span, path }: BenchPoint, load: Figure): Load {
  return {
    name: 'on the bench',
    nameSpan: load.span ?? span,
    span: load.span ?? span,
    path: `${path}.load`,
    keys: new Map(),
    ...(load.unit === 'ohm' ? { resistance: load } : { current: load }),
  };
}

/** `below`: what else stands on the rail in a mode, A. */
export function pumpModel(
  board: Board,
  solved: RailVoltages,
  rail: Rail,
  pump: Pump,
  loads: readonly Load[],
  below: (mode: string | undefined) => Band,
): BenchModel | Gap {
  const loaded: Rail = { ...rail, loads: new Map(loads.map((load) => [load.path, load])) };
  const setup = setUpPump(board, loaded, pump, { ...solved.around(rail), below });
  if (isGap(setup)) return setup;
  const parts = lightest(setup.parts);
  const { mode } = parts;
  const settled = settlePump(pump, mode, (bears) => assemblePump(bears ? { ...parts, bears } : parts));
  if (!settled) return { because: 'a capacitor or a diode of it has no usable value' };
  const { model, at: from } = settled;
  if ('reason' in from) return { because: `no steady state was found at this load: ${from.reason}` };
  const ends = (target: Target): Band => ({
    min: corner(model, mode, from, target, -1).value,
    typical: from.point[target],
    max: corner(model, mode, from, target, 1).value,
  });
  return {
    variables: model.variables,
    mode,
    pump,
    typical: readingAt(from),
    at: (values) => {
      const reached = solvePoint(model, values, mode);
      return 'reason' in reached ? undefined : readingAt(reached);
    },
    bands: () => ({ voltage: ends('voltage'), ripple: ends('ripple') }),
    withProbe: (ohms) => {
      const values = model.values(typicalPoint(model));
      return pumpVoltage({
        ...values,
        loads: [...values.loads, { name: 'probe', kind: 'resistance', ohms }],
      });
    },
  };
}

/** On a bench the rest of the board draws as little as it can: the mode in which the rails above stand highest. */
function lightest(modes: readonly PumpParts[]): PumpParts {
  const height = ({ rails }: PumpParts) => rails.reduce((sum, { band }) => sum + Math.abs(band.typical), 0);
  return modes.reduce((best, candidate) => (height(candidate) > height(best) ? candidate : best));
}

function readingAt({ point, slopes }: SolvedPoint): BenchReading {
  return { voltage: point.voltage, ripple: point.ripple, slopes };
}
