import { describe, expect, it } from 'vitest';
import { type Machine, rail } from '../../support/terminal';

const clean =
  'supplies: { lab: { voltage: 5 V, current: 1 A } }\nrails: { v5: { supply: lab, loads: { x: 1 mA } } }\n';
const faulty = clean.replace('1 mA', '2 A');

describe('exit codes and streams', () => {
  it('is 0 and silent on standard error for a board without errors', async () => {
    const { code, out, err } = await rail('check a.rails.yaml', { files: { 'a.rails.yaml': clean } });
    expect([code, err]).toEqual([0, '']);
    expect(out).toContain('No findings.');
  });

  it('is 1 for findings of severity error, which stand on standard output', async () => {
    const { code, out, err } = await rail('check a.rails.yaml', { files: { 'a.rails.yaml': faulty } });
    expect([code, err]).toEqual([1, '']);
    expect(out).toMatch(/^a\.rails\.yaml:1:43 error supply-over-limit /m);
  });

  it('is 2 with a sentence on standard error for wrong use', async () => {
    for (const args of [
      '',
      'chekc',
      'check --colour',
      'check --format',
      'check --format xml',
      'check --color=blue a',
    ]) {
      const { code, out, err } = await rail(args);
      expect([code, out], args).toEqual([2, '']);
      expect(err).toMatch(/^rail-ledger: .*\nTry rail-ledger --help\.\n$/);
    }
  });

  it('is 2 for a file that cannot be read, after reporting the others', async () => {
    const { code, out, err } = await rail('check gone.yaml a.yaml', { files: { 'a.yaml': clean } });
    expect(code).toBe(2);
    expect(err).toBe('rail-ledger: gone.yaml cannot be read: there is no such file.\n');
    expect(out).toContain('a.yaml');
  });

  it('refuses bytes that are no UTF-8', async () => {
    const { code, err } = await rail('check a.yaml', {
      files: { 'a.yaml': new Uint8Array([0x62, 0xff, 0xfe]) },
    });
    expect(code).toBe(2);
    expect(err).toContain('it is not UTF-8 text');
  });

  it('answers help and version on standard output', async () => {
    expect((await rail('--help')).out).toContain('rail-ledger check [FILE...]');
    expect((await rail('check --help')).code).toBe(0);
    expect(await rail('--version')).toMatchObject({
      code: 0,
      out: expect.stringMatching(/^Rail Ledger \d+\.\d+\.\d+\n$/),
      err: '',
    });
  });
});

describe('files', () => {
  it('looks for rails.yaml upward from the working folder', async () => {
    const files = { '/home/rails.yaml': faulty, 'rails.yaml': 'not this one', '../rails.yaml': faulty };
    const { code, out } = await rail('check', { files, cwd: '/home/board' });
    expect(code).toBe(1);
    expect(out).toContain('../rails.yaml:1:43 error');
  });

  it('says so when there is none', async () => {
    const { code, err } = await rail('check');
    expect(code).toBe(2);
    expect(err).toMatch(/There is no rails\.yaml in this folder or above it/);
  });

  it('reads standard input, under the name it is given', async () => {
    const { code, out } = await rail('check - --stdin-filename bench.rails.yaml', { input: faulty });
    expect(code).toBe(1);
    expect(out).toContain('bench.rails.yaml:1:43 error');
  });

  it('counts columns without the byte-order mark', async () => {
    const { out } = await rail('check a.yaml', { files: { 'a.yaml': `\ufeff${faulty}` } });
    expect(out).toContain('a.yaml:1:43 error');
  });

  it('takes names that look like options behind --', async () => {
    const { code } = await rail('check -- --odd.yaml', { files: { '--odd.yaml': clean } });
    expect(code).toBe(0);
  });
});

describe('json', () => {
  it('is one object for one file and a list for several', async () => {
    const files = { a: clean, b: faulty };
    const one = JSON.parse((await rail('check a --format json', { files })).out);
    expect(one).toMatchObject({ format: 1, file: 'a', rails: { v5: { voltage: { typical: 5 } } } });
    const two = await rail('check --format=json a b', { files });
    expect(two.code).toBe(1);
    expect(JSON.parse(two.out).map(({ file }: { file: string }) => file)).toEqual(['a', 'b']);
  });

  it('has no colour, whatever is asked', async () => {
    const { out } = await rail('check a --format json --color always', { files: { a: faulty } });
    expect(out).not.toContain('\u001b');
  });
});

// Outside source: no-color.org and force-color.org for the two variables, the option before both.
describe('colour', () => {
  const files = { a: faulty };
  const coloured = async (args: string, machine: Machine) =>
    (await rail(`check a ${args}`, { files, ...machine })).out.includes('\u001b[');

  it('follows the terminal', async () => {
    expect(await coloured('', { isTerminal: true, env: { TERM: 'xterm' } })).toBe(true);
    expect(await coloured('', { isTerminal: false, env: { TERM: 'xterm' } })).toBe(false);
    expect(await coloured('', { isTerminal: true, env: { TERM: 'dumb' } })).toBe(false);
  });

  it('obeys NO_COLOR unless it is empty, and FORCE_COLOR', async () => {
    expect(await coloured('', { isTerminal: true, env: { NO_COLOR: '1' } })).toBe(false);
    expect(await coloured('', { isTerminal: true, env: { NO_COLOR: '' } })).toBe(true);
    expect(await coloured('', { isTerminal: false, env: { FORCE_COLOR: '1' } })).toBe(true);
    expect(await coloured('', { isTerminal: true, env: { FORCE_COLOR: '0' } })).toBe(false);
    expect(await coloured('', { isTerminal: true, env: { NO_COLOR: '1', FORCE_COLOR: '1' } })).toBe(false);
  });

  it('lets the option win', async () => {
    expect(await coloured('--color always', { env: { NO_COLOR: '1' } })).toBe(true);
    expect(await coloured('--color=never', { isTerminal: true, env: { FORCE_COLOR: '1' } })).toBe(false);
  });
});
