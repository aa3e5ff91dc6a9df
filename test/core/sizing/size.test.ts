import { describe, expect, it } from 'vitest';
import { analyse } from '../../../core/index';
import { changedBy, sizeOf } from '../../support/size-of';
import { rail } from '../../support/terminal';

/** A rail of which only needs and loads are known; one chip with free pins. */
const board = (needs: string, loads = '{ amplifier: 3 mA }', stock = '') => `# Keep me
supplies: { lab: { voltage: 4.8..5.2 V } }
chips: { mcu: { part: atmega328p, rail: v5, draws: 10 mA } }
${stock}rails:
  v5: { supply: lab }   # from the bench
  up:                   # wanted
    needs: ${needs}
    loads: ${loads}     # the amplifier
`;
const small = 'stock: { series: E3, frequencies: [100 kHz], diodes: [schottky-signal], stages: 2 }\n';

const serious = (text: string) =>
  analyse(text, { file: 'rails.yaml' }).findings.filter(({ severity }) => severity !== 'information');

describe('sizing from needs alone', () => {
  const text = board('{ voltage: 7.5..10.5 V, ripple: 20 mV }', undefined, small);
  const { result } = sizeOf(text, 'up');

  it('proposes boards that raise no warning and no error, the cheapest first', () => {
    expect(result.choices.length).toBeGreaterThan(1);
    expect(result.choices[0]!.best).toContain('fewest parts');
    const counts = result.choices.map(({ partCount }) => partCount);
    expect(Math.min(...counts)).toBe(counts[0]);
    for (const choice of result.choices) {
      const changed = changedBy(text, choice);
      expect(serious(changed.text).map(({ code, message }) => `${code}: ${message}`)).toEqual([]);
      const { voltage, ripple } = changed.analysis.report.rails['up']!;
      expect(voltage!.min).toBeGreaterThanOrEqual(7.5);
      expect(voltage!.max).toBeLessThanOrEqual(10.5);
      expect(ripple!.max).toBeLessThanOrEqual(0.02);
      // What is promised is what the board then shows.
      expect(choice.voltage.min).toBeCloseTo(voltage!.min, 9);
      expect(choice.ripple).toBeCloseTo(ripple!.max, 9);
    }
  });

  it('keeps comments, order and layout', () => {
    const { text: changed } = changedBy(text, result.choices[0]!);
    for (const piece of ['# Keep me', '# from the bench', '# wanted', '# the amplifier'])
      expect(changed).toContain(piece);
    const left = changed.split('\n').filter((line) => !/up-clock|^clocks:|^ +pump: /.test(line));
    expect(left).toEqual(text.split('\n'));
  });

  it('no flying capacitor is below what charge balance asks for', () => {
    // In the slow limit a stage drops I / (f C) (J. F. Dickson, IEEE JSSC SC-11(3), 1976; form from memory). The
    // weakest board has 4.8 V, so that 9.6 V less 7.5 V is the most that may be lost: C >= I / (f x 2.1 V).
    const least = 3e-3 / (100e3 * (2 * 4.8 - 7.5));
    for (const choice of result.choices) {
      const flying = /flying: \{ value: ([\d.]+) (n|u)F/.exec(changedBy(text, choice).text)!;
      const farads = Number(flying[1]) * (flying[2] === 'n' ? 1e-9 : 1e-6);
      expect(farads).toBeGreaterThan(least);
    }
  });

  it('a tighter need never gets a cheaper answer', () => {
    const cost = (volts: number, millivolts: number) => {
      const { result: found } = sizeOf(
        board(`{ voltage: ${volts}..10.5 V, ripple: ${millivolts} mV }`, undefined, small),
        'up',
      );
      const [first] = found.choices;
      return first
        ? [first.partCount, first.capacitance]
        : [Number.POSITIVE_INFINITY, Number.POSITIVE_INFINITY];
    };
    const steps = [cost(7, 40), cost(7.5, 40), cost(7.5, 10), cost(8.2, 10)];
    for (let k = 1; k < steps.length; k++) {
      const [before, now] = [steps[k - 1]!, steps[k]!];
      expect(now[0]! > before[0]! || (now[0] === before[0] && now[1]! >= before[1]! * (1 - 1e-9))).toBe(true);
    }
  });

  it('goes below ground, and takes stages where one does not reach', () => {
    const down = sizeOf(board('{ voltage: -5..-2.5 V }', undefined, small), 'up').result.choices[0]!;
    expect(down.title).toMatch(/^inverter, driven by/);
    expect(down.voltage.max).toBeLessThanOrEqual(-2.5);
    const high = sizeOf(board('{ voltage: 11..16 V }', undefined, small), 'up').result.choices[0]!;
    expect(high.title).toMatch(/of 2 stages on v5/);
    expect(high.voltage.min).toBeGreaterThanOrEqual(11);
  });

  it('uses what is in stock and nothing else', () => {
    const stock =
      'stock: { capacitors: [150 nF, 3.3 uF], kinds: [film], diodes: [silicon-switching], frequencies: [40 kHz] }\n';
    const { result: found } = sizeOf(board('{ voltage: 7..10.5 V }', '{ x: 1 mA }', stock), 'up');
    const { text: changed } = changedBy(
      board('{ voltage: 7..10.5 V }', '{ x: 1 mA }', stock),
      found.choices[0]!,
    );
    const pump = /pump: \{.*\}/.exec(changed)![0];
    expect(pump).toMatch(/diode: silicon-switching/);
    expect(
      [...pump.matchAll(/value: ([\d.]+ .F), kind: (\w+)/g)].map(([, value, kind]) => `${value} ${kind}`),
    ).toSatisfy((all: string[]) => all.every((each) => each === '150 nF film' || each === '3.3 uF film'));
    expect(changed).toContain('frequency: 40 kHz');
  });
});

describe('sizing a pump that misses its needs', () => {
  const text = board('{ voltage: 7.5..10.5 V, ripple: 20 mV }', undefined, small)
    .replace('rails:\n', 'clocks: { tick: { pin: mcu.PB1, frequency: 62.5 kHz, duty: 50 % } }\nrails:\n')
    .replace(
      '    needs',
      '    pump:\n      topology: doubler\n      input: v5\n      drive: tick\n      diode: schottky-signal\n      flying: { value: 10 nF, kind: x7r, esr: 20 mohm }  # too small\n      reservoir: 1 uF\n    needs',
    );
  it('changes the values first, and nothing else of the entry', () => {
    const { result } = sizeOf(text, 'up');
    const [first] = result.choices;
    expect(first!.title).toBe('doubler on v5, driven by tick, as now');
    const changed = changedBy(text, first!).text;
    expect(changed).toMatch(/flying: \{ value: \d+ nF, kind: x7r, esr: 20 mohm \} {2}# too small/);
    expect(changed.split('\n').length).toBe(text.split('\n').length);
  });
});

describe('when nothing works', () => {
  it('says how far the best is off and what would allow it', () => {
    const { result } = sizeOf(board('{ voltage: 9.7..10.5 V }', undefined, small), 'up');
    expect(result.choices).toEqual([]);
    expect(result.because.join(' ')).toMatch(/short with every capacitor in stock.*would (allow it|pass)/);
    const far = sizeOf(board('{ voltage: 40..50 V }', undefined, small), 'up').result;
    expect(far.because.join(' ')).toMatch(/reaches 40 V.*would allow it/);
  });
  it('refuses rails without needs, of other origins, and unknown ones', () => {
    const because = (text: string, name: string) => sizeOf(text, name).result.because.join(' ');
    expect(because(board('{ ripple: 10 mV }'), 'up')).toMatch(/no needs to size for/);
    expect(because(board('{ voltage: 8 V }'), 'v5')).toMatch(/comes from a supply/);
    expect(because(board('{ voltage: 8 V }'), 'upp')).toMatch(/no rail named upp/);
  });
});

describe('rail-ledger size', () => {
  const text = board('{ voltage: 7.5..10.5 V, ripple: 20 mV }', undefined, small);
  it('prints the ways, and writes the first one when told to', async () => {
    const shown = await rail('size up rails.yaml', { files: { 'rails.yaml': text } });
    expect(shown.code).toBe(0);
    expect(shown.out).toMatch(/^Ways to make up\n1\. doubler on v5/);
    expect(shown.written).toEqual({});
    const written = await rail('size up rails.yaml --write', { files: { 'rails.yaml': text } });
    expect(serious(written.written['rails.yaml']!)).toEqual([]);
  });
  it('knows wrong use', async () => {
    const files = { 'rails.yaml': text };
    expect((await rail('size', { files })).code).toBe(2);
    expect((await rail('size nothing rails.yaml', { files })).err).toContain(
      'There is no rail nothing; there are v5, up.',
    );
    expect((await rail('size up rails.yaml --write=yes', { files })).err).toContain('takes no value');
  });
});
