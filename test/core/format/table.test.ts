/**
 * The table of the file format is complete, and its own examples are sound: each one is read here.
 */
import { describe, expect, test } from 'vitest';
import { boardShape, type Row, type Shape, schemaAt } from '../../../core/format';
import { readBoard } from '../../../core/model/build';
import { smallCatalogue } from '../../support/small-catalogue';

interface Place {
  readonly path: readonly (string | number)[];
  readonly row: Row;
}

/** Every row of the table, once for each way to it; names of tables are `x`. */
function places(shape: Shape, before: readonly (string | number)[] = []): Place[] {
  return Object.entries(shape.keys).flatMap(([key, row]) => below([...before, key], row));
}

function below(path: readonly (string | number)[], row: Row): Place[] {
  const inner = row.values.flatMap((value): Place[] => {
    if (value.kind === 'map') return places(value.shape, path);
    if (value.kind === 'table') return below([...path, 'x'], value.entry);
    return value.kind === 'list' ? below([...path, 0], value.of) : [];
  });
  return [{ path, row }, ...inner];
}

const all = places(boardShape);

/** The example at its place in an otherwise empty file. */
function fileWith({ path, row }: Place): string {
  return path.reduceRight<string>(
    (inner, step) => (typeof step === 'number' ? `[${inner}]` : `{ ${step}: ${inner} }`),
    row.example,
  );
}

test('the table is as large as the language', () => expect(all.length).toBeGreaterThan(200));

test('every row has a sentence', () => {
  for (const { path, row } of all) expect(row.doc, path.join('.')).toMatch(/^[A-Z].*[.]$/);
});

test('every example can be read where it stands', () => {
  for (const place of all) {
    if (place.row.example === '') continue;
    const text = fileWith(place);
    const wrong = readBoard(text, smallCatalogue).findings.filter(({ code }) =>
      ['syntax', 'unknown-key', 'bad-quantity', 'wrong-unit', 'duplicate-name'].includes(code),
    );
    expect(wrong, text).toEqual([]);
  }
});

test('keys that exclude each other exist', () => {
  for (const { row } of all) {
    for (const value of row.values) {
      if (value.kind !== 'map') continue;
      for (const key of value.shape.exactlyOne) expect(Object.keys(value.shape.keys)).toContain(key);
    }
  }
});

/** The contract of the language, written down a second time by hand. */
describe('the keys are those of the language', () => {
  test.each([
    [[], 'bench board chips clocks conditions drivers include modes parts rails stock supplies waivers'],
    [['supplies', 'x'], 'battery bulk capacity cells current life resistance standard voltage'],
    [['chips', 'x'], 'draws part pins rail'],
    [['chips', 'x', 'pins', 'x'], 'sinks sources strength'],
    [['clocks', 'x'], 'astable duty external fall frequency inverse-of pin rail rise schmitt timer'],
    [['clocks', 'x', 'timer'], 'compare input prescaler top'],
    [['clocks', 'x', 'astable'], 'charge discharge part timing'],
    [['clocks', 'x', 'schmitt'], 'capacitor part resistor'],
    [['clocks', 'x', 'external'], 'duty frequency high low resistance'],
    [['drivers', 'x'], 'follower gates input mosfet-pair pins push-pull rail'],
    [['drivers', 'x', 'push-pull'], 'base npn pnp shared-base'],
    [['drivers', 'x', 'mosfet-pair'], 'gate nmos pmos'],
    [['drivers', 'x', 'gates'], 'parallel part'],
    [['rails', 'x'], 'bleeder filter loads needs pump regulator supply'],
    [['rails', 'x', 'regulator'], 'dropout efficiency from ground kind limit output thermal'],
    [['rails', 'x', 'filter'], 'capacitor from inductor resistor'],
    [['rails', 'x', 'needs'], 'discharge headroom ripple start swing voltage'],
    [['rails', 'x', 'pump'], 'diode drive flying input polarity reservoir series smoothing stages topology'],
    [['rails', 'x', 'pump', 'flying'], 'esr kind negative-to rated ripple size value'],
    [['rails', 'x', 'loads', 'x'], 'amplifier current in least most power resistance'],
    [['rails', 'x', 'loads', 'x', 'amplifier'], 'count output quiescent'],
    [['modes', 'x'], 'share'],
    [['parts'], 'capacitors chips diodes gates mosfets timers transistors'],
    [['parts', 'chips', 'x'], 'draws groups pin pins source supply total'],
    [
      ['parts', 'chips', 'x', 'pins'],
      'absolute high high-resistance low low-resistance recommended strengths',
    ],
    [
      ['parts', 'diodes', 'x'],
      'average ideality junction kind leakage peak resistance reverse saturation source',
    ],
    [
      ['parts', 'transistors', 'x'],
      'base-resistance collector-resistance current emitter-resistance gain polarity reverse-gain saturation source storage',
    ],
    [['parts', 'mosfets', 'x'], 'channel current gate-charge on-resistance source threshold'],
    [
      ['parts', 'gates', 'x'],
      'absolute draws falling high high-resistance low low-resistance rising source supply total',
    ],
    [
      ['parts', 'timers', 'x'],
      'draws fastest high-drop high-resistance low-resistance low-voltage source supply',
    ],
    [['parts', 'capacitors', 'x'], 'bias esr leakage loss polarised source temperature tolerance'],
    [['bench', 0], 'load note rail ripple voltage'],
    [['waivers', 0], 'at because finding until'],
  ] as const)('%j', (path, keys) => {
    expect(
      Object.keys(schemaAt(path)?.shape?.keys ?? {})
        .sort()
        .join(' '),
    ).toBe(keys);
  });
});

test('paths outside the language lead nowhere', () => {
  expect(schemaAt(['rails', 'x', 'pomp'])).toBeUndefined();
  expect(schemaAt(['constructor'])).toBeUndefined();
  expect(schemaAt(['board', 'x'])).toBeUndefined();
});
