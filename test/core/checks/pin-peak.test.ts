import { describe, it } from 'vitest';
import { bench } from '../../support/bench-board';
import { checkRule, checkSilent } from '../../support/check-rule';
import { mosfetBoard, ownPair } from '../../support/mosfet-board';

const pump = (series: string) =>
  `pump: { topology: inverter, drive: tick, diode: schottky-signal, ${series}flying: { value: 47 nF, kind: x7r }, reservoir: { value: 10 uF, kind: x7r } }`;

describe('pin-peak', () => {
  it('warns of peaks above the absolute maximum while the steady current is below', () => {
    // Ohm's law: each edge drives the volts that the capacitor lost, about I/(f C) = 1.7 V and more through 20 ohm.
    checkRule(
      'pin-peak',
      `${bench.replace('duty: 50 % }', 'duty: 50 % }\n#              ^^^^^^ warning pin-peak: in series with the drive (`series`) bounds them')}
  down:
    ${pump('')}
    loads: { bias: 8 mA }
`,
    );
  });

  it('is silent with a resistor in the way, and where no absolute maximum is known', () => {
    checkSilent('pin-peak', `${bench}  down:\n    ${pump('series: 68 ohm, ')}\n    loads: { bias: 8 mA }\n`);
    checkSilent(
      'pin-peak',
      `${bench.replace(', absolute: 40 mA', '')}  down:\n    ${pump('')}\n    loads: { bias: 8 mA }\n`,
    );
  });

  it('proposes a gate resistor where the peaks charge gates', () => {
    // Ohm's law: 5 V over the 25 ohm of the pin and 25 ohm more are 100 mA; 40 mA want 125 ohm, 75 ohm more.
    const pair = (gate: string) => mosfetBoard(`${ownPair('1 V', '1 ohm', '2 nC')}, gate: ${gate}`);
    checkRule(
      'pin-peak',
      pair('25 ohm').replace(
        'duty: 50 % }',
        'duty: 50 % }\n#              ^^^^^^ warning pin-peak: They charge the gates of amp: about 82 ohm more',
      ),
    );
    checkSilent('pin-peak', pair('120 ohm'));
  });
});
