/**
 * Text to tree: spans, aliases, merge keys, equal keys, and texts that are not finished or not sound.
 * Outside source: YAML 1.2.2 for aliases and keys; the merge key of YAML 1.1 (yaml.org/type/merge.html, from
 * memory: confirm).
 */
import { describe, expect, test } from 'vitest';
import { entryOf, type MapNode } from '../../../core/syntax/node';
import { longestText, parseText } from '../../../core/syntax/parse';

function issuesOf(text: string): string[] {
  return parseText(text).issues.map(
    ({ kind, span, message }) => `${kind} ${span.start}-${span.end} ${message}`,
  );
}

function mapOf(text: string): MapNode {
  const { root } = parseText(text);
  if (root?.kind !== 'map') throw new Error('no map');
  return root;
}

/** The source that the value of a key, and of the keys under it, stands for. */
function sourceOf(text: string, ...path: string[]): string | undefined {
  let map: MapNode | undefined = mapOf(text);
  for (const [index, key] of path.entries()) {
    const value: ReturnType<typeof entryOf> = map && entryOf(map, key);
    if (index === path.length - 1)
      return value?.value && text.slice(value.value.span.start, value.value.span.end);
    map = value?.value?.kind === 'map' ? value.value : undefined;
  }
  return undefined;
}

describe('spans', () => {
  test('of a block map end with its last value, not with the next line', () => {
    const text = 'a:\n  b: 1 # one\n  c: 2 # two\n\nd: 3\n';
    expect(sourceOf(text, 'a')).toBe('b: 1 # one\n  c: 2');
    expect(sourceOf(text, 'a', 'c')).toBe('2');
  });
  test('of flow collections hold their brackets', () => {
    expect(sourceOf('a: { b: [1, 2] } # x\n', 'a')).toBe('{ b: [1, 2] }');
    expect(sourceOf('a: { b: [1, 2] } # x\n', 'a', 'b')).toBe('[1, 2]');
  });
});

describe('aliases', () => {
  test('stand for the anchored node, and keep their own place', () => {
    const map = mapOf('a: &x { b: 1 }\nc: *x\n');
    const c = entryOf(map, 'c');
    expect(c?.value).toBe(entryOf(map, 'a')?.value);
    expect(c?.alias).toEqual({ start: 18, end: 20 });
  });
  test('without an anchor, or inside their own, are reported', () => {
    expect(issuesOf('a: *x\n')).toEqual(['broken 3-5 No anchor `&x` stands above this alias.']);
    expect(issuesOf('a: &x { b: *x }\n')).toEqual([
      'broken 11-13 The alias `*x` stands inside its own anchor.',
    ]);
  });
  test('that multiply without end are cut off', () => {
    const levels = Array.from({ length: 12 }, (_, i) => {
      const before = i === 0 ? '1' : Array.from({ length: 10 }, () => `*l${i - 1}`).join(', ');
      return `k${i}: &l${i} [${before}]`;
    });
    const started = performance.now();
    const issues = issuesOf(levels.join('\n'));
    expect(performance.now() - started).toBeLessThan(5000);
    expect(issues.some((issue) => issue.includes('stand for too much'))).toBe(true);
  });
  test('many of one small anchor are fine', () => {
    const text = `a: &x { b: 1 }\n${Array.from({ length: 1000 }, (_, i) => `k${i}: *x`).join('\n')}\n`;
    expect(issuesOf(text)).toEqual([]);
  });
});

describe('merge keys', () => {
  test('add what the map itself lacks', () => {
    const text = 'base: &b { x: 1, y: 2 }\na: { <<: *b, y: 3 }\n';
    const a = entryOf(mapOf(text), 'a')?.value as MapNode;
    expect(a.entries.map(({ key, merged }) => [key.text, merged])).toEqual([
      ['y', false],
      ['x', true],
    ]);
    expect(sourceOf(text, 'a', 'y')).toBe('3');
    expect(sourceOf(text, 'a', 'x')).toBe('1');
  });
  test('the first of several maps wins', () => {
    expect(sourceOf('p: &p { x: 1 }\nq: &q { x: 2 }\na: { <<: [*p, *q] }\n', 'a', 'x')).toBe('1');
  });
  test('of something else are reported', () => {
    expect(issuesOf('a: { <<: 5 }\n')).toEqual([
      'broken 9-10 A merge key (`<<`) takes the alias of a map, or a list of such aliases.',
    ]);
  });
});

describe('keys', () => {
  test('that are equal: the first one counts, the second is reported', () => {
    const text = 'a: 1\nb: 2\na: 3\n';
    const { issues } = parseText(text);
    expect(issues).toMatchObject([
      { kind: 'duplicate-key', span: { start: 10, end: 11 }, related: { span: { start: 0, end: 1 } } },
    ]);
    expect(sourceOf(text, 'a')).toBe('1');
  });
  test('equal by what they say, not by their quotes', () =>
    expect(issuesOf('a: 1\n"a": 2\n')).toHaveLength(1));
  test('as many as fit take no quadratic time', () => {
    const text = Array.from({ length: 20_000 }, (_, i) => `k${i}: 1`).join('\n');
    const started = performance.now();
    expect(mapOf(text).entries).toHaveLength(20_000);
    expect(performance.now() - started).toBeLessThan(5000);
  });
  test('of the language of objects are keys like others', () => {
    const keys = mapOf('__proto__: 1\nconstructor: 2\ntoString: 3\n').entries.map(({ key }) => key.text);
    expect(keys).toEqual(['__proto__', 'constructor', 'toString']);
  });
});

describe('texts that are not finished', () => {
  test('a word without a colon', () => {
    expect(issuesOf('rails:\n  v3: 1\n  vo\n')).toEqual([
      'broken 17-19 A colon and a value are missing behind `vo`.',
    ]);
  });
  test('an open bracket', () =>
    expect(issuesOf('a: { b: 1\n')).toEqual(['broken 8-9 The closing `}` is missing.']));
  test('an open quote', () => expect(issuesOf("a: 'b\n")[0]).toContain('closing quote'));
  test('a key alone has no value', () => {
    expect(entryOf(mapOf('a:\n'), 'a')).toMatchObject({ key: { text: 'a' } });
    expect(entryOf(mapOf('a:\n'), 'a')?.value).toBeUndefined();
  });
  test('a tab as indentation', () => expect(issuesOf('a:\n\tb: 1\n')[0]).toContain('tabs'));
  test('two pairs on a line', () => expect(issuesOf('a: b: c\n')[0]).toContain('on one line'));
  test('nothing at all', () => expect(parseText('')).toEqual({ issues: [] }));
});

describe('texts that are not sound', () => {
  test('two documents', () => expect(issuesOf('a: 1\n---\nb: 2\n')[0]).toContain('one document'));
  test('tags are ignored with a warning', () => {
    expect(issuesOf('a: !x 1\n')).toEqual([
      'warning 3-5 Tags (`!name`) have no meaning in a board file: this one is ignored.',
    ]);
  });
  test('maps as keys', () => expect(issuesOf('{ b: 1 }: 2\n')[0]).toContain('A key is missing here'));
  test('deep nesting is refused, not followed', () => {
    expect(issuesOf('['.repeat(5000))[0]).toBeDefined();
    expect(issuesOf(`${'['.repeat(300)}${']'.repeat(300)}`).join()).toContain('too deeply');
  });
  test('more than 256 kB is not read', () => {
    expect(issuesOf(`a: ${'x'.repeat(longestText)}`)).toEqual([
      'broken 0-1 The file is longer than 256 kB and is not read.',
    ]);
  });
});
