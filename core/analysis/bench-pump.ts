/**
 * A pump with the load that stood on it at the bench.
 */
import type { BenchPoint, Load, Pump, Rail } from '../model/board';
import type { Band, Figure } from '../quantity/figure';
import type { BenchModel, BenchReading, BenchSite } from './bench-model';
import { pumpVoltage } from './curves';
import { type Gap, isGap } from './gap';
import { once } from './once';
import type { PumpParts } from './pump-assembly';
import { typicalPoint } from './pump-model';
import { solvePoint } from './pump-point';
import { setUpPump, solveParts } from './pump-solution';

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
  { board, solved, memory }: BenchSite,
  rail: Rail,
  pump: Pump,
  loads: readonly Load[],
  below: (mode: string | undefined) => Band,
): BenchModel | Gap {
  const loaded: Rail = { ...rail, loads: new Map(loads.map((load) => [load.path, load])) };
  const setup = setUpPump(board, loaded, pump, { ...solved.around(rail), below });
  if (isGap(setup)) return setup;
  const parts = [lightest(setup.parts)];
  const { models, result } = memory.pump(parts, () => solveParts(pump, parts));
  const [found] = models;
  if (!found) return { because: 'a capacitor or a diode of it has no usable value' };
  if ('reason' in result) return { because: `no steady state was found at this load: ${result.reason}` };
  const { mode, model } = found;
  const { heaviest } = result;
  const ends = (target: 'voltage' | 'ripple'): Band => ({
    min: result[target].lowest.value,
    typical: heaviest[target],
    max: result[target].highest.value,
  });
  const at = (values: readonly number[]): BenchReading | undefined => {
    const reached = solvePoint(model, values, mode);
    if ('reason' in reached) return undefined;
    const { point, slopes } = reached;
    return { voltage: point.voltage, ripple: point.ripple, slopes };
  };
  const flat = model.variables.map(() => 0);
  return {
    variables: model.variables,
    mode,
    pump,
    typical: once(
      () =>
        at(typicalPoint(model)) ?? {
          voltage: heaviest.voltage,
          ripple: heaviest.ripple,
          slopes: { voltage: flat, ripple: flat },
        },
    ),
    at,
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
