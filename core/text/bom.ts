/**
 * Byte-order mark: editors take it off before they count, so the core does the same everywhere.
 */

/** The text without a leading U+FEFF; all spans of the core refer to this text. */
export function stripBom(text: string): string {
  return text.charCodeAt(0) === 0xfeff ? text.slice(1) : text;
}
