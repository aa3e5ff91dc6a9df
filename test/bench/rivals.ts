/**
 * The engine beside a general-purpose ODE library on the same circuits, the cost of derivatives, and how the time
 * grows with frequency and with the ratio of reservoir to flying capacitor.
 */
import { type Parameter, solve } from '../../core/engine';
import type { PumpValues } from '../../core/pump/values';
import { capacitor, networkOf, pinDrive, pump, siliconDiode } from '../support/circuits';
import { integrate } from '../support/ode-reference';
import { type SimplePump, toNetwork } from '../support/simple-pump';
import { bestTime, table } from './table';

const diode = { ...siliconDiode, ohms: 0.6 };
const doubler = (change: Partial<PumpValues>): PumpValues =>
  pump({
    drives: [pinDrive(40, 45)],
    flying: [capacitor(1e-6, 0.01)],
    diodes: [diode, diode],
    ...change,
  });

export function benchRivals(circuits: Readonly<Record<string, SimplePump>>): string {
  const rows = Object.entries(circuits).map(([name, circuit]) => {
    const network = toNetwork(circuit);
    const own = bestTime(() => solve(network));
    const library = bestTime(() => integrate(circuit), 2);
    return [name, `${own.toFixed(2)} ms`, `${library.toFixed(0)} ms`, (library / own).toFixed(0)];
  });
  return table(['circuit', 'this', 'odex with shooting', 'odex / this'], rows);
}

export function benchDerivatives(): string {
  const rows = [1, 3].map((stages) => {
    const values = doubler({
      stages,
      drives: stages > 1 ? [pinDrive(40, 45), pinDrive(40, 45, true)] : [pinDrive(40, 45)],
      flying: Array.from({ length: stages }, () => capacitor(1e-6, 0.01)),
      diodes: Array.from({ length: stages + 1 }, () => diode),
    });
    const { network, output, ground } = networkOf(values);
    const parameters: Parameter[] = [
      ...network.resistors.map((_, index) => ({ kind: 'ohms', index }) as const),
      ...network.knowns.map((_, index) => ({ kind: 'volts', index }) as const),
      ...network.capacitors.flatMap((_, index) => [
        { kind: 'farads', index } as const,
        { kind: 'esr', index } as const,
      ]),
      ...network.diodes.flatMap((_, index) => [
        { kind: 'saturation', index } as const,
        { kind: 'slope', index } as const,
        { kind: 'diode-ohms', index } as const,
      ]),
    ];
    const plain = bestTime(() => solve(network));
    const withAll = bestTime(() => solve(network, { parameters, port: { a: output, b: ground } }));
    return [
      `${stages} stage${stages > 1 ? 's' : ''}`,
      String(parameters.length),
      ((withAll - plain) / plain).toFixed(2),
      ((withAll + 2 * plain) / plain).toFixed(2),
    ];
  });
  return table(
    ['multiplier', 'derivatives', 'all of them / one solve', 'signed worst case / one solve'],
    rows,
  );
}

export function benchScaling(): string {
  const time = (values: PumpValues) => {
    const { network } = networkOf(values);
    return bestTime(() => solve(network));
  };
  const unit = time(doubler({}));
  const frequency = [100, 1e3, 1e4, 1e5, 1e6].map((hertz) => [
    `${hertz} Hz`,
    (time(doubler({ frequency: hertz })) / unit).toFixed(2),
  ]);
  const ratio = [0.1, 1, 10, 100, 1000].map((times) => [
    `reservoir ${times} x flying`,
    (time(doubler({ reservoir: capacitor(times * 1e-6, 0.01) })) / unit).toFixed(2),
  ]);
  return table(['doubler', 'time / doubler at 10 kHz, 10 x'], [...frequency, ...ratio]);
}
