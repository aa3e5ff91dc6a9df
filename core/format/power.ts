/**
 * Where energy enters the board, and the chips that turn it into square waves.
 */
import { chipPartShape } from './chip-data';
import { gatePartShape, timerPartShape } from './parts';
import {
  list,
  map,
  name,
  notNegative,
  part,
  percent,
  positive,
  quantity,
  row,
  shape,
  share,
  table,
  text,
} from './shape';

const needed = { required: true } as const;

export const supplyShape = shape(
  'a supply',
  'Where energy enters the board: a port, a battery, or a plain voltage.',
  {
    standard: row(
      { kind: 'source', of: 'standards' },
      'A port standard that fixes voltage and current.',
      'usb-2-configured',
    ),
    battery: row({ kind: 'source', of: 'batteries' }, 'A kind of battery.', 'li-ion'),
    voltage: row(quantity('V'), 'Voltage of a plain supply.', '4.75..5.25 V'),
    cells: row(quantity('1', { above: 0, whole: true }), 'Cells in series; one if left out.', '2'),
    current: row(quantity('A', positive), 'The most that may be drawn.', '500 mA'),
    resistance: row(quantity('ohm', notNegative), 'Internal resistance.', '120 mohm'),
    capacity: row(
      quantity('C', positive),
      'Charge of the battery; behind a plain `voltage` its band runs from full to empty.',
      '1200 mAh',
    ),
    life: row(quantity('s', positive), 'Time that the battery must last.', '6000 h'),
    bulk: row(quantity('F', notNegative), 'Capacitance that the supply lets you connect.', '10 uF'),
  },
  ['standard', 'battery', 'voltage'],
);

export const pinUseShape = shape('a pin', 'What else hangs on a pin, and how strongly it drives.', {
  strength: row({ kind: 'strength' }, 'Drive setting, as the part names it.', '12 mA'),
  sources: row(quantity('A', notNegative), 'Other steady current out of the pin.', '2 mA'),
  sinks: row(quantity('A', notNegative), 'Other steady current into the pin.', '2 mA'),
});

export const chipShape = shape('a chip', 'An IC with pins.', {
  part: row([part('chips'), map(chipPartShape)], 'Key of the catalogue or of `parts`.', 'rp2040'),
  rail: row(name('rails'), 'The rail that supplies it.', 'v3'),
  draws: row(
    [
      quantity('A', notNegative),
      table(row(quantity('A', notNegative), 'Current in that mode.', '24 mA'), 'modes'),
    ],
    'Its own supply current, or one for each mode.',
    '{ active: 24 mA, sleep: 0.4 mA }',
  ),
  pins: row(
    table(row(map(pinUseShape), pinUseShape.doc, '{ strength: 12 mA }'), 'pins'),
    'Pins that need a word of their own.',
    '{ GP15: { strength: 12 mA } }',
  ),
});

export const registersShape = shape(
  'the registers of a timer',
  'Registers of a timer that counts from 0 to top and starts again: input / (prescaler (top + 1)).',
  {
    input: row(quantity('Hz', positive), 'Clock of the timer.', '16 MHz', needed),
    prescaler: row(quantity('1', { least: 1, whole: true }), 'Divider before the counter.', '8'),
    top: row(
      quantity('1', { least: 1, whole: true }),
      'Count at which the timer starts again.',
      '159',
      needed,
    ),
    compare: row(
      quantity('1', { least: 0, whole: true }),
      'Counts for which the output is high; half of them if left out.',
      '80',
    ),
  },
);

export const astableShape = shape('an astable', 'A timer that oscillates by itself.', {
  charge: row(quantity('ohm', positive), 'Resistor that only charges.', '10 kohm', needed),
  discharge: row(quantity('ohm', positive), 'Resistor that charges and discharges.', '47 kohm', needed),
  timing: row(quantity('F', positive), 'Timing capacitor.', '1 nF', needed),
  part: row(
    [part('timers'), map(timerPartShape)],
    'Key of the catalogue or of `parts`.',
    'bipolar-astable',
    needed,
  ),
});

export const schmittShape = shape(
  'a Schmitt oscillator',
  'An inverter with hysteresis that oscillates by itself.',
  {
    resistor: row(quantity('ohm', positive), 'Feedback resistor.', '47 kohm', needed),
    capacitor: row(quantity('F', positive), 'Timing capacitor.', '1 nF', needed),
    part: row(
      [part('gates'), map(gatePartShape)],
      'Key of the catalogue or of `parts`.',
      'hc-schmitt',
      needed,
    ),
  },
);

export const externalShape = shape('an external clock', 'A square wave from off the board.', {
  frequency: row(quantity('Hz', positive), 'Frequency.', '100 kHz', needed),
  duty: row(percent(share), 'Share of the period that it is high.', '50 %'),
  high: row(quantity('V'), 'High level.', '5 V', needed),
  low: row(quantity('V'), 'Low level; 0 V if left out.', '0 V'),
  resistance: row(quantity('ohm', notNegative), 'Resistance of the source.', '50 ohm'),
});

export const clockShape = shape(
  'a clock',
  'A square wave.',
  {
    pin: row({ kind: 'pin' }, 'The pin that puts it out.', 'mcu.GP15'),
    frequency: row(quantity('Hz', positive), 'Frequency.', '100 kHz'),
    duty: row(percent({ above: 0, most: 1 }), 'Share of the period that the output is high.', '50 %'),
    timer: row(map(registersShape), registersShape.doc, '{ input: 16 MHz, top: 159, compare: 80 }'),
    astable: row(
      map(astableShape),
      astableShape.doc,
      '{ charge: 10 kohm, discharge: 47 kohm, timing: 1 nF, part: bipolar-astable }',
    ),
    schmitt: row(
      map(schmittShape),
      schmittShape.doc,
      '{ resistor: 47 kohm, capacitor: 1 nF, part: hc-schmitt }',
    ),
    external: row(map(externalShape), externalShape.doc, '{ frequency: 100 kHz, duty: 50 %, high: 5 V }'),
    rail: row(name('rails'), 'The rail that supplies an astable or a Schmitt oscillator.', 'v5'),
    rise: row(quantity('s', notNegative), 'Rise time of the edge.', '10 ns'),
    fall: row(quantity('s', notNegative), 'Fall time of the edge.', '10 ns'),
    'inverse-of': row(name('clocks'), 'The clock whose second phase this is.', 'tick'),
  },
  ['pin', 'astable', 'schmitt', 'external'],
);

export const modeShape = shape('a mode', 'An operating mode of the board.', {
  share: row(percent(share), 'Share of the time.', '98 %', needed),
});

export const conditionsShape = shape('the conditions', 'What the board must stand.', {
  ambient: row(
    quantity('K', { above: 0 }),
    'Ambient temperature; corners are taken over this range.',
    '-20..45 degC',
  ),
});

export const includeRow = row(
  list(row(text, 'A file, relative to this one.', 'parts.yaml')),
  'Other files with parts shared between boards.',
  '[parts.yaml]',
);
