/**
 * A board with a doubler behind a pair of MOSFETs on a pin of 25 ohm. `pair` is what stands in `mosfet-pair`; the
 * may put its marks; further rails go to the end.
 */
export function mosfetBoard(
  pair: string,
  { supply = '5 V', frequency = '100 kHz', edges = '', load = '0.1 mA' } = {},
): string {
  return `
supplies: { lab: { voltage: ${supply} } }
parts:
  chips:
    plain: { pins: { high-resistance: 25 ohm, low-resistance: 25 ohm, absolute: 40 mA } }
  diodes:
    bare: { kind: schottky, saturation: 20 nA, ideality: 1.03, resistance: 1 ohm }
chips: { mcu: { part: plain, rail: v5, draws: 1 mA } }
clocks:
  tick: { pin: mcu.P1, frequency: ${frequency}, duty: 50 %${edges} }
drivers:
  amp:
    { input: tick, rail: v5, mosfet-pair: {
      ${pair} } }
    # pair
rails:
  v5: { supply: lab }
  up:
    pump: { topology: doubler, input: v5, drive: amp, diode: bare, flying: { value: 1 uF, kind: film }, reservoir: { value: 10 uF, kind: film } }
    loads: { lamp: ${load} }
`;
}

/** Two MOSFETs of the same figures. */
export function ownPair(threshold: string, ohms: string, charge?: string): string {
  const one = (channel: 'n' | 'p') =>
    `{ channel: ${channel}, threshold: ${threshold}, on-resistance: ${ohms}${charge === undefined ? '' : `, gate-charge: ${charge}`} }`;
  return `nmos: ${one('n')}, pmos: ${one('p')}`;
}
