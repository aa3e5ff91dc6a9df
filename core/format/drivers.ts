/**
 * Stages between a clock and a pump.
 */
import { gatePartShape, mosfetPartShape, transistorPartShape } from './parts';
import { list, map, name, notNegative, part, quantity, row, shape } from './shape';

const needed = { required: true } as const;
const transistor = [part('transistors'), map(transistorPartShape)] as const;
const mosfet = [part('mosfets'), map(mosfetPartShape)] as const;
const npn = row(transistor, 'The transistor to ground.', 'npn-small-signal', needed);
const pnp = row(transistor, 'The transistor to the supply.', 'pnp-small-signal', needed);
const baseResistor = quantity('ohm', notNegative);

export const baseShape = shape('the base resistors', 'One resistor for each base.', {
  npn: row(baseResistor, 'Resistor at the base of the npn transistor.', '1 kohm', needed),
  pnp: row(baseResistor, 'Resistor at the base of the pnp transistor.', '1 kohm', needed),
});

export const pushPullShape = shape(
  'a push-pull stage',
  'A complementary pair in common-emitter connection; it inverts.',
  {
    npn,
    pnp,
    base: row(map(baseShape), baseShape.doc, '{ npn: 1 kohm, pnp: 1 kohm }'),
    'shared-base': row(baseResistor, 'One resistor for both bases.', '1 kohm'),
  },
  ['base', 'shared-base'],
);

export const followerShape = shape('a follower stage', 'A complementary pair of emitter followers.', {
  npn,
  pnp,
});

export const mosfetPairShape = shape('a MOS stage', 'A complementary pair of MOS transistors; it inverts.', {
  nmos: row(mosfet, 'The transistor to ground.', 'nmos-logic-level', needed),
  pmos: row(mosfet, 'The transistor to the supply.', 'pmos-logic-level', needed),
  gate: row(
    quantity('ohm', notNegative),
    'Resistor between the clock and both gates: it bounds the peaks and slows the edges.',
    '22 ohm',
  ),
});

export const gatesShape = shape('a gate stage', 'Logic gates in parallel; they are taken as inverters.', {
  part: row([part('gates'), map(gatePartShape)], 'Key of the catalogue or of `parts`.', 'ac', needed),
  parallel: row(
    quantity('1', { above: 0, whole: true }),
    'How many gates work in parallel; one if left out.',
    '3',
  ),
});

export const driverShape = shape(
  'a driver',
  'A stage between a clock and a pump.',
  {
    input: row(name('clocks'), 'The clock that it follows.', 'tick', needed),
    rail: row(name('rails'), 'The rail that supplies it.', 'v5'),
    'push-pull': row(
      map(pushPullShape),
      pushPullShape.doc,
      '{ npn: npn-small-signal, pnp: pnp-small-signal, shared-base: 1 kohm }',
    ),
    follower: row(map(followerShape), followerShape.doc, '{ npn: npn-small-signal, pnp: pnp-small-signal }'),
    'mosfet-pair': row(
      map(mosfetPairShape),
      mosfetPairShape.doc,
      '{ nmos: nmos-logic-level, pmos: pmos-logic-level }',
    ),
    gates: row(map(gatesShape), gatesShape.doc, '{ part: ac, parallel: 3 }'),
    pins: row(
      list(row({ kind: 'pin' }, 'A pin of the stage.', 'mcu.GP15')),
      'Pins in parallel.',
      '[mcu.GP14, mcu.GP15]',
    ),
  },
  ['push-pull', 'follower', 'mosfet-pair', 'gates', 'pins'],
);
