import { describe, expect, it } from 'vitest';
import { analyse } from '../../../core/index';
import { bench } from '../../support/bench-board';
import { checkRule, checkSilent } from '../../support/check-rule';

const wet = (rest = '') => `{ value: 10 uF, kind: aluminium${rest} }`;

// Where the positive terminal goes: doubler at the pumped node and at the output; inverter at the drive and at ground
// (signs of the node voltages; project's reference sheet, derived and simulated there).
describe('capacitor-polarity', () => {
  it('fires for a reservoir below ground whose negative terminal is said to go to ground', () => {
    checkRule(
      'capacitor-polarity',
      `${bench}
  down:
    pump:
      topology: inverter
      drive: tick
      diode: schottky-signal
      flying: { value: 1 uF, kind: film }
      reservoir: ${wet(', negative-to: ground')}
#                                                              ^^^^^^ error capacitor-polarity: Turn it round: positive to ground, negative to the rail
    loads: { x: 2 mA }
`,
    );
  });

  it('fires for the first capacitor of a ladder on ground, which sees one diode drop the other way', () => {
    checkRule(
      'capacitor-polarity',
      `${bench}
  up:
    pump:
      topology: ladder
      stages: 2
      input: ground
      drive: tick
      diode: schottky-signal
      flying: [${wet()}, ${wet()}]
#              ^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^^ error capacitor-polarity: up.flying[0] with its positive terminal at the diodes
      smoothing: ${wet()}
      reservoir: ${wet()}
    loads: { x: 0.1 mA }
`,
    );
  });

  it('fires with a negative-to that names the wrong end of a flying capacitor', () => {
    checkRule(
      'capacitor-polarity',
      `${bench}
  up:
    pump:
      topology: doubler
      input: v5
      drive: tick
      diode: schottky-signal
      flying: ${wet(', negative-to: up')}
#                                                           ^^ error capacitor-polarity: Turn it round: positive to the diodes, negative to the drive
      reservoir: ${wet(', negative-to: ground')}
    loads: { x: 2 mA }
`,
    );
  });

  it('is silent where the orientation fits, said or not, and for kinds without polarity', () => {
    checkSilent(
      'capacitor-polarity',
      `${bench}
  up:
    pump: { topology: doubler, input: v5, drive: tick, diode: schottky-signal, flying: ${wet(', negative-to: tick')}, reservoir: ${wet()} }
    loads: { x: 2 mA }
  down:
    pump: { topology: inverter, drive: tick, diode: schottky-signal, flying: ${wet(', negative-to: down')}, reservoir: ${wet(', negative-to: down')} }
    loads: { x: 2 mA }
  ladder:
    pump: { topology: ladder, stages: 2, input: ground, drive: tick, diode: schottky-signal, flying: 10 uF, reservoir: ${wet()} }
    loads: { x: 0.1 mA }
`,
    );
  });

  it('turns the stated terminal round by a fix', () => {
    const text = `${bench}  up:\n    pump: { topology: doubler, input: v5, drive: tick, diode: schottky-signal, flying: 1 uF, reservoir: ${wet(', negative-to: up')} }\n    loads: { x: 2 mA }\n`;
    const found = analyse(text, { file: 'rails.yaml' }).findings.find(
      ({ code }) => code === 'capacitor-polarity',
    );
    expect(found?.fixes?.[0]?.edits[0]?.text).toBe('ground');
  });
});
