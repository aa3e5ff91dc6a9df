import { describe, expect, it } from 'vitest';
import { catalogue, findPart } from '../../../core/catalog';
import type { CapacitorKind, PartEntry } from '../../../core/catalog/part';
import type { Figure, Unit } from '../../../core/quantity/figure';

/** The unit that belongs to each figure, by the name of its field. */
const unitOf: Readonly<Record<string, Unit>> = {
  absolute: 'A',
  average: 'A',
  baseResistance: 'ohm',
  bulk: 'F',
  capacity: 'C',
  collectorResistance: 'ohm',
  current: 'A',
  draws: 'A',
  emitterResistance: 'ohm',
  esr: 'ohm',
  falling: 'V',
  fastest: 'Hz',
  gain: '1',
  gateCharge: 'C',
  gateVoltage: 'V',
  highDrop: 'V',
  highResistance: 'ohm',
  heat: 'W',
  ideality: '1',
  junction: 'F',
  leakage: 'A',
  leakageRate: '1',
  left: '1',
  loss: '1',
  lowResistance: 'ohm',
  lowVoltage: 'V',
  ohms: 'ohm',
  onResistance: 'ohm',
  peak: 'A',
  recommended: 'A',
  resistance: 'ohm',
  reverse: 'V',
  reverseGain: '1',
  rising: 'V',
  saturation: 'A',
  selfDischarge: '1',
  sink: 'A',
  source: 'A',
  storage: 's',
  supply: 'V',
  temperature: '1',
  threshold: 'V',
  thresholdSupply: 'V',
  tolerance: '1',
  total: 'A',
  usable: '1',
  voltage: 'V',
  volts: 'V',
};

/** May be zero or below without being a slip. */
const signed = new Set(['tolerance', 'temperature', 'highDrop', 'lowVoltage', 'source']);

const lists = Object.entries(catalogue) as [string, readonly PartEntry[]][];
const entries = lists.flatMap(([list, parts]) =>
  parts.map((part) => ({ list, part, name: `${list}/${part.key}` })),
);

function figuresIn(value: unknown, path: string): { field: string; path: string; figure: Figure }[] {
  if (typeof value !== 'object' || value === null) return [];
  if ('origin' in value) return [{ field: path.split('.').at(-1)!, path, figure: value as Figure }];
  return Object.entries(value).flatMap(([key, inner]) =>
    figuresIn(inner, Array.isArray(value) ? path : `${path}.${key}`),
  );
}

describe('every list of the catalogue', () => {
  it.each(lists)('%s is not empty, sorted and without a key twice', (_, parts) => {
    const keys = parts.map((part) => part.key);
    expect(keys.length).toBeGreaterThan(0);
    expect(keys).toEqual([...new Set(keys)].sort());
  });
});

describe('every entry', () => {
  it.each(entries)('$name has a lower-case key, a title and a source', ({ part }) => {
    expect(part.key).toMatch(/^[a-z0-9]+([-.][a-z0-9]+)*$/);
    expect(part.title.length).toBeGreaterThan(3);
    expect(part.source.length).toBeGreaterThan(3);
  });

  it.each(entries)('$name has only ordered bands in the right unit, each with an origin', ({ part }) => {
    const figures = figuresIn(part, part.key);
    expect(figures.length).toBeGreaterThan(0);
    for (const { field, path, figure } of figures) {
      expect(unitOf[field], `${path}: a field this test knows`).toBeDefined();
      expect(figure.unit, path).toBe(unitOf[field]);
      expect(figure.min, path).toBeLessThanOrEqual(figure.typical);
      expect(figure.typical, path).toBeLessThanOrEqual(figure.max);
      expect(Number.isFinite(figure.min + figure.max), path).toBe(true);
      if (!signed.has(field)) expect(figure.min, path).toBeGreaterThan(0);
      expect(['file', 'assumed'], path).not.toContain(figure.origin.kind);
      expect(figure.origin.note?.length ?? 0, `${path}: origin says what is known`).toBeGreaterThan(3);
    }
  });
});

describe('chips', () => {
  it.each(catalogue.chips)(
    '$key can be driven with: both levels at every setting, groups of its own pins',
    (chip) => {
      for (const pin of [
        chip.pins,
        ...Object.values(chip.pins.strengths ?? {}),
        ...Object.values(chip.pin),
      ]) {
        expect(pin.high?.length ?? pin.highResistance).toBeTruthy();
        expect(pin.low?.length ?? pin.lowResistance).toBeTruthy();
        expect(pin.recommended!.max).toBeLessThanOrEqual(pin.absolute?.max ?? Number.POSITIVE_INFINITY);
        for (const point of [...(pin.high ?? []), ...(pin.low ?? [])]) {
          expect(point.voltage.min).toBeGreaterThan(0);
          expect(point.voltage.max).toBeLessThan(point.supply.typical);
        }
      }
      // Without names nothing would hold groups and single pins against the chip.
      if (chip.groups.length > 0 || Object.keys(chip.pin).length > 0) expect(chip.names).toBeDefined();
      const names = new Set(chip.names ?? []);
      for (const group of chip.groups) {
        expect(group.source ?? group.sink).toBeDefined();
        expect(group.pins.filter((pin) => !names.has(pin))).toEqual([]);
      }
      expect(Object.keys(chip.pin).filter((pin) => !names.has(pin))).toEqual([]);
      const groupNames = chip.groups.map((group) => group.name);
      expect(groupNames).toEqual([...new Set(groupNames)]);
    },
  );
});

