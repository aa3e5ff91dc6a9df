/**
 * A hover card as plain data: the answer first, a small table, where the number comes from, and a picture.
 * No Markdown and no colour here; the client escapes every string, since parts of it come from the user's file.
 */
import type { Span } from '../text/span';

export type Theme = 'light' | 'dark' | 'high-contrast' | 'high-contrast-light';

export interface Picture {
  readonly svg: string;
  /** The same in words, for people who do not see the picture. */
  readonly alternative: string;
  readonly width: number;
  readonly height: number;
}

export interface Card {
  /** What the card is about, for the editor to highlight. */
  readonly span: Span;
  /** A few words naming the thing: `v6 · doubler`. */
  readonly title: string;
  /** One sentence: the answer with its unit and margin. */
  readonly answer: string;
  readonly state: 'good' | 'close' | 'bad' | 'neutral';
  /** Column heads; empty when the table has none. */
  readonly head: readonly string[];
  readonly rows: readonly (readonly string[])[];
  /** Where the numbers come from: formula, inputs, catalogue entries with their origin. */
  readonly origins: readonly string[];
  /** Drawn when asked, in the colours of the theme. */
  readonly picture?: (theme: Theme) => Picture;
  /** Name of the pump rail that "Size this rail" could work on from here. */
  readonly sizable?: string;
}
