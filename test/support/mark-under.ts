/**
 * Puts a mark under a piece of a board, so that a test need not count columns: `part` is underlined where `where`, the
 * beginning of its line without the space in front, stands.
 */
export function markUnder(text: string, where: string, part: string, says: string): string {
  const lines = text.split('\n');
  const at = lines.findIndex((line) => line.trimStart().startsWith(where) && line.includes(part));
  const column = lines[at]?.lastIndexOf(part) ?? -1;
  if (column < 1) throw new Error(`${part} does not stand behind ${where}`);
  lines.splice(at + 1, 0, `#${' '.repeat(column - 1)}${'^'.repeat(part.length)} ${says}`);
  return lines.join('\n');
}
