/**
 * Life of batteries from text to report: charge balance by hand, closed forms, and the same boards computed directly at
 * many points of the discharge.
 */
import { describe, expect, it } from 'vitest';
import type { BatteryLife } from '../../../core/analysis/battery';
import { isGap } from '../../../core/analysis/gap';
import { analyse, newMemory } from '../../../core/index';
import { expectNear } from '../../support/near';

const hour = 3600;
const file = 'rails.yaml';

function lifeOf(text: string, supply = 'b'): BatteryLife {
  const found = analyse(text, { file }).board.supplies.get(supply)?.life?.();
  if (!found || isGap(found)) throw new Error(found?.because ?? 'no life');
  return found;
}

const logger = `
rails:
  vb: { supply: b, loads: { radio: { current: 10 mA, in: [send] }, clock: { current: 5 uA, in: [wait] } } }
modes: { send: { share: 1 % }, wait: { share: 99 % } }
`;

describe('life of a battery', () => {
  it('is the charge over the current where its voltage does not move: 1782 h', () => {
    // 0.85 of 220 mAh, 104.95 uA on average: charge balance by hand.
    const { report } = analyse(`supplies: { b: { voltage: 3 V, capacity: 187 mAh } }\n${logger}`, { file });
    expectNear(report.supplies['b']!.life! / hour, 1782, 5e-4);
  });

  it('counts 85 % of a coin cell and loses 1 % of its label a year', () => {
    // F = k Q / (I + Isd): Isd = 220 mAh / 100 / 8760 h = 0.2511 uA.
    const text = `supplies: { b: { battery: lithium-coin, capacity: 220 mAh, resistance: 0 ohm } }\n${logger}`;
    const { typical, least } = lifeOf(text);
    expectNear(typical.seconds / hour, (0.85 * 220e-3) / (104.95e-6 + 0.2511e-6), 1e-5);
    expect(typical.ended).toBeUndefined();
    // At worst 70 % of it and 1.5 % a year.
    expectNear(least!.seconds / hour, (0.7 * 220e-3) / (104.95e-6 + 0.3767e-6), 1e-4);
  });

  it('at constant power follows the closed form for a voltage that falls in a straight line', () => {
    const text = `
supplies: { b: { voltage: 3..4.2 V, capacity: 1 Ah, resistance: 0.5 ohm } }
rails: { vb: { supply: b, loads: { lamp: 1.5 W } } }
`;
    // Antiderivative of sqrt(x^2 - a^2): (x sqrt(x^2 - a^2) - a^2 arcosh(x/a)) / 2 (any table of integrals).
    const a = Math.sqrt(4 * 0.5 * 1.5);
    const whole = (x: number) => x ** 2 / 2 + (x * Math.sqrt(x * x - a * a) - a * a * Math.acosh(x / a)) / 2;
    const byHand = (hour * (whole(4.2) - whole(3.25))) / 1.2 / 3;
    const { typical, samples } = lifeOf(text);
    expectNear(typical.seconds, byHand, 1e-4);
    expectNear(typical.left, 0.25 / 1.2, 1e-6);
    expect(samples).toHaveLength(3);
  });

  it('into a resistor follows the logarithm of the voltages', () => {
    const text = `
supplies: { b: { voltage: -9..-6 V, capacity: 1 Ah } }
rails: { vm: { supply: b, loads: { r: 1 kohm } } }
`;
    expectNear(lifeOf(text).typical.seconds, (hour * 1000 * Math.log(9 / 6)) / 3, 1e-5);
  });

  it('takes cells in series as one battery of the same charge', () => {
    const cells = (n: number) => `
supplies: { b: { battery: alkaline, cells: ${n}, capacity: 2500 mAh } }
rails: { vb: { supply: b, loads: { lamp: 10 mA } } }
`;
    expectNear(lifeOf(cells(3)).typical.seconds, lifeOf(cells(1)).typical.seconds, 1e-9);
    expectNear(lifeOf(cells(3)).store.end!, 2.7, 1e-12);
  });

  it('says which mode ends it, also one that hardly ever runs', () => {
    const text = (share: string, rest: string) => `
supplies: { b: { battery: lithium-coin, capacity: 220 mAh } }
rails:
  vb: { supply: b, loads: { radio: { current: 25 mA, in: [send] }, clock: 5 uA } }
modes: { send: { share: ${share} }, wait: { share: ${rest} } }
`;
    const { typical } = lifeOf(text('0.1 %', '99.9 %'));
    expect(typical.ended?.mode).toBe('send');
    // At the end voltage and the resistance of that charge Ohm's law holds: E = 2 V + 25 mA R.
    const { store } = lifeOf(text('0 %', '100 %'));
    expectNear(store.open(typical.left), 2 + 25.005e-3 * store.resistance(typical.left, 'typical'), 1e-6);
    expectNear(lifeOf(text('0 %', '100 %')).typical.left, typical.left, 1e-9);
    expectNear(lifeOf(text('0 %', '100 %')).typical.current, 5e-6, 1e-9);
  });

  it('names what draws most, behind regulators and pumps', () => {
    const text = `
supplies: { b: { battery: li-ion, capacity: 1 Ah } }
rails:
  vb: { supply: b, loads: { led: 2 mA } }
  v3:
    regulator: { from: vb, output: 3.3 V, dropout: 200 mV, ground: 10 uA }
    loads: { sensor: 4 mA, radio: { current: 80 mA, in: [send] } }
modes: { send: { share: 20 % }, wait: { share: 80 % } }
`;
    expect(lifeOf(text).consumer).toMatchObject({ name: 'radio', rail: 'v3', amps: 80e-3 });
    expect(lifeOf(text).typical.top).toMatchObject({ mode: 'send', time: 0.2 });
  });
});

