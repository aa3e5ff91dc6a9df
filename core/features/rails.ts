/**
 * Finding rails: the one whose entry holds an offset, and those that a pump makes.
 */
import type { BoardAnalysis } from '../analysis/types';
import { formatBand } from '../quantity/write';
import { type Span, touches } from '../text/span';

/** A pump rail, where its name stands, and a few words about it for a list to choose from. */
export interface PumpRail {
  readonly name: string;
  readonly span: Span;
  readonly detail: string;
}

/** In the order of the file. */
export function pumpRails(analysis: BoardAnalysis): readonly PumpRail[] {
  return [...analysis.rails.values()].flatMap(({ rail, voltage, because }) => {
    if (rail.origin?.kind !== 'pump') return [];
    const topology = rail.origin.pump.topology ?? 'pump';
    const reached = voltage ? formatBand(voltage, 'V') : (because ?? 'not computed');
    return [{ name: rail.name, span: rail.nameSpan, detail: `${topology}, ${reached}` }];
  });
}

/** Name of the rail whose entry holds the offset, its name and its keys included. */
export function railAt(analysis: BoardAnalysis, offset: number): string | undefined {
  const { path } = analysis.reading.nodeAt(offset);
  const [section, name] = path;
  if (section === 'rails' && typeof name === 'string' && analysis.rails.has(name)) return name;
  for (const { rail } of analysis.rails.values()) if (touches(rail.span, offset)) return rail.name;
  return undefined;
}
