/**
 * The whole file: its sections, and those that set it against reality.
 */
import { driverShape } from './drivers';
import { partsShape } from './parts';
import { chipShape, clockShape, conditionsShape, includeRow, modeShape, supplyShape } from './power';
import { railShape } from './rails';
import { list, map, name, notNegative, quantity, row, type Shape, shape, table, text } from './shape';
import { stockShape } from './stock';

const needed = { required: true } as const;

export const benchShape = shape(
  'a bench point',
  'A measured point, set against the prediction at the same load.',
  {
    rail: row(name('rails'), 'The rail that was measured.', 'v6', needed),
    load: row(
      [quantity('A', notNegative), quantity('ohm', { above: 0 })],
      'Load during the measurement.',
      '2 mA',
      needed,
    ),
    voltage: row(quantity('V'), 'Measured voltage.', '5.62 V', needed),
    ripple: row(quantity('V', notNegative), 'Measured ripple, peak to peak.', '18 mV'),
    note: row(text, 'How it was measured.', 'with a bench meter on board 3'),
  },
);

export const waiverShape = shape('a waiver', 'A finding that is accepted on purpose.', {
  finding: row({ kind: 'finding' }, 'Code of the finding.', 'rail-low', needed),
  at: row(
    text,
    'Path of the finding, or of what it belongs to where only one such finding stands there.',
    'rails.v6',
    needed,
  ),
  because: row(text, 'Why it is accepted.', 'the reference works down to 4.5 V', needed),
  until: row(text, 'When to look at it again: a date such as 2027-03-31, or a remark.', 'rev D'),
});

function section(entry: Shape, example: string) {
  return row(table(row(map(entry), entry.doc, '')), entry.doc, example);
}

export const boardShape = shape('a board file', 'The rails of one board.', {
  board: row(text, 'Title of the board.', 'Weir gauge rev B'),
  conditions: row(map(conditionsShape), conditionsShape.doc, '{ ambient: -20..45 degC }'),
  supplies: section(supplyShape, '{ port: { standard: usb-2-configured } }'),
  chips: section(chipShape, '{ mcu: { part: rp2040, rail: v3 } }'),
  clocks: section(clockShape, '{ tick: { pin: mcu.GP15, frequency: 100 kHz, duty: 50 % } }'),
  drivers: section(driverShape, '{ stage: { input: tick, rail: v5, gates: { part: ac } } }'),
  rails: section(railShape, '{ v5: { supply: port } }'),
  modes: section(modeShape, '{ active: { share: 2 % } }'),
  parts: row(map(partsShape), partsShape.doc, '{ diodes: { my-diode: { saturation: 2.5 nA } } }'),
  bench: row(
    list(row(map(benchShape), benchShape.doc, '{ rail: v6, load: 2 mA, voltage: 5.62 V }')),
    'Measured points.',
    '[{ rail: v6, load: 2 mA, voltage: 5.62 V }]',
  ),
  waivers: row(
    list(row(map(waiverShape), waiverShape.doc, '{ finding: rail-low, at: rails.v6, because: checked }')),
    'Findings accepted on purpose.',
    '[{ finding: rail-low, at: rails.v6, because: checked }]',
  ),
  stock: row(map(stockShape), stockShape.doc, '{ series: E6, diodes: [schottky-signal], stages: 3 }'),
  include: includeRow,
});