describe('without a load', () => {
  it('a battery lasts as long as its self-discharge lets it', () => {
    const text = 'supplies: { b: { battery: alkaline } }\nrails: { vb: { supply: b } }\n';
    // 0.8 of the nameplate at 2.5 % a year: 32 years.
    expectNear(lifeOf(text).typical.seconds, 32 * 8760 * hour, 1e-9);
    expect(lifeOf(text).consumer).toBeUndefined();
  });

  it('a plain voltage has no life, and the report says why', () => {
    const text = 'supplies: { b: { voltage: 3..4 V, capacity: 1 Ah } }\nrails: { vb: { supply: b } }\n';
    const { report, findings } = analyse(text, { file });
    expect(report.supplies['b']?.life).toBeNull();
    expect(findings.map(({ message }) => message)).toContainEqual(
      expect.stringMatching(/^The life of b is not computed: nothing draws from b/),
    );
  });
});

describe('figures that the file leaves out', () => {
  it('are taken from the catalogue, and the report says so', () => {
    const text = 'supplies: { b: { battery: nimh } }\nrails: { vb: { supply: b, loads: { x: 10 mA } } }\n';
    const said = analyse(text, { file }).findings.filter(({ code }) => code === 'assumed');
    expect(said.map(({ message }) => message)).toEqual([
      expect.stringMatching(/capacity is not given; 2000 mAh is taken from the catalogue/),
      expect.stringMatching(/resistance is not given; 30 mohm/),
    ]);
  });
});

/**
 * The whole board again, with the battery's own voltage and resistance, in the middle of each tenth of the charge and
 * at the reported end: charge balance there, without the interpolation and with the battery's resistance in the pump's
 * own circuit.
 */
function direct(rest: string, { store, typical }: BatteryLife) {
  const memory = newMemory();
  const at = (left: number) => {
    const supply = `voltage: ${store.open(left)} V, resistance: ${store.resistance(left, 'typical')} ohm`;
    const { supplies, rails } = analyse(`supplies: { b: { ${supply} } }\n${rest}`, { file, memory }).board;
    const rail = rails.get('vb')!;
    const modes = [...rail.modes.values()].map(({ voltage }) => voltage!);
    return {
      amps: supplies.get('b')!.current!.typical,
      volts: Math.min(...(modes.length > 0 ? modes : [rail.voltage!.typical])),
    };
  };
  let seconds = 0;
  for (let upper = 1; upper > typical.left + 1e-9; ) {
    const lower = Math.max(typical.left, Math.ceil(upper * 10 - 1e-6 - 1) / 10);
    const drain = at((upper + lower) / 2).amps + typical.selfCurrent;
    seconds += (typical.capacity * typical.usable * (upper - lower)) / drain;
    upper = lower;
  }
  return { seconds, volts: at(typical.left).volts };
}

