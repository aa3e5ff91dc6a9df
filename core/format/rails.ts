/**
 * Rails: where they come from, what they need, what they feed.
 */
import { capacitorPartShape, diodePartShape } from './parts';
import {
  choice,
  list,
  map,
  name,
  notNegative,
  option,
  part,
  percent,
  positive,
  quantity,
  row,
  shape,
  table,
  text,
} from './shape';

const needed = { required: true } as const;

export const capacitorShape = shape('a capacitor', 'A capacitor.', {
  value: row(quantity('F', positive), 'Nominal capacitance.', '10 uF', needed),
  kind: row(
    [part('capacitors'), map(capacitorPartShape)],
    'Dielectric: a key of the catalogue or of `parts`.',
    'x7r',
  ),
  rated: row(
    quantity('V', positive),
    'Rated voltage; what direct voltage leaves of a class 2 ceramic follows from it.',
    '16 V',
  ),
  esr: row(quantity('ohm', notNegative), 'Equivalent series resistance.', '50 mohm'),
  ripple: row(quantity('A', positive), 'Rated ripple current, rms.', '120 mA'),
  size: row(text, 'Case size of a ceramic: small cases lose more under direct voltage.', '0805'),
  'negative-to': row(
    name(['rails', 'clocks', 'drivers'], 'ground'),
    'Where the negative terminal of a polarised capacitor goes: `ground`, a clock or a driver is its end away from the diodes, a rail its end at them.',
    'ground',
  ),
});

const capacitor = [quantity('F', positive), map(capacitorShape)] as const;
const capacitors = [...capacitor, list(row(capacitor, 'One of several capacitors.', '1 uF'))];
const diode = [part('diodes'), map(diodePartShape)] as const;

export const pumpShape = shape('a pump', 'A charge pump: capacitors and diodes that a clock lifts.', {
  topology: row(
    choice(
      option('doubler', 'One positive stage on top of `input`.'),
      option('inverter', 'One stage below ground.'),
      option('multiplier', 'Several stages on two phases.'),
      option('ladder', 'Several half-wave stages on one phase.'),
    ),
    'How the stages are wired.',
    'doubler',
    needed,
  ),
  stages: row(quantity('1', { least: 1, most: 40, whole: true }), 'Number of stages.', '3'),
  polarity: row(
    choice(option('positive', 'Pumps up.'), option('negative', 'Pumps down.')),
    'Direction of a multiplier or ladder.',
    'negative',
  ),
  input: row(name('rails', 'ground'), 'The rail that the pump stands on, or `ground`.', 'v3'),
  drive: row(
    [name(['clocks', 'drivers']), list(row(name(['clocks', 'drivers']), 'One of the phases.', 'tick'))],
    'The clock or driver that lifts the capacitors; two for a pump with two phases.',
    'tick',
    needed,
  ),
  flying: row(capacitors, 'The capacitor that is lifted; a list for one in each stage.', '1 uF', needed),
  smoothing: row(capacitors, 'Second column of a ladder; as `flying` if left out.', '1 uF'),
  reservoir: row(capacitor, 'The capacitor across the output.', '10 uF'),
  diode: row(
    [...diode, list(row(diode, 'The diode at one position.', 'schottky-signal'))],
    'Diode of all positions, or a list with one for each.',
    'schottky-signal',
    needed,
  ),
  series: row(quantity('ohm', notNegative), 'Resistor between drive and flying capacitor.', '10 ohm'),
});

export const regulatorShape = shape('a regulator', 'A regulator between two rails.', {
  from: row(name('rails'), 'The rail at its input.', 'vbat', needed),
  output: row(quantity('V'), 'Output voltage.', '3.3 V +-2 %', needed),
  dropout: row(quantity('V', notNegative), 'Least difference between input and output.', '250 mV'),
  ground: row(quantity('A', notNegative), 'Current for itself.', '50 uA'),
  limit: row(quantity('A', positive), 'Largest output current.', '300 mA'),
  kind: row(
    choice(
      option('linear', 'Input current is output current.'),
      option('switching', 'Converts by `efficiency`.'),
    ),
    'How it regulates; linear if left out.',
    'linear',
  ),
  efficiency: row(percent({ above: 0, most: 1 }), 'Efficiency of a switching regulator.', '90 %'),
  thermal: row(quantity('K/W', positive), 'Thermal resistance from junction to ambient.', '200 K/W'),
});

