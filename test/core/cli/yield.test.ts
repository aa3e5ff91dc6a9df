import { describe, expect, it } from 'vitest';
import { rail } from '../../support/terminal';

const board = (needs: string) =>
  `board: Lamp\nsupplies: { lab: { voltage: 4..5..6 V } }\nrails: { v5: { supply: lab, needs: { voltage: ${needs} } } }\n`;
const files = {
  safe: board('3..7 V'),
  tight: board('5..7 V'),
  '/home/board/rails.yaml': '',
  'rails.yaml': board('3..7 V'),
};

describe('rail-ledger yield', () => {
  it('is 0 when all samples met all needs, with 1000 samples of seed 1 from the nearest board', async () => {
    const { code, out, err } = await rail('yield', { files });
    expect([code, err]).toEqual([0, '']);
    expect(out).toMatch(/^Yield of Lamp {2}rails\.yaml\n1000 samples, seed 1; 1 quantity drawn, uniform /);
    expect(out).toContain(
      '100 % of the boards meet every need (1000 of 1000; 95 % confidence: 99.6..100 %).',
    );
  });

  it('is 1 when a sample missed a need, and when a rail with needs is not computed', async () => {
    expect((await rail('yield tight --samples 50', { files })).code).toBe(1);
    const lost = `${board('3..7 V')}  `.replace('v5: {', 'v9: { needs: { voltage: 9 V } }, v5: {');
    const { code, out } = await rail('yield a --samples 5', { files: { a: lost } });
    expect(code).toBe(1);
    expect(out).toContain('No yield of the board: v9 could not be computed.');
    expect(out).toContain('v9 is not computed: v9 has no origin');
  });

  it('is 1 for a file with errors, which it points to, and 0 where nothing is asked for', async () => {
    const broken = files.safe.replace('board: Lamp', 'board: [');
    const { code, err } = await rail('yield a', { files: { a: broken } });
    expect(code).toBe(1);
    expect(err).toMatch(/^rail-ledger: a has .*error.* that rail-ledger check shows; the yield is/);
    const { code: none, out } = await rail('yield a', {
      files: { a: 'supplies: { lab: { voltage: 5 V } }\n' },
    });
    expect(none).toBe(0);
    expect(out).toContain('there is nothing to judge');
  });

  it('is 2 with a sentence on standard error for wrong use and for files that cannot be read', async () => {
    for (const [args, says] of [
      ['yield safe tight', 'yield takes one file, not 2.'],
      ['yield safe --samples 0', '--samples is a whole number from 1 to 1000000, not 0.'],
      ['yield safe --samples=many', 'not many.'],
      ['yield safe --seed -1', '--seed is a whole number'],
      ['yield safe --seed', '--seed needs a value.'],
      ['yield safe --distribution normal', '--distribution is uniform or triangular, not normal.'],
      ['check safe --samples 5', 'check has no option --samples.'],
      ['yield gone', 'gone cannot be read: there is no such file.'],
    ] as const) {
      const { code, out, err } = await rail(args, { files });
      expect([code, out], args).toEqual([2, '']);
      expect(err).toContain(says);
    }
    expect((await rail('yield')).err).toMatch(/There is no rails\.yaml in this folder or above it/);
  });

  it('takes number, seed and distribution, and standard input', async () => {
    const asked =
      'yield - --samples 40 --seed=7 --distribution triangular --format json --stdin-filename b.rails.yaml';
    const { code, out } = await rail(asked, { input: files.tight });
    expect(code).toBe(1);
    const result = JSON.parse(out);
    expect(result).toMatchObject({
      format: 1,
      file: 'b.rails.yaml',
      board: 'Lamp',
      samples: 40,
      seed: 7,
      distribution: 'triangular',
      quantities: 1,
    });
    expect(result.rails[0].outcome.met + result.rails[0].outcome.missed).toBe(40);
    expect(JSON.parse((await rail(asked.replace('=7', '=8'), { input: files.tight })).out).rails).not.toEqual(
      result.rails,
    );
  });

  it('shows progress on standard error of a terminal only, and takes it away again', async () => {
    const { out, err } = await rail('yield safe --samples 200', { files, errorIsTerminal: true });
    // Over itself at each percent; at the end the line is erased.
    const [begin, ...steps] = err.split('\r');
    expect(begin).toBe('');
    expect(steps.pop()).toBe('\u001b[K');
    expect(steps).toEqual(
      Array.from({ length: 101 }, (_, percent) => `${2 * percent} of 200 samples (${percent} %)`),
    );
    expect(out).not.toContain('\r');
    expect((await rail('yield safe --samples 200', { files, isTerminal: true })).err).toBe('');
  });
});
