import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { analyse, yieldRun } from '../../../core/index';
import { expectShare, railOf, yieldOf } from '../../support/yield-of';

const demo = readFileSync(new URL('../../../media/demo/rails.yaml', import.meta.url), 'utf8');

describe('supplies and regulators, against shares worked out by hand', () => {
  const samples = 4000;

  it('a supply that gives way by a resistance of 1..3 ohm', () => {
    // 5 V - 0.1 A R, R even in 1..3 ohm, needs 4.75 V: R below 2.5 ohm, three quarters.
    const result = yieldOf(
      `supplies: { lab: { voltage: 5 V, resistance: 1..2..3 ohm } }
rails: { v5: { supply: lab, needs: { voltage: 4.75..5.05 V }, loads: { x: 100 mA } } }`,
      { samples },
    );
    expectShare(result.outcome!.met, samples, 0.75);
    const v5 = railOf(result, 'v5');
    expect(v5.misses).toEqual({ low: samples - result.outcome!.met, high: 0, ripple: null });
    expect(v5.outcome!.interval.low).toBeLessThan(v5.outcome!.yield);
    expect(v5.outcome!.interval.high).toBeGreaterThan(v5.outcome!.yield);
    expect(v5.weakest!.value).toBeGreaterThan(4.7);
    expect(v5.strongest!.value).toBeLessThan(4.9);
    expect(v5.leading.map(({ label, path }) => `${label} at ${path}`)).toEqual([
      'supply lab resistance at supplies.lab',
    ]);
    expect(v5.leading[0]!.correlation).toBeCloseTo(-1, 9);
  });

  it('a supply that a signal of 3.75 V with 1 V of headroom stands on', () => {
    // The same edge of 4.75 V, asked for by an amplifier: three quarters.
    const result = yieldOf(
      `supplies: { lab: { voltage: 5 V, resistance: 1..2..3 ohm } }
rails: { v5: { supply: lab, needs: { swing: 3.75 V, headroom: 1 V }, loads: { x: 100 mA } } }`,
      { samples },
    );
    expectShare(result.outcome!.met, samples, 0.75);
    expect(railOf(result, 'v5').misses).toEqual({
      low: samples - result.outcome!.met,
      high: null,
      ripple: null,
    });
    expect(result.notJudged).toEqual([]);
  });

  it('a supply and a filter that give way to a load with a band', () => {
    // Behind 1 ohm, 5 V on 100..300 mA is even in 4.7..4.9 V: above 4.75 V three quarters, above 4.8 V half. Behind
    // 5 ohm more and 10 mA of its own, the filter loses another 50 mV.
    const board = `supplies: { lab: { voltage: 5 V, resistance: 1 ohm } }
rails:
  v5: { supply: lab, needs: { voltage: 4.75 V }, loads: { x: 90..190..290 mA } }
  quiet: { filter: { from: v5, resistor: 5 ohm, capacitor: 10 uF }, needs: { voltage: 4.75 V }, loads: { y: 10 mA } }`;
    const result = yieldOf(board, { samples });
    expectShare(railOf(result, 'v5').outcome!.met, samples, 3 / 4);
    expectShare(railOf(result, 'quiet').outcome!.met, samples, 1 / 2);
    expect(result.outcome!.met).toBe(railOf(result, 'quiet').outcome!.met);
    expect(railOf(result, 'quiet').leading.map(({ label }) => label)).toEqual(['current out of v5']);
  });

  it('a regulator that runs short of input', () => {
    // Holds 5 V where the input, even in 5.2..5.8 V, is more than the dropout, even in 0.3..0.5 V, above: 2/3.
    const result = yieldOf(
      `supplies: { lab: { voltage: 5.2..5.5..5.8 V } }
rails:
  vin: { supply: lab }
  v5: { regulator: { from: vin, output: 5 V, dropout: 0.3..0.4..0.5 V }, needs: { voltage: 5..5.1 V } }`,
      { samples },
    );
    expectShare(result.outcome!.met, samples, 2 / 3);
    expect(railOf(result, 'v5').weakest!.value).toBeGreaterThan(5.2 - 0.5);
    expect(railOf(result, 'v5').strongest!.value).toBe(5);
  });

  it('even or likeliest at typical', () => {
    // Of 4.5..5..5.5 V at least 4.75 V: 3/4 of an even distribution, 1 - 0.25^2 / (1 * 0.5) = 7/8 of a triangular one.
    const board = `supplies: { lab: { voltage: 4.5..5..5.5 V } }
rails: { v5: { supply: lab, needs: { voltage: 4.75 V } } }`;
    expectShare(yieldOf(board, { samples }).outcome!.met, samples, 3 / 4);
    expectShare(yieldOf(board, { samples, distribution: 'triangular' }).outcome!.met, samples, 7 / 8);
  });

  it('counts a board only when all its rails are met at once', () => {
    // Each rail by itself is met by half. Two supplies: a quarter; one supply: still half, they move together.
    const board = (second: string) => `supplies: { a: { voltage: 4..5..6 V }, b: { voltage: 4..5..6 V } }
rails:
  one: { supply: a, needs: { voltage: 5..7 V } }
  two: { supply: ${second}, needs: { voltage: 5..7 V } }`;
    const apart = yieldOf(board('b'), { samples });
    expectShare(railOf(apart, 'one').outcome!.met, samples, 1 / 2);
    expectShare(apart.outcome!.met, samples, 1 / 4);
    const together = yieldOf(board('a'), { samples });
    expectShare(together.outcome!.met, samples, 1 / 2);
    expect(together.quantities).toBe(1);
  });

  it('says what so many samples are worth', () => {
    const { confidence } = yieldOf(
      'supplies: { a: { voltage: 5 V } }\nrails: { x: { supply: a, needs: { voltage: 4 V } } }',
      {
        samples: 93,
      },
    );
    // Wilks 1941: 93 samples hold 95 % of all boards between their ends with 95 % confidence; 3/N for no failure.
    expect(confidence.twoSided).toBeCloseTo(0.95, 3);
    expect(confidence.mayFail! * 93).toBeGreaterThan(2.9);
    expect(confidence.mayFail! * 93).toBeLessThan(3);
  });
});

