/**
 * Colours of pictures, one set for each kind of theme, on that theme's usual hover background (or none at all in
 * high contrast). Text keeps a contrast of at least 4.5, lines and fills of at least 3. Meaning never hangs on
 * colour: fills also differ by pattern, and everything is labelled.
 */
import type { Theme } from '../card';

export interface Inks {
  readonly text: string;
  readonly faint: string;
  /** What is left for the load. */
  readonly output: string;
  /** What is lost on the way. */
  readonly loss: string;
  /** The window that is needed: its edges, and the share of its fill that shows. */
  readonly need: string;
  readonly needOpacity: number;
  readonly bad: string;
}

export const inks: Readonly<Record<Theme, Inks>> = {
  light: {
    text: '#1f2328',
    faint: '#59636e',
    output: '#0a6cbf',
    loss: '#a04a00',
    need: '#1a7f37',
    needOpacity: 0.13,
    bad: '#b3261e',
  },
  dark: {
    text: '#e6e6e6',
    faint: '#a8b0b8',
    output: '#58a6ff',
    loss: '#f0a050',
    need: '#56c26a',
    needOpacity: 0.18,
    bad: '#ff8a80',
  },
  'high-contrast': {
    text: '#ffffff',
    faint: '#ffffff',
    output: '#6fc3ff',
    loss: '#ffb454',
    need: '#7ee787',
    needOpacity: 0.25,
    bad: '#ff9a91',
  },
  'high-contrast-light': {
    text: '#000000',
    faint: '#292929',
    output: '#0053a6',
    loss: '#7a3600',
    need: '#0b5c22',
    needOpacity: 0.14,
    bad: '#8f0f0a',
  },
};
