/**
 * A board with a doubler behind a push-pull stage: `base` is how the bases are driven, `clock` is `a` (a pin that
 * reaches the rail, 50 kHz) or `slow` (a bipolar astable timer, 190 Hz). Lines `# name` and `# marks` stand where a
 * test may put its marks under the driver's name and its bases.
 */
export function pushPullBoard(base: string, clock: 'a' | 'slow'): string {
  const farads = clock === 'a' ? '1 uF' : '100 uF';
  return `
supplies: { lab: { voltage: 5 V } }
parts:
  chips:
    plain: { pins: { high-resistance: 20 ohm, low-resistance: 20 ohm } }
chips: { mcu: { part: plain, rail: v5, draws: 1 mA } }
clocks:
  a: { pin: mcu.P1, frequency: 50 kHz, duty: 50 % }
  slow: { rail: v5, astable: { charge: 10 kohm, discharge: 33 kohm, timing: 100 nF, part: bipolar-astable } }
drivers:
  amp: { input: ${clock.padEnd(4)}, rail: v5,
  # name
    push-pull: { npn: npn-small-signal, pnp: pnp-small-signal,                         ${base} } }
    # marks
rails:
  v5: { supply: lab }
  up:
    pump: { topology: doubler, input: v5, drive: amp, diode: silicon-switching, flying: { value: ${farads}, kind: film }, reservoir: { value: ${farads}, kind: film } }
    loads: { lamp: 1 mA }
`;
}
