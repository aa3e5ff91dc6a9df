/**
 * Part data as it stands under `parts`, in place of a part's key, and in the catalogue.
 * Figures hold at 25 degC.
 */
import {
  absolute,
  chipPartShape,
  high,
  highResistance,
  low,
  lowResistance,
  sourceRow,
  supplyRange,
} from './chip-data';
import {
  choice,
  list,
  map,
  notNegative,
  option,
  percent,
  positive,
  quantity,
  row,
  shape,
  table,
} from './shape';

export const diodePartShape = shape('the data of a diode', 'Data of a diode.', {
  source: sourceRow,
  kind: row(
    choice(
      option('silicon', 'A silicon junction: its saturation current grows fast with temperature.'),
      option('schottky', 'A Schottky barrier: a low forward voltage.'),
    ),
    'Sets the temperature law.',
    'schottky',
  ),
  saturation: row(quantity('A', positive), 'Saturation current.', '2.5 nA'),
  ideality: row(quantity('1', { least: 0.5, most: 5 }), 'Ideality factor.', '1.8'),
  resistance: row(quantity('ohm', notNegative), 'Series resistance.', '0.6 ohm'),
  junction: row(quantity('F', notNegative), 'Junction capacitance without bias.', '4 pF'),
  reverse: row(quantity('V', positive), 'Largest reverse voltage.', '30 V'),
  average: row(quantity('A', positive), 'Largest average forward current.', '200 mA'),
  peak: row(quantity('A', positive), 'Largest repeated peak of the forward current.', '500 mA'),
  leakage: row(quantity('A', notNegative), 'Reverse leakage current at the reverse rating.', '2 uA'),
});

export const transistorPartShape = shape('the data of a transistor', 'Data of a bipolar transistor.', {
  source: sourceRow,
  polarity: row(
    choice(option('npn', 'Conducts to ground.'), option('pnp', 'Conducts from the supply.')),
    'Polarity.',
    'npn',
  ),
  saturation: row(quantity('A', positive), 'Transport saturation current.', '10 fA'),
  gain: row(quantity('1', positive), 'Forward current gain.', '100..200..400'),
  'reverse-gain': row(quantity('1', positive), 'Reverse current gain.', '5'),
  'base-resistance': row(quantity('ohm', notNegative), 'Base resistance.', '10 ohm'),
  'collector-resistance': row(quantity('ohm', notNegative), 'Collector resistance.', '1 ohm'),
  'emitter-resistance': row(quantity('ohm', notNegative), 'Emitter resistance.', '0.5 ohm'),
  storage: row(
    quantity('s', notNegative),
    'Storage time of the usual test: a tenth of the collector current into the base, then as much out of it. Without it no overlap after an edge is counted.',
    '200 ns',
  ),
  current: row(quantity('A', positive), 'Largest collector current.', '500 mA'),
});

export const mosfetPartShape = shape('the data of a MOS transistor', 'Data of a MOS transistor.', {
  source: sourceRow,
  channel: row(
    choice(option('n', 'Conducts to ground.'), option('p', 'Conducts from the supply.')),
    'Channel.',
    'n',
  ),
  threshold: row(quantity('V'), 'Gate threshold voltage.', '0.8..1.2..1.5 V'),
  'on-resistance': row(
    quantity('ohm', positive),
    'Resistance while on, at its stated gate voltage.',
    '60 mohm',
  ),
  'gate-charge': row(quantity('C', positive), 'Total gate charge.', '4 nC'),
  current: row(quantity('A', positive), 'Largest drain current.', '2 A'),
});

export const gatePartShape = shape('the data of a gate', 'Data of a logic gate.', {
  source: sourceRow,
  supply: supplyRange,
  'high-resistance': highResistance,
  'low-resistance': lowResistance,
  high,
  low,
  absolute,
  total: row(quantity('A', positive), 'Largest current through a supply pin.', '50 mA'),
  rising: row(quantity('V', positive), 'Upper input threshold.', '1.7..2.2..2.7 V'),
  falling: row(quantity('V', positive), 'Lower input threshold.', '0.9..1.4..1.8 V'),
  draws: row(quantity('A', notNegative), 'Supply current without load.', '2 uA'),
});

