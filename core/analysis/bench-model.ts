/**
 * A rail with the load that stood on it at the bench, and nothing else: the quantities that its voltage depends on,
 * and what it comes to at any values of them.
 */
import type { BenchPoint, Board, Load, Pump, Rail } from '../model/board';
import { type Band, exactly, type Figure, type Unit } from '../quantity/figure';
import { pumpVoltage } from './curves';
import { type Gap, isGap } from './gap';
import { corner, type Target } from './pump-corners';
import type { Variable } from './pump-model';
import { type SolvedPoint, solvePoint } from './pump-point';
import type { ModeModel } from './pump-result';
import { setUpPump } from './pump-solution';
import type { RailVoltages } from './rail-voltages';
import { regulatedVoltage } from './regulators';
import { supplyResistance, supplyVoltage } from './supply-voltage';

export interface BenchReading {
  readonly voltage: number;
  /** Null for a rail that no pump makes. */
  readonly ripple: number | null;
  /** Change per unit of each variable; NaN where only trying tells. */
  readonly slopes: Readonly<Record<Target, readonly number[]>>;
}

export interface BenchModel {
  readonly variables: readonly Variable[];
  readonly mode: string | undefined;
  readonly typical: BenchReading;
  /** With the variables at `values`; undefined where no steady state is found. */
  at(values: readonly number[]): BenchReading | undefined;
  /** Typical values and extremes over tolerance and temperature. */
  bands(): { readonly voltage: Band; readonly ripple: Band | null };
  /** Voltage at typical values with an instrument of that resistance beside the load; undefined where not solved. */
  withProbe(ohms: number): number | undefined;
}

export function benchModel(
  board: Board,
  solved: RailVoltages,
  rail: Rail,
  point: BenchPoint,
  load: Figure,
): BenchModel | Gap {
  const { origin } = rail;
  switch (origin?.kind) {
    case 'pump':
      return pumpModel(board, solved, rail, origin.pump, benchLoad(point, load));
    case 'supply':
      return supplyModel(board, origin.supply.name, point, load);
    default:
      return heldModel(solved, rail);
  }
}

function benchLoad({ span, path }: BenchPoint, load: Figure): Load {
  return {
    name: 'on the bench',
    nameSpan: load.span ?? span,
    span: load.span ?? span,
    path: `${path}.load`,
    keys: new Map(),
    ...(load.unit === 'ohm' ? { resistance: load } : { current: load }),
  };
}

function pumpModel(board: Board, solved: RailVoltages, rail: Rail, pump: Pump, load: Load): BenchModel | Gap {
  const loaded: Rail = { ...rail, loads: new Map([[load.name, load]]) };
  const setup = setUpPump(board, loaded, pump, { ...solved.around(rail), below: () => 0 });
  if (isGap(setup)) return setup;
  const { mode, model } = lightest(setup.models);
  const { variables } = model;
  const from = solvePoint(model, typicals(variables), mode);
  if ('reason' in from) return { because: `no steady state was found at this load: ${from.reason}` };
  const ends = (target: Target): Band => ({
    min: corner(model, mode, from, target, -1).value,
    typical: from.point[target],
    max: corner(model, mode, from, target, 1).value,
  });
  return {
    variables,
    mode,
    typical: pumpReading(from),
    at: (values) => {
      const reached = solvePoint(model, values, mode);
      return 'reason' in reached ? undefined : pumpReading(reached);
    },
    bands: () => ({ voltage: ends('voltage'), ripple: ends('ripple') }),
    withProbe: (ohms) => {
      const values = model.values(typicals(variables));
      return pumpVoltage({
        ...values,
        loads: [...values.loads, { name: 'probe', kind: 'resistance', ohms }],
      });
    },
  };
}

/** On a bench the rest of the board draws as little as it can: the mode in which the rails above stand highest. */
function lightest(models: readonly ModeModel[]): ModeModel {
  const height = ({ model }: ModeModel) =>
    model.values(typicals(model.variables)).rails.reduce((sum, { volts }) => sum + Math.abs(volts), 0);
  return models.reduce((best, candidate) => (height(candidate) > height(best) ? candidate : best));
}

