/**
 * Data of chips, pins and logic outputs, as it stands under `parts` and in the catalogue.
 */
import { list, map, notNegative, positive, quantity, row, shape, table, text } from './shape';

export const sourceRow = row(text, 'Where the figures of this entry come from.', 'data sheet revision 4');

export const testPointShape = shape('a test point', "One line of a data sheet's output table.", {
  current: row(quantity('A', positive), 'Current of the pin, as a magnitude.', '4 mA', { required: true }),
  voltage: row(quantity('V', notNegative), 'Voltage of the pin against ground.', '2.9 V', { required: true }),
  supply: row(quantity('V', positive), 'Supply voltage at which the line holds.', '3.3 V', {
    required: true,
  }),
});

const testPoints = list(
  row(map(testPointShape), 'A line of the output table.', '{ current: 4 mA, voltage: 2.9 V, supply: 3.3 V }'),
);

export const highResistance = row(
  quantity('ohm', positive),
  'Resistance of the output while it is high.',
  '40..55 ohm',
);
export const lowResistance = row(
  quantity('ohm', positive),
  'Resistance of the output while it is low.',
  '30..45 ohm',
);
export const high = row(
  testPoints,
  'Output voltage at a current while high.',
  '[{ current: 4 mA, voltage: 2.9 V, supply: 3.3 V }]',
);
export const low = row(
  testPoints,
  'Output voltage at a current while low.',
  '[{ current: 4 mA, voltage: 0.4 V, supply: 3.3 V }]',
);
export const absolute = row(
  quantity('A', positive),
  'Absolute maximum rating of the current of one pin.',
  '40 mA',
);
export const supplyRange = row(quantity('V', positive), 'Supply voltage it works in.', '1.8..5.5 V');

const pinKeys = {
  'high-resistance': highResistance,
  'low-resistance': lowResistance,
  high,
  low,
  recommended: row(quantity('A', positive), 'Current up to which the levels are guaranteed.', '8 mA'),
  absolute,
};

export const pinStrengthShape = shape(
  'a drive setting',
  'Output data of a pin at one drive setting.',
  pinKeys,
);

export const pinDataShape = shape('the data of a pin', 'Output data of a pin.', {
  ...pinKeys,
  strengths: row(
    table(row(map(pinStrengthShape), 'One drive setting.', '{ high-resistance: 50 ohm }')),
    'Drive settings by name.',
    '{ 12 mA: { high-resistance: 50 ohm } }',
  ),
});

export const groupShape = shape('a pin group', 'Pins that share a limit.', {
  pins: row(list(row(text, 'A pin of the group.', 'PA0')), 'The pins of the group.', '[PA0, PA1]', {
    required: true,
  }),
  source: row(quantity('A', positive), 'Largest sum of currents out of the pins.', '100 mA'),
  sink: row(quantity('A', positive), 'Largest sum of currents into the pins.', '100 mA'),
});

export const totalShape = shape('the total of a chip', 'Limits of the sums over all pins of a chip.', {
  source: row(quantity('A', positive), 'Largest sum of currents out of all pins.', '150 mA'),
  sink: row(quantity('A', positive), 'Largest sum of currents into all pins.', '150 mA'),
});

export const chipPartShape = shape('the data of a chip', 'Data of a chip with pins.', {
  source: sourceRow,
  supply: supplyRange,
  pins: row(
    map(pinDataShape),
    'Output data of every pin without an entry of its own.',
    '{ high-resistance: 40 ohm }',
  ),
  pin: row(
    table(row(map(pinDataShape), 'Output data of one pin.', '{ high-resistance: 40 ohm }'), 'pins'),
    'Pins that differ from the others, by name.',
    '{ PC13: { recommended: 3 mA } }',
  ),
  groups: row(
    table(row(map(groupShape), 'Pins that share a limit.', '{ pins: [PA0, PA1], source: 100 mA }')),
    'Groups of pins that share a limit.',
    '{ port-a: { pins: [PA0, PA1], source: 100 mA } }',
  ),
  total: row(map(totalShape), 'Limits of the sums over all pins.', '{ source: 150 mA, sink: 150 mA }'),
  draws: row(
    quantity('A', notNegative),
    'Supply current of the chip itself, where the board gives none.',
    '20 mA',
  ),
});
