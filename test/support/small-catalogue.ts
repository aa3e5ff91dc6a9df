/**
 * A catalogue of one or two invented parts of each family: tests of the language must not change with the real one.
 */
import type { Catalogue } from '../../core/catalog/part';
import { type Band, type Figure, figure, type Unit } from '../../core/quantity/figure';

const given = (band: Band | number, unit: Unit): Figure =>
  figure(band, unit, { kind: 'data sheet', note: 'invented' });
const source = 'invented for tests';

export const smallCatalogue: Catalogue = {
  chips: [
    {
      key: 'mcu-a',
      title: 'Controller A',
      source,
      supply: given({ min: 1.8, typical: 3.3, max: 3.6 }, 'V'),
      pins: {
        highResistance: given(50, 'ohm'),
        lowResistance: given(40, 'ohm'),
        strengths: {
          '2 mA': { highResistance: given(200, 'ohm') },
          '12 mA': { highResistance: given(50, 'ohm') },
        },
      },
      pin: {},
      groups: [{ name: 'bank', pins: ['GP14', 'GP15'], source: given(0.05, 'A') }],
      total: {},
    },
    { key: 'mcu-b', title: 'Controller B', source, pins: {}, pin: {}, groups: [], total: {} },
  ],
  diodes: [
    {
      key: 'schottky-a',
      title: 'Schottky diode A',
      source,
      kind: 'schottky',
      saturation: given(1e-7, 'A'),
      ideality: given(1.05, '1'),
      resistance: given(2, 'ohm'),
    },
    {
      key: 'silicon-a',
      title: 'Silicon diode A',
      source,
      kind: 'silicon',
      saturation: given(2.5e-9, 'A'),
      ideality: given(1.8, '1'),
      resistance: given(0.6, 'ohm'),
    },
  ],
  capacitors: [
    {
      key: 'x7r',
      title: 'Ceramic X7R',
      source,
      tolerance: given({ min: -0.1, typical: 0, max: 0.1 }, '1'),
      esr: given(0.01, 'ohm'),
      polarised: false,
    },
    {
      key: 'aluminium',
      title: 'Aluminium electrolytic',
      source,
      tolerance: given({ min: -0.2, typical: 0, max: 0.2 }, '1'),
      loss: given(0.16, '1'),
      polarised: true,
    },
  ],
  transistors: [
    {
      key: 'npn-a',
      title: 'Transistor A',
      source,
      polarity: 'npn',
      saturation: given(1e-14, 'A'),
      gain: given(200, '1'),
    },
    {
      key: 'pnp-a',
      title: 'Transistor B',
      source,
      polarity: 'pnp',
      saturation: given(1e-14, 'A'),
      gain: given(150, '1'),
    },
  ],
  mosfets: [
    {
      key: 'nmos-a',
      title: 'MOS A',
      source,
      channel: 'n',
      threshold: given(1, 'V'),
      onResistance: given(0.1, 'ohm'),
    },
    {
      key: 'pmos-a',
      title: 'MOS B',
      source,
      channel: 'p',
      threshold: given(-1, 'V'),
      onResistance: given(0.2, 'ohm'),
    },
  ],
  gates: [{ key: 'gate-a', title: 'Gate A', source, output: { highResistance: given(40, 'ohm') } }],
  timers: [{ key: 'timer-a', title: 'Timer A', source, highDrop: given(1.4, 'V') }],
  standards: [{ key: 'port-a', title: 'Port A', source, voltage: given(5, 'V'), current: given(0.5, 'A') }],
  batteries: [
    {
      key: 'li-ion',
      title: 'Lithium-ion cell',
      source,
      voltage: given({ min: 3, typical: 3.7, max: 4.2 }, 'V'),
      capacity: given(3600, 'C'),
      usable: given(0.8, '1'),
      selfDischarge: given(0.3, '1'),
      openVoltage: [
        { left: 1, volts: given(4.2, 'V') },
        { left: 0, volts: given(3, 'V') },
      ],
      agedResistance: [
        { left: 1, ohms: given(0.1, 'ohm') },
        { left: 0, ohms: given(0.2, 'ohm') },
      ],
      caution: 'invented',
    },
  ],
};