describe('a run', () => {
  it('with the same seed is the same, and with another one differs within the standard error', () => {
    const board = demo.replace('voltage: -5.3..-3 V', 'voltage: -5.3..-3.45 V');
    const samples = 400;
    const [one, again, other] = [1, 1, 2].map((seed) => yieldOf(board, { samples, seed }));
    expect(again).toEqual(one);
    const [a, b] = [one!, other!].map((result) => railOf(result, 'vneg'));
    expect(a!.modes).not.toEqual(b!.modes);
    const p = a!.outcome!.yield;
    expect(p).toBeGreaterThan(0.1);
    expect(p).toBeLessThan(0.9);
    expect(Math.abs(b!.outcome!.yield - p)).toBeLessThan(4 * Math.sqrt((2 * p * (1 - p)) / samples));
  });

  it('draws the same parts for a rail whatever is added elsewhere', () => {
    const before = yieldOf(demo, { samples: 20 });
    const after = yieldOf(
      demo
        .replace('rails:\n', 'rails:\n  extra: { supply: bench, needs: { voltage: 3 V } }\n')
        .replace('supplies:\n', 'supplies:\n  bench: { voltage: 3..4..5 V }\n'),
      { samples: 20 },
    );
    expect(after.rails.map(({ rail }) => rail)).toContain('extra');
    expect(railOf(after, 'vamp')).toEqual(railOf(before, 'vamp'));
  });

  it('takes a step for each sample and stops when told to', () => {
    const run = yieldRun(analyse(demo, { file: 'rails.yaml' }), { samples: 1_000_000, seed: 1 });
    const steps = [run.next(), run.next(), run.next()].map(({ value }) => value);
    expect(steps).toEqual([0, 1, 2].map((done) => ({ done, samples: 1_000_000 })));
    run.return(undefined as never);
    expect(run.next()).toEqual({ done: true, value: undefined });
  });

  it('takes odd numbers of samples and odd seeds for what they come nearest to', () => {
    const board =
      'supplies: { a: { voltage: 4..6 V } }\nrails: { x: { supply: a, needs: { voltage: 5 V } } }';
    expect(yieldOf(board, { samples: 0 }).samples).toBe(1);
    expect(yieldOf(board, { samples: 2.7 }).samples).toBe(2);
    expect(yieldOf(board, { samples: Number.NaN }).samples).toBe(1000);
    expect(yieldOf(board, { samples: 5, seed: Number.NaN })).toEqual(yieldOf(board, { samples: 5, seed: 1 }));
    expect(yieldOf(board, { samples: 1 }).confidence.twoSided).toBeNull();
  });
});

describe('boards with little to say', () => {
  it('nothing to draw: every sample is the typical board', () => {
    const result = yieldOf(
      'supplies: { a: { voltage: 5 V } }\nrails: { x: { supply: a, needs: { voltage: 4..6 V } }, y: { supply: a, needs: { voltage: 6 V } } }',
      { samples: 50 },
    );
    expect(result.quantities).toBe(0);
    expect(result.rails.map(({ outcome }) => outcome!.met)).toEqual([50, 0]);
    expect(railOf(result, 'x').modes[0]!.voltage).toMatchObject({
      count: 50,
      mean: 5,
      deviation: 0,
      min: 5,
      max: 5,
    });
    expect(railOf(result, 'x').modes[0]!.ripple).toBeNull();
    expect(result.outcome).toMatchObject({ met: 0, missed: 50, unsolved: 0 });
    expect(result.confidence.mayFail).toBeNull();
  });

  it('no needs, no rails, no text', () => {
    for (const text of ['supplies: { a: { voltage: 5 V } }\nrails: { x: { supply: a } }', 'board: x', '']) {
      const result = yieldOf(text);
      expect([result.outcome, result.rails]).toEqual([null, []]);
    }
  });

  it('names needs that a run does not judge', () => {
    const { notJudged } = yieldOf(
      'supplies: { a: { voltage: 5 V } }\nrails: { x: { supply: a, needs: { voltage: 4 V, ripple: 1 mV, start: 1 ms } } }',
    );
    expect(notJudged).toEqual([
      { rail: 'x', need: 'ripple' },
      { rail: 'x', need: 'start' },
    ]);
  });

  it('a pump that cannot be computed has no yield, and the board none either', () => {
    const result = yieldOf(demo.replace('drive: horn', 'drive: horm'), { samples: 10 });
    expect(result.outcome).toBeNull();
    const horn = railOf(result, 'vhorn');
    expect(horn.outcome).toBeNull();
    expect(horn.because).toMatch(/horm/);
    expect(railOf(result, 'vamp').outcome!.met).toBe(10);
  });

  it('half a file never throws', () => {
    for (let end = 0; end < demo.length; end += 97) {
      const { outcome } = yieldOf(demo.slice(0, end), { samples: 2 });
      if (outcome) expect(outcome.met + outcome.missed + outcome.unsolved).toBe(2);
    }
  });
});
