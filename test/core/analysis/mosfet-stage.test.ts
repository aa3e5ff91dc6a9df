import { describe, expect, it } from 'vitest';
import { gateVolts, mosfetOhms } from '../../../core/analysis/mosfet-stage';
import { catalogue } from '../../../core/catalog';
import { analyse } from '../../../core/index';
import { exactly } from '../../../core/quantity/figure';
import { mosfetBoard, ownPair } from '../../support/mosfet-board';

const file = { file: 'rails.yaml' };
const report = (text: string) => analyse(text, file).report;

describe('gates of a MOSFET pair', () => {
  // Definition of charge: 5 nC at 100 kHz: 0.5 mA, out of the pin and into it again.
  const text = mosfetBoard(ownPair('1 V', '1 ohm', '2.5 nC'));
  const { pins, chips, drivers, rails } = report(text);

  it('load the pin that drives them, and its chip', () => {
    expect(pins['mcu.P1']?.sourceAverage).toBeCloseTo(0.5e-3, 12);
    expect(pins['mcu.P1']?.sinkAverage).toBeCloseTo(0.5e-3, 12);
    expect(chips['mcu']?.sourceTotal).toBeCloseTo(0.5e-3, 12);
    expect(chips['mcu']?.current?.typical).toBeCloseTo(1.5e-3, 12);
    expect(drivers['amp']?.inputCurrent).toBeCloseTo(0.5e-3, 12);
  });

  it('draw peaks by Ohm’s law, which a gate resistor bounds', () => {
    expect(pins['mcu.P1']?.peakSource).toBeCloseTo(5 / 25, 9);
    const slow = report(mosfetBoard(`${ownPair('1 V', '1 ohm', '2.5 nC')}, gate: 75 ohm`));
    expect(slow.pins['mcu.P1']?.peakSource).toBeCloseTo(5 / 100, 9);
    // Half of the energy Q V of each edge is lost in the resistance.
    expect(slow.pins['mcu.P1']!.rms! ** 2 * 100).toBeCloseTo(100e3 * 5e-9 * 5, 9);
  });

  it('are charged once, however many pumps stand behind the driver', () => {
    const two = `${text}  more:
    pump: { topology: doubler, input: v5, drive: amp, diode: bare, flying: { value: 1 uF, kind: film }, reservoir: { value: 1 uF, kind: film } }
    loads: { lamp: 0.1 mA }
`;
    expect(report(two).pins['mcu.P1']?.sourceAverage).toBeCloseTo(0.5e-3, 12);
    expect(report(two).chips['mcu']?.current?.typical).toBeCloseTo(1.5e-3, 12);
  });

  it('load an oscillator’s rail where no pin drives them', () => {
    const timer = (charge?: string) =>
      report(
        mosfetBoard(ownPair('1 V', '1 ohm', charge)).replace(
          /tick: \{ pin.*\}/,
          'tick: { rail: v5, astable: { charge: 10 kohm, discharge: 33 kohm, timing: 100 pF, part: cmos-astable } }',
        ),
      );
    const [with5, without] = [timer('2.5 nC'), timer()];
    const hertz = with5.clocks['tick']!.frequency!.typical;
    const added = with5.rails['v5']!.current! - without.rails['v5']!.current!;
    expect(added).toBeGreaterThan(5e-9 * hertz);
  });

  it('slow the pump’s edges as a clock with edges of that length does', () => {
    // Charging of a capacitor behind 75 ohm, 10 to 90 % in ln 9 time constants, as a straight ramp: 206 ns.
    const ramp = (Math.log(9) / 0.8) * 75 * (5e-9 / 5);
    const gates = report(
      mosfetBoard(`${ownPair('1 V', '1 ohm', '2.5 nC')}, gate: 50 ohm`, { load: '20 mA' }),
    );
    const length = (ramp * 1e9).toFixed(3);
    const clock = report(
      mosfetBoard(ownPair('1 V', '1 ohm'), {
        edges: `, rise: ${length} ns, fall: ${length} ns`,
        load: '20 mA',
      }),
    );
    const sharp = report(mosfetBoard(ownPair('1 V', '1 ohm'), { load: '20 mA' }));
    const volts = ({ rails: all }: typeof gates) => all['up']!.voltage!.typical;
    expect(volts(gates)).toBeCloseTo(volts(clock), 6);
    expect(Math.abs(volts(gates) - volts(sharp))).toBeGreaterThan(1e-3);
  });

  it('leave a report that says what is missing without their charge', () => {
    const { findings, report: bare } = analyse(mosfetBoard(ownPair('1 V', '1 ohm')), file);
    expect(bare.drivers['amp']).toMatchObject({ inputCurrent: null, dissipation: null });
    expect(findings.map(({ code, at }) => `${code} ${at}`)).toContain('not-computed drivers.amp.mosfet-pair');
    expect(rails['up']?.voltage).not.toBeNull();
  });
});

describe('cross conduction of a MOSFET pair', () => {
  it('takes the published short-circuit power from the driver’s rail', () => {
    // H. J. M. Veendrick, 1984 (from memory: confirm): 20 mA/V^2, thresholds of 1 V, 5 V, 20 ns, 1 MHz: 0.9 mW, that is
    // 0.18 mA. Level 1 (Shichman and Hodges, 1968): 1 / (20 mA/V^2 x (4.5 - 1) V) = 14.2857 ohm. The ramp is 20 ns long
    // when (ln 9 / 0.8) x 25 ohm x Q / 5 V is.
    const charge = (20e-9 * 5 * 0.8) / (Math.log(9) * 25);
    const half = `${((charge / 2) * 1e9).toFixed(6)} nC`;
    const { rails, drivers } = report(
      mosfetBoard(ownPair('1 V', '14.285714 ohm', half), { frequency: '1 MHz' }),
    );
    const cross = rails['v5']!.current! - 1e-3 - 2 * 0.1e-3 - charge * 1e6;
    expect(cross).toBeGreaterThan(0.99 * 0.18e-3);
    expect(cross).toBeLessThan(1.01 * 0.18e-3);
    // The pump's 0.1 mA heats the pair hardly: most of what it turns into heat is this.
    expect(drivers['amp']!.dissipation!).toBeGreaterThan(0.9e-3);
    expect(drivers['amp']!.dissipation!).toBeLessThan(1.05 * 0.9e-3);
  });
});

describe('resistance of a MOSFET pair', () => {
  const part = (key: string) => catalogue.mosfets.find((entry) => entry.key === key)!;

  it('grows where the clock gives less than the stated gate voltage', () => {
    // Level 1 (Shichman and Hodges, 1968; from memory: confirm): 2 ohm x (5 - 1.7) / (3.3 - 1.7) = 4.125 ohm, and
    // 6 ohm x (5 - 1.5) / (3.3 - 1.5) = 11.67 ohm.
    const volts = gateVolts(exactly(3.3), { high: exactly(3.3), low: exactly(0) });
    const { high, low } = mosfetOhms(part('nmos-small-signal'), part('pmos-small-signal'), volts);
    expect(low.typical).toBeCloseTo(4.125, 6);
    expect(high.typical).toBeCloseTo(11.667, 3);
    expect(low.max).toBeCloseTo((5 * 2.5) / 0.8, 6);
  });

  it('is as stated at and above that voltage', () => {
    const volts = gateVolts(exactly(5), { high: exactly(5), low: exactly(0) });
    const { high, low } = mosfetOhms(part('nmos-logic-level'), part('pmos-logic-level'), volts);
    expect([low.typical, high.typical]).toEqual([0.03, 0.08]);
  });
});
