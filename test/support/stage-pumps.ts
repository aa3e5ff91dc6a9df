/** Pumps of several stages with nearly ideal diodes, as networks: for checks against formulas that assume such diodes. */
import type { Capacitor, Diode, Network } from '../../core/engine';

export interface StagePump {
  readonly stages: number;
  readonly inputV: number;
  readonly swingV: number;
  readonly frequencyHz: number;
  /** Share of the period in which the pump delivers into its output. */
  readonly deliverShare: number;
  readonly driverHighOhm: number;
  readonly driverLowOhm: number;
  readonly flyingF: number;
  readonly flyingOhm: number;
  /** A ladder may do without. */
  readonly reservoirF?: number;
  readonly reservoirOhm: number;
  readonly diodeOhm: number;
  readonly loadA: number;
  /** Capacitance across every diode, F. */
  readonly junctionF?: number;
}

/** Loses 0.14 mV at 1 mA, and its leakage of 1 nA is not seen beside a load. */
const nearlyIdeal = { saturation: 1e-9, slope: 1e-5 };

/** Every second flying capacitor on one clock, the others on its inverse; `out` is the last node. */
export function multiplier(pump: StagePump): Network {
  const n = pump.stages;
  // Nodes: 0..n-1 the pumped ones, n the output, n+1 and n+2 the two driver outputs.
  const delivering = n + 1;
  const other = n + 2;
  const diodes = Array.from({ length: n + 1 }, (_, k) => diode(pump, k, k === 0 ? ~0 : k - 1, k));
  const flying = Array.from({ length: n }, (_, k) =>
    capacitor(`flying ${k}`, k, (n - 1 - k) % 2 === 0 ? delivering : other, pump),
  );
  const single = n === 1;
  return {
    ...frame(pump, ['out', 'deliver', ...(single ? [] : ['other'])], n),
    resistors: [
      { name: 'deliver', a: ~1, b: delivering, ohms: [pump.driverHighOhm, pump.driverLowOhm] },
      ...(single ? [] : [{ name: 'other', a: ~2, b: other, ohms: [pump.driverLowOhm, pump.driverHighOhm] }]),
    ],
    capacitors: [...flying, ...reservoir(pump, n), ...junctions(pump, diodes)],
    diodes,
    loads: [{ name: 'load', a: n, b: ~3, amps: pump.loadA, knee: 0.2 }],
  };
}

/** A coupling column on one clock and a smoothing column on ground; `out` is the top of the smoothing column. */
export function ladder(pump: StagePump): Network {
  const n = pump.stages;
  // Nodes: 2k the coupling node of stage k, 2k+1 its smoothing node, 2n the driver's output.
  const drive = 2 * n;
  const diodes = Array.from({ length: 2 * n }, (_, k) => diode(pump, k, k === 0 ? ~0 : k - 1, k));
  const columns = Array.from({ length: n }, (_, k) => [
    capacitor(`coupling ${k}`, 2 * k, k === 0 ? drive : 2 * k - 2, pump),
    capacitor(`smoothing ${k}`, 2 * k + 1, k === 0 ? ~0 : 2 * k - 1, pump),
  ]).flat();
  return {
    ...frame(pump, ['out', 'deliver'], 2 * n - 1),
    resistors: [{ name: 'deliver', a: ~1, b: drive, ohms: [pump.driverHighOhm, pump.driverLowOhm] }],
    capacitors: [...columns, ...reservoir(pump, 2 * n - 1), ...junctions(pump, diodes)],
    diodes,
    loads: [{ name: 'load', a: 2 * n - 1, b: ~3, amps: pump.loadA, knee: 0.2 }],
  };
}

/** First segment delivers. Knowns: input, the delivering clock, its inverse, ground. */
function frame(pump: StagePump, last: readonly string[], before: number) {
  const period = 1 / pump.frequencyHz;
  const { inputV, swingV } = pump;
  return {
    segments: [{ duration: pump.deliverShare * period }, { duration: (1 - pump.deliverShare) * period }],
    nodeNames: [...Array.from({ length: before }, (_, k) => `node ${k}`), ...last],
    knowns: [
      { name: 'input', volts: [inputV, inputV] },
      { name: 'clock', volts: [swingV, 0] },
      { name: 'inverse', volts: [0, swingV] },
      { name: 'ground', volts: [0, 0] },
    ],
  };
}

function diode(pump: StagePump, k: number, a: number, b: number): Diode {
  return { name: `diode ${k}`, a, b, ...nearlyIdeal, ohms: pump.diodeOhm };
}

function capacitor(name: string, a: number, b: number, pump: StagePump): Capacitor {
  return { name, a, b, farads: pump.flyingF, ohms: pump.flyingOhm };
}

function reservoir(pump: StagePump, node: number): readonly Capacitor[] {
  return pump.reservoirF === undefined
    ? []
    : [{ name: 'reservoir', a: node, b: ~3, farads: pump.reservoirF, ohms: pump.reservoirOhm }];
}

function junctions(pump: StagePump, diodes: readonly Diode[]): readonly Capacitor[] {
  const { junctionF } = pump;
  if (junctionF === undefined) return [];
  return diodes.map(({ name, a, b }) => ({ name: `junction of ${name}`, a, b, farads: junctionF, ohms: 0 }));
}