export const timerPartShape = shape('the data of a timer', 'Data of an astable timer.', {
  source: sourceRow,
  supply: supplyRange,
  'high-drop': row(
    quantity('V', notNegative),
    'What the high level lacks to the supply, at light load.',
    '1.4 V',
  ),
  'high-resistance': highResistance,
  'low-voltage': row(quantity('V', notNegative), 'Voltage of the low level, at light load.', '50 mV'),
  'low-resistance': lowResistance,
  draws: row(quantity('A', notNegative), 'Supply current without load.', '3 mA'),
  fastest: row(quantity('Hz', positive), 'Highest frequency it runs at.', '500 kHz'),
});

export const biasShape = shape('a bias point', 'Capacitance left at a direct voltage.', {
  share: row(percent(), 'Voltage as a share of the rating.', '50 %', { required: true }),
  left: row(percent({ least: 0, most: 2 }), 'Capacitance left, as a share.', '60 %', { required: true }),
});

export const capacitorPartShape = shape('the data of a kind of capacitor', 'Data of a kind of capacitor.', {
  source: sourceRow,
  tolerance: row(percent({ least: -1 }), 'Deviation of the value.', '+-20 %'),
  temperature: row(percent({ least: -1 }), 'Change of the value over the temperature range.', '+-15 %'),
  bias: row(
    list(row(map(biasShape), 'Capacitance left at a direct voltage.', '{ share: 50 %, left: 60 % }')),
    'Capacitance left at a share of the rated voltage.',
    '[{ share: 50 %, left: 60 % }]',
  ),
  loss: row(quantity('1', notNegative), 'Loss factor (tan delta) at 120 Hz.', '0.16'),
  esr: row(quantity('ohm', notNegative), 'Equivalent series resistance.', '10 mohm'),
  leakage: row(quantity('A', notNegative), 'Leakage current at the rated voltage.', '3 uA'),
  polarised: row(
    choice(
      option('yes', 'One terminal must stay positive.'),
      option('no', 'Either way round.'),
      option('true', 'As yes.'),
      option('false', 'As no.'),
    ),
    'Whether it has a positive terminal.',
    'yes',
  ),
});

export const partsShape = shape(
  'the data of your own parts',
  "Data of your own, beside or instead of the catalogue's.",
  {
    chips: row(
      table(row(map(chipPartShape), chipPartShape.doc, '{ pins: { high-resistance: 40 ohm } }')),
      'Chips with pins.',
      '{ my-mcu: { pins: { high-resistance: 40 ohm } } }',
    ),
    diodes: row(
      table(row(map(diodePartShape), diodePartShape.doc, '{ saturation: 2.5 nA }')),
      'Diodes.',
      '{ my-diode: { saturation: 2.5 nA, ideality: 1.8, resistance: 0.6 ohm } }',
    ),
    transistors: row(
      table(row(map(transistorPartShape), transistorPartShape.doc, '{ polarity: npn }')),
      'Bipolar transistors.',
      '{ my-npn: { polarity: npn, saturation: 10 fA, gain: 200 } }',
    ),
    mosfets: row(
      table(row(map(mosfetPartShape), mosfetPartShape.doc, '{ channel: n }')),
      'MOS transistors.',
      '{ my-nmos: { channel: n, threshold: 1.2 V, on-resistance: 60 mohm } }',
    ),
    gates: row(
      table(row(map(gatePartShape), gatePartShape.doc, '{ high-resistance: 40 ohm }')),
      'Logic gates.',
      '{ my-gate: { high-resistance: 40 ohm } }',
    ),
    timers: row(
      table(row(map(timerPartShape), timerPartShape.doc, '{ high-drop: 1.4 V }')),
      'Astable timers.',
      '{ my-timer: { high-drop: 1.4 V } }',
    ),
    capacitors: row(
      table(row(map(capacitorPartShape), capacitorPartShape.doc, '{ tolerance: +-20 % }')),
      'Kinds of capacitors.',
      '{ my-kind: { tolerance: +-20 %, esr: 10 mohm } }',
    ),
  },
);
