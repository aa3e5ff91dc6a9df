/**
 * The circuit engine: a small switched network in, its periodic steady state out. Knows nothing of boards.
 */

export type { ElementFigures, KnownFigures, Measures, NodeFigures } from './measure';
export { resistorCurrent } from './measure';
export {
  type Capacitor,
  type Course,
  type CurrentLoad,
  type Diode,
  type Known,
  type Network,
  networkFault,
  type PowerLoad,
  type Resistor,
  type Segment,
  type Terminal,
} from './network';
export type { Parameter } from './parameter';
export type { Port, PortDerivatives } from './port-derivatives';
export { type RunDown, type RunDownOptions, runDown } from './run-down';
export {
  type Counts,
  defaultOptions,
  type Solved,
  type SolveOptions,
  solve,
  type Unsolved,
} from './solve';
export { type StartUp, type StartUpOptions, startUp, type Trace } from './start-up';
