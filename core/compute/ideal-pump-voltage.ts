/** Output of a pump without load, resistance and stray capacitance. */
import { diodeCount, type PumpTopology, stageCount } from './pump-topology';

export interface IdealPump {
  readonly topology: PumpTopology;
  /** Stages of a multiplier or ladder; ignored for the others. */
  readonly stages: number;
  /** Voltage the chain starts from, V; 0 for ground. */
  readonly inputV: number;
  /** Swing of the clock, high level minus low level, V. */
  readonly swingV: number;
  /** Drop of one conducting diode, V. */
  readonly diodeV: number;
  /** -1 for a chain that pumps down, 1 otherwise; an inverter always pumps down. */
  readonly sign: 1 | -1;
}

/**
 * `V = Vin + s (N Vswing - m Vd)`, N stages, m diodes, s the sign of the chain.
 *
 * Answers volt, signed. Out of range: undefined. With a diode drop at load this is where the load line meets zero
 * current, not the voltage of an unloaded rail, which loses hardly any diode drop.
 * Source: J. F. Dickson, IEEE JSSC 11(3), 374-378, 1976; charge balance for the other topologies.
 * Worked: doubler, 5 V on 5 V, 0.6 V diodes: 8.8 V; inverter: -3.8 V.
 */
export function idealPumpVoltage(pump: IdealPump): number | undefined {
  const stages = stageCount(pump.topology, pump.stages);
  if (stages === undefined || !Number.isFinite(pump.inputV + pump.swingV + pump.diodeV)) return undefined;
  const sign = pump.topology === 'inverter' ? -1 : pump.sign;
  return pump.inputV + sign * (stages * pump.swingV - diodeCount(pump.topology, stages) * pump.diodeV);
}
