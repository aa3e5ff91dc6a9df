/**
 * A doubler or inverter with one flying capacitor, as plain numbers: the common ground of the engine under test and
 * of the reference that it is compared with. Here it becomes a network for the engine.
 */
import type { Network } from '../../core/engine';

export interface SimplePump {
  readonly topology: 'doubler' | 'inverter';
  /** Where the diode chain starts, V; 0 for an inverter. */
  readonly inputV: number;
  readonly highV: number;
  readonly lowV: number;
  readonly frequencyHz: number;
  /** Share of the period during which the pin is high. */
  readonly highShare: number;
  readonly highOhm: number;
  readonly lowOhm: number;
  readonly flyingF: number;
  readonly flyingOhm: number;
  readonly reservoirF: number;
  readonly reservoirOhm: number;
  readonly saturationA: number;
  /** Ideality factor times thermal voltage, V. */
  readonly slopeV: number;
  readonly diodeOhm: number;
  /** Resistance at the output, ohm; absent for none. */
  readonly loadOhm?: number;
  /** Steady load current, A, drawn towards ground (an inverter's load feeds it from ground). */
  readonly loadA?: number;
}

/** Voltage over which a steady load current fades when its rail breaks down, V. */
export const kneeV = 0.2;

/** Nodes `pin`, `middle`, `out`; elements named as the fields above. */
export function toNetwork(pump: SimplePump): Network {
  const period = 1 / pump.frequencyHz;
  const [pin, middle, out] = [0, 1, 2];
  const [input, drive, ground] = [~0, ~1, ~2];
  const up = pump.topology === 'doubler';
  const diode = { saturation: pump.saturationA, slope: pump.slopeV, ohms: pump.diodeOhm };
  const [from, to] = up ? [out, ground] : [ground, out];
  return {
    segments: [{ duration: pump.highShare * period }, { duration: (1 - pump.highShare) * period }],
    nodeNames: ['pin', 'middle', 'out'],
    knowns: [
      { name: 'input', volts: [pump.inputV, pump.inputV] },
      { name: 'drive', volts: [pump.highV, pump.lowV] },
      { name: 'ground', volts: [0, 0] },
    ],
    resistors: [
      { name: 'pin', a: drive, b: pin, ohms: [pump.highOhm, pump.lowOhm] },
      ...(pump.loadOhm === undefined
        ? []
        : [{ name: 'load', a: from, b: to, ohms: [pump.loadOhm, pump.loadOhm] }]),
    ],
    capacitors: [
      { name: 'flying', a: middle, b: pin, farads: pump.flyingF, ohms: pump.flyingOhm },
      { name: 'reservoir', a: out, b: ground, farads: pump.reservoirF, ohms: pump.reservoirOhm },
    ],
    diodes: up
      ? [
          { name: 'first', a: input, b: middle, ...diode },
          { name: 'second', a: middle, b: out, ...diode },
        ]
      : [
          { name: 'first', a: middle, b: input, ...diode },
          { name: 'second', a: out, b: middle, ...diode },
        ],
    loads: pump.loadA === undefined ? [] : [{ name: 'load', a: from, b: to, amps: pump.loadA, knee: kneeV }],
  };
}
