import { describe, it } from 'vitest';
import { analyse, applyEdits } from '../../../core/index';
import { checkRule, checkSilent } from '../../support/check-rule';
import { markUnder } from '../../support/mark-under';
import { mosfetBoard, ownPair } from '../../support/mosfet-board';
import { pushPullBoard } from '../../support/push-pull-board';

const own = (polarity: string, rating: string) =>
  `{ polarity: ${polarity}, saturation: 10 fA, gain: 200, current: ${rating} }`;
const stage = (npn: string, pnp: string, base = '4.7 kohm') =>
  pushPullBoard(`base: { npn: ${base}, pnp: ${base} }`, 'a')
    .replace('npn-small-signal', own('npn', npn))
    .replace('pnp-small-signal', own('pnp', pnp));

describe('driver-over-limit', () => {
  it('is an error when a transistor carries more than its rating in every period', () => {
    // Charge balance: 1 mA of load passes each transistor in half of the period, so at least 2 mA flow while it is on.
    const npn = own('npn', '1.5 mA');
    checkRule(
      'driver-over-limit',
      markUnder(
        stage('1.5 mA', '200 mA'),
        'push-pull:',
        npn,
        'error driver-over-limit: at the peaks of every period (pump of up)',
      ),
    );
  });

  it('is a warning when only the way up exceeds it', () => {
    // Base current (5 - 0.7) V / 4.7 kohm times a gain of 200 is some 180 mA into empty capacitors.
    const pnp = own('pnp', '100 mA');
    checkRule(
      'driver-over-limit',
      markUnder(
        stage('300 mA', '100 mA'),
        'push-pull:',
        pnp,
        'warning driver-over-limit: comes up from empty capacitors',
      ),
    );
  });

  it('is silent where base current times gain stays below the rating', () => {
    checkSilent('driver-over-limit', stage('300 mA', '300 mA'));
  });

  it('holds for MOSFETs, and proposes the resistor that is missing', () => {
    // Ohm's law at the first edge: 5 V over 1 ohm and the diode's 1 ohm, less its drop: above 2 A; 1.5 A leave 3.3 ohm.
    const pair = (rating: string, series: string) =>
      mosfetBoard(
        `nmos: { channel: n, threshold: 1 V, on-resistance: 1 ohm, gate-charge: 1 nC, current: ${rating} },
      pmos: { channel: p, threshold: 1 V, on-resistance: 1 ohm, gate-charge: 1 nC }`,
      ).replace('drive: amp,', `drive: amp, ${series}`);
    const nmos = '{ channel: n, threshold: 1 V, on-resistance: 1 ohm, gate-charge: 1 nC, current: 1.5 A }';
    checkRule(
      'driver-over-limit',
      markUnder(
        pair('1.5 A', ''),
        'nmos:',
        nmos,
        'warning driver-over-limit: The n-channel MOSFET of amp carries up to 2',
      ),
    );
    checkSilent('driver-over-limit', pair('1.5 A', 'series: 6.8 ohm,'));
    const [found] = analyse(pair('1.5 A', ''), { file: 'rails.yaml' }).findings.filter(
      ({ code }) => code === 'driver-over-limit',
    );
    checkSilent('driver-over-limit', applyEdits(pair('1.5 A', ''), found!.fixes![0]!.edits));
    checkSilent('driver-over-limit', mosfetBoard(ownPair('1 V', '1 ohm', '1 nC')));
  });

  const gates = (total: string, parallel: number) => `
supplies: { lab: { voltage: 5 V } }
parts:
  chips:
    plain: { pins: { high-resistance: 25 ohm, low-resistance: 25 ohm } }
  gates:
    buffer: { high-resistance: 50 ohm, low-resistance: 50 ohm, absolute: 50 mA, total: ${total} }
chips: { mcu: { part: plain, rail: v5, draws: 1 mA } }
clocks:
  tick: { pin: mcu.P1, frequency: 100 kHz, duty: 50 % }
drivers:
  amp: { input: tick, rail: v5, gates: { part: buffer, parallel: ${parallel} } }
rails:
  v5: { supply: lab }
  up:
    pump: { topology: doubler, input: v5, drive: amp, series: 75 ohm, diode: schottky-signal, flying: { value: 1 uF, kind: film }, reservoir: { value: 1 uF, kind: film } }
    loads: { lamp: 5 mA }
`;

  it('holds for the outputs of gates and for their supply pins', () => {
    // Charge balance: 5 mA of load are 10 mA while on, two gates share them.
    checkRule(
      'driver-over-limit',
      markUnder(
        gates('8 mA', 2),
        'amp:',
        'buffer',
        'error driver-over-limit: A supply pin of the gates of amp',
      ),
    );
    checkSilent('driver-over-limit', gates('100 mA', 2));
  });
});
