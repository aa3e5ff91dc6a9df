import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { analyse, type IncludeProblem, readIncludes } from '../../../core/index';
import { rail } from '../../support/terminal';

const board = (includes: string, rest = '') => `include: ${includes}
${rest}supplies: { lab: { voltage: 5 V } }
parts: { chips: { plain: { pins: { high-resistance: 20 ohm, low-resistance: 20 ohm } } } }
chips: { mcu: { part: plain, rail: v5 } }
clocks: { tick: { pin: mcu.P1, frequency: 100 kHz, duty: 50 % } }
rails:
  v5: { supply: lab }
  up:
    pump: { topology: doubler, input: v5, drive: tick, diode: ours, flying: { value: 1 uF, kind: film }, reservoir: { value: 10 uF, kind: film } }
    loads: { x: 2 mA }
`;
const diode = (ohms: string) =>
  `parts: { diodes: { ours: { kind: schottky, saturation: 20 nA, ideality: 1.03, resistance: ${ohms} } } }\n`;

function read(text: string, files: Readonly<Record<string, string | IncludeProblem>> = {}) {
  return analyse(text, { file: 'rails.yaml', include: (path) => files[path] });
}
const failed = (analysis: ReturnType<typeof analyse>) =>
  analysis.findings.filter(({ code }) => code === 'include-failed');
const volts = (analysis: ReturnType<typeof analyse>) => analysis.report.rails['up']?.voltage?.typical;

describe('included parts', () => {
  it('are parts of the board, and are not called unused', () => {
    const analysis = read(board('[shared/parts.yaml]'), {
      'shared/parts.yaml': `${diode('1 ohm').replace(' } }\n', ', spare: { saturation: 1 nA, ideality: 1.8, resistance: 1 ohm } } }\n')}`,
    });
    expect(failed(analysis)).toEqual([]);
    expect(volts(analysis)).toBeGreaterThan(8);
    expect(analysis.findings.filter(({ code }) => code === 'unused')).toEqual([]);
  });

  it('later files win over earlier ones, the board over both, and a file over what it includes', () => {
    const files = {
      'a.yaml': diode('1 ohm'),
      'b.yaml': diode('100 ohm'),
      'c.yaml': `include: [a.yaml]\n${diode('300 ohm')}`,
    };
    const at = (list: string, rest?: string) => volts(read(board(list, rest), files))!;
    const [one, hundred] = [at('[a.yaml]'), at('[b.yaml]')];
    expect(hundred).toBeLessThan(one - 0.1);
    expect(at('[a.yaml, b.yaml]')).toBe(hundred);
    expect(at('[b.yaml, a.yaml]')).toBe(one);
    expect(at('[c.yaml]')).toBeLessThan(hundred);
    const own = board('[b.yaml]').replace('parts: { chips', `${diode('1 ohm').trim().slice(0, -2)}, chips`);
    expect(volts(read(own, files))).toBe(one);
  });

  it('may be read by an asynchronous host, each file once', async () => {
    const asked: string[] = [];
    const files: Record<string, string> = {
      'lib/a.yaml': `include: [b.yaml, ../top.yaml]\n${diode('1 ohm')}`,
      'lib/b.yaml': 'include: [a.yaml]\n',
      'top.yaml': '',
    };
    const text = board('[lib/a.yaml, lib/b.yaml]');
    const include = await readIncludes(text, async (path) => {
      asked.push(path);
      return files[path] ?? { problem: 'there is no such file' };
    });
    expect(asked.sort()).toEqual(['lib/a.yaml', 'lib/b.yaml', 'top.yaml']);
    expect(failed(analyse(text, { file: 'rails.yaml', include }))).toEqual([]);
  });
});

describe('include-failed', () => {
  it.each([
    ['/etc/parts.yaml', 'absolute'],
    ['C:/parts.yaml', 'absolute|address'],
    ['https://example.org/parts.yaml', 'address'],
    ['a\\b.yaml', 'slashes'],
    ['missing.yaml', 'no such file'],
  ])('%s: %s', (path, words) => {
    const analysis = read(board(`['${path}']`), { 'missing.yaml': { problem: 'there is no such file' } });
    expect(failed(analysis)).toHaveLength(1);
    expect(failed(analysis)[0]).toMatchObject({ severity: 'error', at: 'include[0]' });
    expect(failed(analysis)[0]!.message).toMatch(new RegExp(words));
  });

  it('names file, line and the first fault of what was read, and uses the rest', () => {
    const text = `# shared\nparts:\n  diodes:\n    ours: { kind: schottky, saturation: 20 nA, ideality: 1.03, resistance: 1 ohm, colour: red }\nrails: {}\n`;
    const analysis = read(board('[p.yaml]'), { 'p.yaml': text });
    expect(failed(analysis)[0]!.message).toMatch(/`p\.yaml`, line [45]: `(colour|rails)`.*and 1 more/);
    expect(volts(analysis)).toBeGreaterThan(8);
  });

  it('is a warning where nobody reads files', () => {
    const analysis = analyse(board('[p.yaml]'), { file: 'rails.yaml' });
    expect(failed(analysis)[0]).toMatchObject({ severity: 'warning' });
  });

  it('ends circles and depth', () => {
    const files = Object.fromEntries(
      Array.from({ length: 20 }, (_, k) => [`p${k}.yaml`, `include: [p${k + 1}.yaml, p0.yaml]\n`]),
    );
    expect(failed(read(board('[p0.yaml]'), files))[0]!.message).toMatch(/more than 8 deep/);
  });

  it('never throws, whatever stands in the files', () => {
    fc.assert(
      fc.property(fc.string(), fc.string({ unit: 'grapheme' }), (path, text) => {
        const analysis = read(`include: [${JSON.stringify(path)}, x.yaml]\nrails: {}\n`, {
          [path]: text,
          'x.yaml': `parts: ${text}`,
        });
        expect(Array.isArray(analysis.findings)).toBe(true);
      }),
      { numRuns: 200 },
    );
  });
});

describe('on the command line', () => {
  const at = (path: string) => `/home/board/${path}`;
  it('files are read beside the board, inside the project only', async () => {
    const files = {
      [at('hw/rails.yaml')]: board('[../shared/parts.yaml]'),
      [at('shared/parts.yaml')]: diode('1 ohm'),
    };
    const inside = await rail(`check ${at('hw/rails.yaml')}`, {
      files: { ...files, [at('.git/HEAD')]: 'ref' },
    });
    expect(inside).toMatchObject({ code: 0 });
    expect(inside.out).not.toContain('include-failed');
    const outside = await rail(`check ${at('hw/rails.yaml')}`, { files });
    expect(outside.code).toBe(1);
    expect(outside.out).toContain('it lies outside the folder of the project');
  });
});
