/**
 * Against the bench, common practice, no source: a doubler on 5 V behind a complementary push-pull with 15 kohm in
 * each base, clocked by a bipolar astable timer of 10 kohm, 33 kohm and 100 nF, with silicon switching diodes and
 * 100 uF electrolytics, sits at about 9.0 V with a megohm and at about 8.4 V with 4.7 kohm. All parts are the
 * catalogue's; nothing here is fitted to those two voltages.
 */
import { describe, expect, it } from 'vitest';
import { catalogue, findPart } from '../../../core/catalog';
import { aluminium } from '../../../core/catalog/capacitors/aluminium';
import { siliconSwitching } from '../../../core/catalog/diodes/silicon-switching';
import type { TransistorData } from '../../../core/catalog/part';
import { bipolarAstable } from '../../../core/catalog/timers/bipolar-astable';
import { astableTiming } from '../../../core/compute/astable-timing';
import { esrFromLoss } from '../../../core/compute/esr-from-loss';
import { referenceTemperature, thermalVoltage } from '../../../core/compute/thermal-voltage';
import type { PumpValues, TransistorValues } from '../../../core/pump/values';
import type { Figure } from '../../../core/quantity/figure';
import { solveValues } from '../../support/check-pump';
import { expectNear } from '../../support/near';

type End = 'min' | 'typical' | 'max';

/** Which end of its band each of the parts that matter most stands at. */
interface Ends {
  /** Of the diodes' curve: `min` is the highest voltage. */
  readonly diode: End;
  /** Of the timer's high level, by its drop. */
  readonly drop: End;
  readonly gain: End;
  readonly farads: End;
  readonly loss: End;
}

const middle: Ends = {
  diode: 'typical',
  drop: 'typical',
  gain: 'typical',
  farads: 'typical',
  loss: 'typical',
};
const slope = thermalVoltage(referenceTemperature)!;

function doubler(loadOhms: number, ends: Ends): PumpValues {
  const { highS, frequencyHz } = astableTiming(10e3, 33e3, 100e-9)!;
  const diode = {
    saturation: at(siliconSwitching.saturation, ends.diode),
    slope: at(siliconSwitching.ideality) * slope,
    // The curve's resistance is largest where its voltage is.
    ohms: at(siliconSwitching.resistance, opposite(ends.diode)),
  };
  const farads = 100e-6 * (1 + at(aluminium.tolerance, ends.farads));
  const electrolytic = { farads, ohms: esrFromLoss(at(aluminium.loss, ends.loss), farads)! };
  return {
    topology: 'chain',
    stages: 1,
    negative: false,
    rails: [{ name: 'supply', volts: 5, ohms: 0 }],
    input: 0,
    frequency: frequencyHz,
    duty: highS * frequencyHz,
    rise: 0,
    fall: 0,
    drives: [
      {
        clock: {
          rail: 0,
          highDrop: at(bipolarAstable.highDrop, ends.drop),
          highOhms: at(bipolarAstable.highResistance),
          lowVolts: at(bipolarAstable.lowVoltage),
          lowOhms: at(bipolarAstable.lowResistance),
        },
        opposite: false,
        driver: {
          kind: 'push-pull',
          rail: 0,
          npn: transistor('npn-small-signal', ends.gain),
          pnp: transistor('pnp-small-signal', ends.gain),
          base: { npn: 15e3, pnp: 15e3 },
        },
      },
    ],
    series: 0,
    flying: [electrolytic],
    smoothing: [],
    reservoir: electrolytic,
    diodes: [diode, diode],
    loads: [{ name: 'load', kind: 'resistance', ohms: loadOhms }],
  };
}

function transistor(key: string, gain: End): TransistorValues {
  const data: TransistorData = findPart(catalogue.transistors, key)!;
  return {
    saturation: at(data.saturation),
    slope,
    gain: at(data.gain, gain),
    reverseGain: at(data.reverseGain),
    baseOhms: at(data.baseResistance),
    collectorOhms: at(data.collectorResistance),
    emitterOhms: at(data.emitterResistance),
  };
}

function at(figure: Figure | undefined, end: End = 'typical'): number {
  if (!figure) throw new Error('the catalogue lacks a figure');
  return figure[end];
}

function opposite(end: End): End {
  return end === 'min' ? 'max' : end === 'max' ? 'min' : end;
}

/** Every combination of ends. */
function corners(): Ends[] {
  const both: readonly End[] = ['min', 'max'];
  return both.flatMap((diode) =>
    both.flatMap((drop) =>
      both.flatMap((gain) =>
        both.flatMap((farads) => both.map((loss) => ({ diode, drop, gain, farads, loss }))),
      ),
    ),
  );
}

describe('a doubler as it is built on the bench', () => {
  it.each([
    [1e6, 9.0],
    [4.7e3, 8.4],
  ])(
    'with %d ohm: within 2 %% of %d V typically, and the tolerances of its parts span that',
    (load, volts) => {
      const typical = solveValues(doubler(load, middle)).average;
      const spread = corners().map((ends) => solveValues(doubler(load, ends)).average);
      expectNear(typical, volts, 0.02);
      expect(Math.min(...spread)).toBeLessThan(volts);
      expect(Math.max(...spread)).toBeGreaterThan(volts);
    },
  );
});
