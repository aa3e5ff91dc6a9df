/** Output resistance of a pump when no capacitor changes its voltage within a phase: the fast limit. */
import { type PumpTopology, stageCount } from './pump-topology';

export interface FastLimitInput {
  readonly topology: PumpTopology;
  readonly stages: number;
  /** -1 for a chain that pumps down: it delivers while its last clock is low. An inverter always does. */
  readonly sign: 1 | -1;
  /** Share of the period in which the pump delivers into its output, between 0 and 1, both excluded. */
  readonly deliverShare: number;
  /** Resistance of the driver while it is high and while it is low, ohm. */
  readonly driverHighOhm: number;
  readonly driverLowOhm: number;
  /** Resistance of one conducting diode, ohm. */
  readonly diodeOhm: number;
  /** Series resistance of one flying (and smoothing) capacitor and of the reservoir, ohm. */
  readonly flyingEsrOhm: number;
  readonly reservoirEsrOhm: number;
}

/**
 * `R = sum over resistances and phases of R a^2 / D`, a the charge through it in that phase for one at the output.
 *
 * Answers ohm. Out of range: undefined. A driver counts with the square of the capacitors it moves at once. For a
 * ladder the reservoir's own resistance is left out: it sits in a loop with the smoothing column and is small there.
 * Source: Seeman and Sanders 2008 (from memory: confirm), solved here for each topology.
 * Worked: doubler, diodes 10, driver 5 and 5, capacitors 1 and 3 ohm: 67.00 ohm at half duty, 83.19 ohm at 0.3.
 */
export function fastLimit(input: FastLimitInput): number | undefined {
  const n = stageCount(input.topology, input.stages);
  if (n === undefined || !isFastLimit(input)) return undefined;
  const down = input.topology === 'inverter' || input.sign === -1;
  const delivering = down
    ? { ...input, driverHighOhm: input.driverLowOhm, driverLowOhm: input.driverHighOhm }
    : input;
  return input.topology === 'ladder' ? ladder(delivering, n) : chain(delivering, n);
}

/** Flying capacitors on two antiphase drivers (with one capacitor only one is there), "high" read as "delivering". */
function chain(input: FastLimitInput, n: number): number {
  const { deliverShare: deliver, driverHighOhm: high, driverLowOhm: low } = input;
  const recharge = 1 - deliver;
  // While delivering, the driver of the last capacitor is high, with every second one down the chain.
  const last = Math.ceil(n / 2) ** 2;
  const other = Math.floor(n / 2) ** 2;
  return (
    (input.diodeOhm * Math.ceil((n + 1) / 2) + high * last + low * other) / deliver +
    (input.diodeOhm * Math.floor((n + 1) / 2) + low * last + high * other) / recharge +
    n * input.flyingEsrOhm * (1 / deliver + 1 / recharge) +
    (input.reservoirEsrOhm * recharge) / deliver
  );
}

function ladder(input: FastLimitInput, n: number): number {
  const { deliverShare: deliver } = input;
  const recharge = 1 - deliver;
  const columns = (n * (n + 1) * (2 * n + 1)) / 6 + (n * (n * n - 1)) / 12;
  const bothPhases = 1 / deliver + 1 / recharge;
  return (
    n * input.diodeOhm * bothPhases +
    n * n * (input.driverHighOhm / deliver + input.driverLowOhm / recharge) +
    columns * input.flyingEsrOhm * bothPhases
  );
}

function isFastLimit(input: FastLimitInput): boolean {
  const ohms = [
    input.driverHighOhm,
    input.driverLowOhm,
    input.diodeOhm,
    input.flyingEsrOhm,
    input.reservoirEsrOhm,
  ];
  return (
    input.deliverShare > 0 && input.deliverShare < 1 && ohms.every((ohm) => ohm >= 0 && Number.isFinite(ohm))
  );
}