function pumpReading({ point, slopes }: SolvedPoint): BenchReading {
  return { voltage: point.voltage, ripple: point.ripple, slopes };
}

/** Ohm's law behind the source resistance; a current that the supply cannot give leaves nothing. */
function supplyModel(board: Board, name: string, point: BenchPoint, load: Figure): BenchModel | Gap {
  const supply = board.supplies.get(name);
  const open = supply && supplyVoltage(supply);
  if (!open) return { because: `the voltage of ${name} is not known` };
  const ohms = supplyResistance(supply);
  const at = (key: string) => (supply.keys.has(key) ? `${supply.path}.${key}` : supply.path);
  const variables = [variable(`supply ${name} voltage`, at('voltage'), 'V', open)];
  if (ohms) {
    variables.push(variable(`supply ${name} resistance`, at('resistance'), 'ohm', ohms));
    variables.push(variable('load on the bench', `${point.path}.load`, load.unit, load));
  }
  return plainModel(variables, ([volts = 0, source = 0, drawn = 0]) => {
    if (load.unit === 'ohm') return drawn > 0 ? (volts * drawn) / (drawn + source) : volts;
    return Math.sign(volts) * Math.max(0, Math.abs(volts) - source * drawn);
  });
}

/** A rail that does not give way under load: what a regulator holds on its input, else the band that is known. */
function heldModel(solved: RailVoltages, rail: Rail): BenchModel | Gap {
  const known = solved.voltages.get(rail.name) ?? { because: `${rail.name} is not known` };
  if (isGap(known)) return known;
  const regulator = rail.origin?.kind === 'regulator' ? rail.origin.regulator : undefined;
  const { output, dropout, from } = regulator ?? {};
  if (!regulator || !output)
    return plainModel([variable(`rail ${rail.name}`, rail.path, 'V', known)], ([volts = 0]) => volts);
  const variables = [variable('regulator output', `${rail.path}.regulator.output`, 'V', output)];
  const input = from && solved.voltages.get(from.name);
  if (from && input && !isGap(input) && dropout) {
    variables.push(variable(`rail ${from.name}`, `rails.${from.name}`, 'V', input));
    variables.push(variable('dropout', `${rail.path}.regulator.dropout`, 'V', dropout));
  }
  const fixed = (figure: Figure, value: number): Figure => ({ ...figure, ...exactly(value) });
  return plainModel(variables, ([held = 0, above, drop]) => {
    if (above === undefined || drop === undefined || !dropout) return held;
    const moved = { ...regulator, output: fixed(output, held), dropout: fixed(dropout, drop) };
    return regulatedVoltage(moved, exactly(above))?.typical ?? held;
  });
}

/** A closed form that rises or falls steadily with each variable, so that its extremes are at ends of bands. */
function plainModel(
  variables: readonly Variable[],
  volts: (values: readonly number[]) => number,
): BenchModel {
  const read = (values: readonly number[]): BenchReading => ({
    voltage: volts(values),
    ripple: null,
    slopes: { voltage: slopesOf(volts, values), ripple: values.map(() => 0) },
  });
  const typical = read(typicals(variables));
  const ends = variables.reduce<number[][]>(
    (points, { band }) => points.flatMap((point) => [band.min, band.max].map((end) => [...point, end])),
    [[]],
  );
  const extremes = ends.map(volts);
  return {
    variables,
    mode: undefined,
    typical,
    at: read,
    bands: () => ({
      voltage: { min: Math.min(...extremes), typical: typical.voltage, max: Math.max(...extremes) },
      ripple: null,
    }),
    // What gives way by ohms does not feel megohms.
    withProbe: () => typical.voltage,
  };
}

function slopesOf(volts: (values: readonly number[]) => number, at: readonly number[]): number[] {
  return at.map((value, k) => {
    const step = 1e-5 * Math.max(Math.abs(value), 1e-3);
    const moved = (by: number) => volts(at.map((other, n) => (n === k ? other + by : other)));
    return (moved(step) - moved(-step)) / (2 * step);
  });
}

function variable(label: string, path: string, unit: Unit, { min, typical, max }: Band): Variable {
  return { label, path, unit, band: { min, typical, max } };
}

export function typicals(variables: readonly Variable[]): number[] {
  return variables.map(({ band }) => band.typical);
}
