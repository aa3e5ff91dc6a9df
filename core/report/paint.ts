/**
 * Colour for a terminal as a small set of meanings that the caller injects; without colour every one is plain text.
 */

export type Paint = (text: string) => string;

export interface Palette {
  readonly heading: Paint;
  readonly strong: Paint;
  readonly faint: Paint;
  readonly good: Paint;
  readonly close: Paint;
  readonly bad: Paint;
  readonly note: Paint;
}

const plain: Paint = (text) => text;

export const plainPalette: Palette = {
  heading: plain,
  strong: plain,
  faint: plain,
  good: plain,
  close: plain,
  bad: plain,
  note: plain,
};

const ansi =
  (code: string): Paint =>
  (text) =>
    text === '' ? '' : `\u001b[${code}m${text}\u001b[0m`;

/** The eight basic colours only, so that the terminal's own theme decides how they look. */
export const colourPalette: Palette = {
  heading: ansi('1'),
  strong: ansi('1'),
  faint: ansi('2'),
  good: ansi('32'),
  close: ansi('33'),
  bad: ansi('31'),
  note: ansi('36'),
};
