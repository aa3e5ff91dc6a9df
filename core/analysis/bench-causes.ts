/**
 * What usually makes a bench differ from a prediction when no tolerance does: fitted to the sign of the difference,
 * and left out where it could not make a tenth of it. Common practice, no source, the sizes included.
 */
import { diodeCount } from '../compute/pump-topology';
import type { BenchPoint, Pump, Rail } from '../model/board';
import { formatQuantity } from '../quantity/write';
import type { BenchModel } from './bench-model';
import type { Target } from './pump-corners';
import type { BenchComparison } from './types';
import { volts } from './words';

interface Cause {
  readonly words: string;
  /** V that it may well make; absent where nobody can say. */
  readonly volts?: number;
}

/** What one cause must make of the deviation to be worth a word. */
const worthTelling = 0.1;
/** Causes told at once: more are a textbook. */
const mostTold = 4;

/** Clauses for a list, the most common first. */
export function usualCauses(
  model: BenchModel,
  rail: Rail,
  point: BenchPoint,
  target: Target,
  comparison: BenchComparison,
): readonly string[] {
  const size = Math.abs(comparison.deviation);
  const causes =
    target === 'ripple' ? rippleCauses(comparison) : voltageCauses(model, rail, point, comparison);
  const fitting = causes.filter((cause) => (cause.volts ?? size) >= worthTelling * size);
  return fitting.length > 0
    ? fitting.slice(0, mostTold).map(({ words }) => words)
    : ['a wrong connection or a part of another value, since nothing usual moves it that far'];
}

/** A lead and its two contacts on a breadboard, ohm. */
const contactOhms = 1;
/** A supply's setting or a worn battery, as a share of its voltage. */
const supplyShare = 0.05;
/** Between kinds of diodes: about 0.6 V of silicon against 0.3 V of a small Schottky diode. */
const diodeVolts = 0.3;

function voltageCauses(
  model: BenchModel,
  rail: Rail,
  point: BenchPoint,
  { measured, predicted }: BenchComparison,
): readonly Cause[] {
  if (measured.typical * predicted.typical < 0) {
    const sign = predicted.typical < 0 ? 'negative' : 'positive';
    return [{ words: `a sign or swapped leads, since ${rail.name} is ${sign}` }];
  }
  const weak = Math.abs(measured.typical) < Math.abs(predicted.typical);
  const amps = loadAmps(point, predicted.typical);
  if (model.pump) return pumpCauses(model, model.pump, predicted.typical, amps, weak);
  const regulated = rail.origin?.kind === 'regulator';
  if (!weak)
    return [
      regulated
        ? { words: 'a load below the least one that the regulator needs' }
        : { words: 'a supply above its nominal voltage' },
      { words: 'a load that draws less than entered' },
    ];
  return [
    regulated
      ? { words: 'an input that sags below the output and the dropout, or a regulator at its limit' }
      : { words: 'a supply below its nominal voltage' },
    { words: 'the resistance of leads and breadboard contacts', volts: amps * contactOhms },
  ];
}

function pumpCauses(
  model: BenchModel,
  pump: Pump,
  predicted: number,
  amps: number,
  weak: boolean,
): readonly Cause[] {
  const stages = Math.round(pump.stages?.typical ?? 1);
  const way = weak ? 'below' : 'above';
  const supply = {
    words: `a supply ${way} its nominal voltage`,
    volts: supplyShare * changeOf(model, ({ unit, path }) => unit === 'V' && /^rails\.[^.]+$/.test(path)),
  };
  const diodes = {
    words: `diodes of a kind with a ${weak ? 'larger' : 'smaller'} drop`,
    volts: diodeVolts * (pump.topology ? diodeCount(pump.topology, stages) : 1),
  };
  if (!weak) return [supply, { words: 'a load that draws less than entered' }, diodes];
  return [
    ...loading(model, predicted),
    {
      words: 'a flying capacitor that its d.c. bias or its kind leaves short of capacitance',
      volts: changeOf(model, ({ unit, path }) => unit === 'F' && path.includes('.pump.flying')),
    },
    supply,
    {
      // In the path of the drive a resistance counts 1/D + 1/(1 - D) times: M. D. Seeman, S. R. Sanders, IEEE
      // Trans. Power Electronics 23(2), 2008 (from memory: confirm).
      words: 'the resistance of leads and breadboard contacts at the drive',
      volts: 4 * stages * amps * contactOhms,
    },
    diodes,
  ];
}

/** V by which the rail changes when the quantities that are meant change by their whole value, by the derivatives. */
function changeOf(
  { variables, typical }: BenchModel,
  meant: (variable: (typeof variables)[number]) => boolean,
) {
  const { slopes } = typical();
  return variables.reduce(
    (sum, variable, k) =>
      meant(variable) ? sum + Math.abs((slopes.voltage[k] || 0) * variable.band.typical) : sum,
    0,
  );
}

const instruments = [
  { name: 'the meter', ohms: 10e6 },
  { name: 'a scope probe without divider', ohms: 1e6 },
] as const;

/** The least instrument that loads the rail enough to matter is told with what it does, the next one otherwise. */
function loading({ withProbe }: BenchModel, predicted: number): readonly Cause[] {
  return instruments.flatMap(({ name, ohms }) => {
    const reached = withProbe(ohms);
    if (reached === undefined) return [];
    const drop = Math.abs(predicted) - Math.abs(reached);
    const words = `${name} as a load of ${formatQuantity(ohms, 'ohm')}, which costs ${volts(drop)}`;
    return drop > 0 ? [{ words, volts: drop }] : [];
  });
}

function loadAmps({ load }: BenchPoint, predicted: number): number {
  if (!load) return 0;
  return load.unit === 'ohm' ? Math.abs(predicted) / load.typical : load.typical;
}

function rippleCauses({ deviation }: BenchComparison): readonly Cause[] {
  return deviation > 0
    ? [
        { words: 'a long ground lead of the probe that picks up the edges of the clock' },
        {
          words:
            'a reservoir short of capacitance by its d.c. bias, or with more series resistance than its kind',
        },
        { words: 'a load that draws in pulses' },
      ]
    : [
        { words: 'a bandwidth limit or an averaging meter that hides the peaks' },
        { words: 'more capacitance on the rail than the file names, such as that of the load' },
        { words: 'a load that draws less than entered' },
      ];
}
