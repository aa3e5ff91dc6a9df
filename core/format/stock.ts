/**
 * What may be used when a rail is sized: the parts drawer of the people who build the board.
 */
import { choice, list, name, option, part, positive, quantity, row, shape, text } from './shape';

export const stockShape = shape(
  'the stock',
  'What may be used when a rail is sized; each key may be left out.',
  {
    series: row(
      choice(
        option('E3', 'Three values in a decade.'),
        option('E6', 'Six values in a decade.'),
        option('E12', 'Twelve values in a decade.'),
        option('E24', 'Twenty-four values in a decade.'),
      ),
      'Preferred values of capacitors and resistors (IEC 60063); E6 if left out.',
      'E6',
    ),
    capacitors: row(
      list(row(quantity('F', positive), 'A value in stock.', '1 uF')),
      'Values in stock; all of the series if left out.',
      '[100 nF, 1 uF, 10 uF]',
    ),
    kinds: row(
      list(row(part('capacitors'), 'A kind in stock, the usual one first.', 'x7r')),
      'Kinds of capacitors, the usual one first; x7r and aluminium if left out.',
      '[x7r, aluminium]',
    ),
    rated: row(
      list(row(quantity('V', positive), 'A rated voltage in stock.', '25 V')),
      'Rated voltages of capacitors; the usual ones if left out.',
      '[10 V, 16 V, 25 V, 50 V]',
    ),
    diodes: row(
      list(row(part('diodes'), 'A diode in stock.', 'schottky-signal')),
      'Diodes; the small-signal ones of the catalogue if left out.',
      '[schottky-signal, silicon-switching]',
    ),
    transistors: row(
      list(row(part('transistors'), 'A transistor in stock.', 'npn-small-signal')),
      'Transistors for push-pull stages; the small-signal pair if left out.',
      '[npn-small-signal, pnp-small-signal]',
    ),
    gates: row(
      list(row(part('gates'), 'A gate in stock.', 'ac')),
      'Gates that may buffer a clock; `ac` if left out.',
      '[ac]',
    ),
    mosfets: row(
      list(row(part('mosfets'), 'A MOS transistor in stock.', 'nmos-small-signal')),
      'MOS transistors for pairs; the small-signal ones if left out.',
      '[nmos-small-signal, pmos-small-signal]',
    ),
    stages: row(
      quantity('1', { least: 1, most: 12, whole: true }),
      'Largest number of stages; 4 if left out.',
      '3',
    ),
    frequencies: row(
      list(row(quantity('Hz', positive), 'A frequency that a new clock may have.', '100 kHz')),
      'Frequencies of new clocks; those of the board, or 50, 100 and 200 kHz, if left out.',
      '[62.5 kHz]',
    ),
    preferred: row(
      list(row(text, 'A part that the board has anyway.', 'schottky-signal')),
      'Parts to use first: between equal choices the one with more of them wins.',
      '[schottky-signal]',
    ),
    rails: row(
      list(row(name('rails'), 'A rail that a pump may stand on.', 'v5')),
      'Rails that a pump may stand on; all that are not pumped if left out.',
      '[v5]',
    ),
  },
);
