/**
 * Data of chips and of logic outputs from the file.
 */
import type { ChipData, PinData, PinGroup, TestPoint } from '../../catalog/part';
import {
  chipPartShape,
  groupShape,
  pinDataShape,
  pinStrengthShape,
  testPointShape,
  totalShape,
} from '../../format';
import { listOf, tableOf } from '../entries';
import { figureOf } from '../figures';
import { present } from '../present';
import { type Fields, openMap, type Slot } from '../slot';
import { textOf } from '../words';
import { entryHead, partFigure } from './figures';

export function chipData(slot: Slot, key: string, base?: ChipData): ChipData | undefined {
  const fields = openMap(slot, chipPartShape);
  if (!fields) return undefined;
  const head = entryHead(key, slot, fields, base);
  const { source } = head;
  const pin: Record<string, PinData> = { ...base?.pin };
  for (const named of tableOf(fields.at('pin'))) {
    const data =
      named.slot && pinData(named.slot, Object.hasOwn(pin, named.name) ? pin[named.name] : undefined);
    if (data) Object.defineProperty(pin, named.name, { value: data, enumerable: true, configurable: true });
  }
  const total = fields.at('total') && openMap(fields.at('total')!, totalShape);
  return {
    ...base,
    ...head,
    ...present({
      supply: partFigure(fields, 'supply', base?.supply, source),
      draws: partFigure(fields, 'draws', base?.draws, source),
    }),
    pins: pinData(fields.at('pins'), base?.pins) ?? base?.pins ?? {},
    pin,
    groups: groupsOf(fields.at('groups'), base?.groups ?? []),
    total: {
      ...base?.total,
      ...(total && present({ source: figureOf(total.at('source')), sink: figureOf(total.at('sink')) })),
    },
  };
}

export function pinData(slot: Slot | undefined, base?: PinData): PinData | undefined {
  const fields = slot && openMap(slot, pinDataShape);
  if (!fields) return undefined;
  const strengths: Record<string, PinData> = { ...base?.strengths };
  for (const named of tableOf(fields.at('strengths'))) {
    const inner = named.slot && openMap(named.slot, pinStrengthShape);
    const value =
      inner && outputData(inner, Object.hasOwn(strengths, named.name) ? strengths[named.name] : undefined);
    if (value) Object.defineProperty(strengths, named.name, { value, enumerable: true, configurable: true });
  }
  const output = outputData(fields, base);
  return Object.keys(strengths).length > 0 ? { ...output, strengths } : output;
}

type OutputKey = 'high-resistance' | 'low-resistance' | 'high' | 'low' | 'absolute';

/** Resistances given in the file replace test points of the entry that is overridden, and the reverse. */
export function outputData(
  fields: Fields<OutputKey | 'recommended'> | Fields<OutputKey>,
  base?: PinData,
): PinData {
  const at = (key: OutputKey | 'recommended') => (fields as Fields<OutputKey | 'recommended'>).at(key);
  const highResistance = figureOf(at('high-resistance'));
  const lowResistance = figureOf(at('low-resistance'));
  const high = testPoints(at('high'));
  const low = testPoints(at('low'));
  return {
    ...present({
      highResistance: highResistance ?? (high ? undefined : base?.highResistance),
      lowResistance: lowResistance ?? (low ? undefined : base?.lowResistance),
      high: high ?? (highResistance ? undefined : base?.high),
      low: low ?? (lowResistance ? undefined : base?.low),
      recommended: figureOf(at('recommended')) ?? base?.recommended,
      absolute: figureOf(at('absolute')) ?? base?.absolute,
      strengths: base?.strengths,
    }),
  };
}

function testPoints(slot: Slot | undefined): TestPoint[] | undefined {
  const points = listOf(slot, true).flatMap((item): TestPoint[] => {
    const fields = openMap(item, testPointShape);
    const current = figureOf(fields?.at('current'));
    const voltage = figureOf(fields?.at('voltage'));
    const supply = figureOf(fields?.at('supply'));
    return current && voltage && supply ? [{ current, voltage, supply }] : [];
  });
  return points.length > 0 ? points : undefined;
}

function groupsOf(slot: Slot | undefined, base: readonly PinGroup[]): PinGroup[] {
  const own = tableOf(slot).flatMap((named): PinGroup[] => {
    const fields = named.slot && openMap(named.slot, groupShape);
    if (!fields) return [];
    const pins = listOf(fields.at('pins')).flatMap((item) => textOf(item) ?? []);
    const limits = present({ source: figureOf(fields.at('source')), sink: figureOf(fields.at('sink')) });
    return [{ name: named.name, pins, ...limits }];
  });
  return [...base.filter((group) => !own.some(({ name }) => name === group.name)), ...own];
}
