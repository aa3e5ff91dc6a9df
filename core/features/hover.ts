/**
 * The card about the thing at an offset: names and references first, then quantities, then keys of the language.
 */
import type { BoardAnalysis } from '../analysis/types';
import type { PartEntry } from '../catalog/part';
import type { ReadReference } from '../model/context';
import { type Span, touches } from '../text/span';
import { benchAt, benchCard } from './bench-card';
import { capacitorCardAt } from './capacitor-card';
import type { Card } from './card';
import { chipCard } from './chip-card';
import { clockCard } from './clock-card';
import { keyCard } from './key-card';
import { partCard } from './part-card';
import { pinCard } from './pin-card';
import { quantityCard } from './quantity-card';
import { railCard } from './rail-card';
import { supplyCard } from './supply-card';

export function hoverCard(analysis: BoardAnalysis, offset: number): Card | undefined {
  const { reading } = analysis;
  const pin = clockPinCard(analysis, offset);
  if (pin) return pin;
  const reference = reading.referenceAt(offset);
  const referred = reference && referenceCard(analysis, reference);
  if (referred) return referred;
  const named = nameCard(analysis, offset);
  if (named) return named;
  const measured = benchEntryCard(analysis, offset);
  if (measured) return measured;
  const quantity = reading.quantityAt(offset);
  const place = reading.nodeAt(offset);
  const capacitor = capacitorCardAt(analysis, place, quantity, offset);
  if (capacitor) return capacitor;
  if (quantity) return quantityCard(analysis, quantity);
  return keyCard(place);
}

/** `mcu.GP15` in a clock means the pin as a whole, also with the pointer on the chip's name. */
function clockPinCard(analysis: BoardAnalysis, offset: number): Card | undefined {
  for (const { pin } of analysis.reading.board.clocks.values()) {
    if (!pin || !touches(pin.span, offset)) continue;
    const result = analysis.pins.get(`${pin.chip}.${pin.pin}`);
    if (result) return pinCard(result, pin.span);
  }
  return undefined;
}

/** Anywhere in a bench entry but on its keys, which explain themselves. */
function benchEntryCard(analysis: BoardAnalysis, offset: number): Card | undefined {
  if (analysis.reading.nodeAt(offset).on === 'key') return undefined;
  const result = benchAt(analysis, offset);
  return result && benchCard(result);
}

function referenceCard(analysis: BoardAnalysis, { to, name, span, path }: ReadReference): Card | undefined {
  switch (to) {
    case 'part': {
      const part = findEntry(analysis, name, path);
      return part && partCard(part, span);
    }
    case 'pin': {
      const pin = analysis.pins.get(name);
      return pin && pinCard(pin, span);
    }
    default:
      return entryCard(analysis, to, name, span);
  }
}

function entryCard(analysis: BoardAnalysis, section: string, name: string, span: Span): Card | undefined {
  switch (section) {
    case 'rails': {
      const rail = analysis.rails.get(name);
      return rail && railCard(analysis, rail, span);
    }
    case 'clocks': {
      const clock = analysis.clocks.get(name);
      return clock && clockCard(analysis, clock, span);
    }
    case 'chips': {
      const chip = analysis.chips.get(name);
      return chip && chipCard(chip, span);
    }
    case 'supplies': {
      const supply = analysis.supplies.get(name);
      return supply && supplyCard(supply, span);
    }
    default:
      return undefined;
  }
}

/** On the name of an entry itself. */
function nameCard(analysis: BoardAnalysis, offset: number): Card | undefined {
  const { board, catalogue, ownParts } = analysis.reading;
  for (const section of ['rails', 'clocks', 'chips', 'supplies'] as const)
    for (const { name, nameSpan } of board[section].values())
      if (touches(nameSpan, offset)) return entryCard(analysis, section, name, nameSpan);
  for (const chip of board.chips.values())
    for (const { name, nameSpan } of chip.pins.values()) {
      const pin = analysis.pins.get(`${chip.name}.${name}`);
      if (pin && touches(nameSpan, offset)) return pinCard(pin, nameSpan);
    }
  for (const part of Object.values(catalogue).flat() as readonly PartEntry[]) {
    const span = ownParts.get(part);
    if (span && touches(span, offset)) return partCard(part, span);
  }
  return undefined;
}

/** Keys are unique within a family only; the key in front of the name tells the family. */
function findEntry(analysis: BoardAnalysis, name: string, path: string): PartEntry | undefined {
  const { catalogue } = analysis.reading;
  const families: readonly (readonly [RegExp, readonly PartEntry[]])[] = [
    [/\bdiode(\[\d+\])?$/, catalogue.diodes],
    [/\bkind$/, catalogue.capacitors],
    [/\bbattery$/, catalogue.batteries],
    [/\bstandard$/, catalogue.standards],
    [/^chips\.[^.]+\.part$/, catalogue.chips],
    [/\bgates\.part$|\bschmitt\.part$/, catalogue.gates],
    [/\bastable\.part$/, catalogue.timers],
    [/\b[np]mos$/, catalogue.mosfets],
    [/\b(npn|pnp)$/, catalogue.transistors],
  ];
  const family = families.find(([pattern]) => pattern.test(path))?.[1];
  return (family ?? (Object.values(catalogue).flat() as readonly PartEntry[])).find(
    ({ key }) => key === name,
  );
}