const parts =
  'diode: schottky-signal, flying: { value: 1 uF, kind: x7r, rated: 16 V }, reservoir: { value: 10 uF, kind: x7r, rated: 16 V }';
const plain = `
parts: { chips: { plain: { pins: { high-resistance: 20 ohm, low-resistance: 20 ohm, absolute: 40 mA } } } }
chips: { mcu: { part: plain, rail: vb, draws: 3 mA } }
clocks: { tick: { pin: mcu.P1, frequency: 100 kHz, duty: 50 % } }
`;

describe('three voltages are enough', () => {
  it.each([
    [
      'a pump on a coin cell',
      'battery: lithium-coin, capacity: 220 mAh',
      `
parts: { chips: { plain: { pins: { high-resistance: 60 ohm, low-resistance: 60 ohm, absolute: 40 mA } } } }
chips: { mcu: { part: plain, rail: vb, draws: { run: 2 mA, sleep: 2 uA } } }
clocks: { tick: { pin: mcu.P1, frequency: 50 kHz, duty: 50 % } }
rails:
  vb: { supply: b }
  up:
    pump: { topology: doubler, input: vb, drive: tick, ${parts} }
    loads: { lamp: { current: 1 mA, in: [run] }, divider: 100 kohm }
modes: { run: { share: 5 % }, sleep: { share: 95 % } }
`,
      3,
    ],
    [
      'two linear regulators that fall out of regulation on the way',
      'battery: li-ion, capacity: 1 Ah, resistance: 150 mohm',
      `
rails:
  vb: { supply: b }
  v3:
    regulator: { from: vb, output: 3.3 V, dropout: 300 mV, ground: 50 uA }
    loads: { heater: 100 ohm, radio: { current: 200 mA, in: [run] } }
  v35: { regulator: { from: vb, output: 3.5 V, dropout: 300 mV, ground: 50 uA }, loads: { heater: 100 ohm } }
modes: { run: { share: 5 % }, sleep: { share: 95 % } }
`,
      7,
    ],
    [
      'a switching regulator',
      'battery: alkaline, cells: 2, capacity: 2500 mAh',
      `
rails:
  vb: { supply: b }
  v5:
    regulator: { from: vb, kind: switching, output: 5 V, efficiency: 85 %, ground: 20 uA }
    loads: { meter: 50 mA, motor: { current: 150 mA, in: [run] } }
modes: { run: { share: 20 % }, sleep: { share: 80 % } }
`,
      3,
    ],
    [
      'a regulator behind a pump that falls out of regulation',
      'battery: li-ion, capacity: 500 mAh, resistance: 200 mohm',
      `${plain}
rails:
  vb: { supply: b }
  up: { pump: { topology: doubler, input: vb, drive: tick, ${parts} } }
  v6: { regulator: { from: up, output: 6 V, dropout: 200 mV, ground: 50 uA }, loads: { bridge: 1.5 kohm } }
`,
      6,
    ],
  ])(
    'for %s',
    (_, supply, rest, solutions) => {
      const life = lifeOf(`supplies: { b: { ${supply} } }\n${rest}`);
      const { seconds, volts } = direct(rest, life);
      expectNear(life.typical.seconds, seconds, 1e-3);
      // The end, too, is where the board puts it: at the end voltage, or at the last of the charge.
      if (life.typical.ended) expectNear(volts, life.store.end!, 2e-3);
      else expect(volts).toBeGreaterThanOrEqual(life.store.end! * (1 - 5e-3));
      expect(life.samples.length).toBeLessThanOrEqual(solutions);
    },
    60_000,
  );
});