export const filterShape = shape(
  'a filter',
  'A resistor or inductor and a capacitor behind a rail.',
  {
    from: row(name('rails'), 'The rail at its input.', 'v5', needed),
    resistor: row(quantity('ohm', positive), 'Series resistor.', '10 ohm'),
    inductor: row(quantity('H', positive), 'Series inductor.', '10 uH'),
    capacitor: row(capacitor, 'Capacitor to ground.', '10 uF', needed),
  },
  ['resistor', 'inductor'],
);

export const needsShape = shape('the needs of a rail', 'What the rail must keep.', {
  voltage: row(
    quantity('V'),
    'Window that the voltage must stay in; one figure asks for at least that much.',
    '5.2..6.5 V',
  ),
  ripple: row(quantity('V', positive), 'Largest ripple, peak to peak.', '30 mV'),
  start: row(quantity('s', positive), 'Time in which it must have come up.', '20 ms'),
  swing: row(
    quantity('V', positive),
    'Peak that the signal of an amplifier on this rail must reach, as a magnitude: at every moment the rail holds at least that and `headroom`.',
    '4 V',
  ),
  headroom: row(
    quantity('V', notNegative),
    'What an amplifier needs between signal and rail; if left out, that of the usual bipolar single-supply one.',
    '1.2 V',
  ),
  discharge: row(
    quantity('s', positive),
    'Time in which it must have gone down after switching off: to 1 V, or to 60 V from above.',
    '1 s',
  ),
});

export const amplifierShape = shape('an amplifier', 'Operational amplifiers as a load.', {
  quiescent: row(quantity('A', notNegative), 'Current without signal, each.', '1.2 mA', needed),
  output: row(
    quantity('A', notNegative),
    'Output current, each; it counts as flowing all the time, the cautious reading.',
    '0.5 mA',
  ),
  count: row(quantity('1', { above: 0, whole: true }), 'How many of them; one if left out.', '2'),
});

export const loadShape = shape(
  'a load',
  'What a rail feeds: a current, a resistance or a power.',
  {
    current: row(quantity('A', notNegative), 'A steady current, as a magnitude.', '1.2 mA'),
    resistance: row(quantity('ohm', positive), 'A resistance to ground.', '47 kohm'),
    power: row(quantity('W', notNegative), 'A steady power.', '10 mW'),
    amplifier: row(map(amplifierShape), amplifierShape.doc, '{ quiescent: 1.2 mA, count: 2 }'),
    in: row(
      [name('modes'), list(row(name('modes'), 'A mode in which it draws.', 'active'))],
      'Modes in which it draws; all if left out.',
      '[active]',
    ),
    least: row(quantity('V'), 'Lowest voltage that it works at.', '4.5 V'),
    most: row(quantity('V'), 'Highest voltage that it bears.', '7 V'),
  },
  ['current', 'resistance', 'power', 'amplifier'],
);

export const railShape = shape(
  'a rail',
  'A net with a voltage.',
  {
    supply: row(name('supplies'), 'The supply that it comes from.', 'pack'),
    regulator: row(map(regulatorShape), regulatorShape.doc, '{ from: vbat, output: 3.3 V +-2 % }'),
    pump: row(
      map(pumpShape),
      pumpShape.doc,
      '{ topology: inverter, drive: tick, diode: schottky-signal, flying: 1 uF, reservoir: 10 uF }',
    ),
    filter: row(map(filterShape), filterShape.doc, '{ from: v5, resistor: 10 ohm, capacitor: 10 uF }'),
    needs: row(map(needsShape), needsShape.doc, '{ voltage: 5.2..6.5 V, ripple: 30 mV }'),
    loads: row(
      table(
        row(
          [quantity('A', notNegative), quantity('ohm', positive), quantity('W', notNegative), map(loadShape)],
          loadShape.doc,
          '1.2 mA',
        ),
      ),
      'What the rail feeds, by name.',
      '{ reference: 47 kohm }',
    ),
    bleeder: row(quantity('ohm', positive), 'Resistor across the output that is always there.', '100 kohm'),
  },
  ['supply', 'regulator', 'pump', 'filter'],
);