describe('every family is whole', () => {
  const needed: Readonly<Record<string, readonly string[]>> = {
    chips: ['supply', 'pins', 'total', 'draws'],
    diodes: [
      'kind',
      'saturation',
      'ideality',
      'resistance',
      'junction',
      'reverse',
      'average',
      'peak',
      'leakage',
    ],
    transistors: ['polarity', 'saturation', 'gain', 'reverseGain', 'baseResistance', 'storage', 'current'],
    mosfets: ['channel', 'threshold', 'onResistance', 'gateCharge', 'current'],
    gates: ['supply', 'output', 'absolute', 'total', 'draws'],
    timers: ['supply', 'highDrop', 'highResistance', 'lowVoltage', 'lowResistance', 'draws', 'fastest'],
    capacitors: ['tolerance', 'temperature', 'heat', 'polarised'],
    standards: ['voltage', 'current', 'resistance', 'bulk'],
    batteries: ['voltage', 'resistance', 'capacity'],
  };
  it.each(entries)('$name has every figure that its kind needs', ({ list, part }) => {
    expect(Object.keys(needed)).toContain(list);
    expect(needed[list]!.filter((key) => !Object.hasOwn(part, key))).toEqual([]);
  });
});

describe('capacitor kinds', () => {
  const biased = catalogue.capacitors.filter(
    (kind): kind is Required<CapacitorKind> => kind.bias !== undefined,
  );
  it.each(biased)('$key loses value steadily as the voltage rises', ({ bias }) => {
    expect(bias[0]).toMatchObject({ share: 0, left: { typical: 1 } });
    expect(bias.at(-1)?.share).toBe(1);
    for (const [i, point] of bias.entries()) {
      const before = bias[i - 1];
      if (before === undefined) continue;
      expect(point.share).toBeGreaterThan(before.share);
      expect(point.left.typical).toBeLessThan(before.left.typical);
      expect(point.left.min).toBeLessThan(before.left.min);
    }
  });
  it.each(catalogue.capacitors)('$key has a loss of one kind', (kind) => {
    expect([kind.esr, kind.loss].filter((figure) => figure !== undefined)).toHaveLength(1);
  });
});

describe('batteries', () => {
  it.each(catalogue.batteries)('$key runs down from full to empty, and its resistance rises', (battery) => {
    const { voltage, openVoltage, agedResistance, resistance } = battery;
    expect(openVoltage.map(({ left }) => left)).toEqual([1, 0.9, 0.8, 0.7, 0.6, 0.5, 0.4, 0.3, 0.2, 0.1, 0]);
    expect(openVoltage[0]!.volts.typical).toBe(voltage.max);
    expect(openVoltage.at(-1)!.volts.typical).toBe(voltage.min);
    // The nominal voltage is one that it has on the way.
    expect(openVoltage[1]!.volts.typical).toBeGreaterThan(voltage.typical);
    for (const [i, point] of openVoltage.entries()) {
      const before = openVoltage[i - 1];
      if (before) expect(point.volts.typical).toBeLessThan(before.volts.typical);
    }
    expect([agedResistance[0]!.left, agedResistance.at(-1)!.left]).toEqual([1, 0]);
    for (const [i, point] of agedResistance.entries()) {
      const before = agedResistance[i - 1];
      if (!before) continue;
      expect(point.left).toBeLessThan(before.left);
      for (const end of ['min', 'typical', 'max'] as const)
        expect(point.ohms[end]).toBeGreaterThanOrEqual(before.ohms[end]);
    }
    // Two to three times as much near the end; makers' articles on coin cells have up to four.
    const rise = agedResistance.at(-1)!.ohms.typical / agedResistance[0]!.ohms.typical;
    expect(rise).toBeGreaterThanOrEqual(2);
    expect(rise).toBeLessThanOrEqual(4);
    expect(agedResistance[0]!.ohms.typical).toBeLessThanOrEqual(resistance!.typical);
  });

  it.each(catalogue.batteries)('$key can be counted on for 70 to 90 % of its label', (battery) => {
    expect(battery.usable.min).toBeGreaterThanOrEqual(0.7);
    expect(battery.usable.max).toBeLessThanOrEqual(0.9);
    expect(battery.capacity.typical).toBeGreaterThan(0);
    expect(battery.selfDischarge.typical).toBeGreaterThan(0);
    expect(battery.caution).toMatch(/charge/);
  });
});

describe('looking up a part', () => {
  it('finds a key and nothing else', () => {
    expect(findPart(catalogue.chips, 'rp2040')?.total.source?.typical).toBe(0.05);
    expect(findPart(catalogue.chips, 'rp2040x')).toBeUndefined();
  });
});
