/**
 * The lower half of a board for tests: a 5 V supply without tolerance and a chip whose pins have round figures, so
 * that a reader can follow the numbers by hand. A test adds its rails beneath.
 */

/** Pin P1 (and any other): 20 ohm to both sides, 20 mA recommended, 40 mA absolute. Clock `tick`: 100 kHz, half duty. */
export const bench = `
supplies:
  lab: { voltage: 5 V, current: 1 A }
parts:
  chips:
    plain:
      pins: { high-resistance: 20 ohm, low-resistance: 20 ohm, recommended: 20 mA, absolute: 40 mA }
chips:
  mcu: { part: plain, rail: v5, draws: 1 mA }
clocks:
  tick: { pin: mcu.P1, frequency: 100 kHz, duty: 50 % }
rails:
  v5: { supply: lab }
`;
