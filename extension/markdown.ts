/**
 * A hover card as Markdown: the answer first, then a small table, a picture, and where the numbers come from.
 * Plain text in, plain text out, so that it is tested without an editor. Nothing that comes from the file
 * can act as Markdown: every mark in it is written as a character reference.
 */
import type { Card, Theme } from '../core/index';

/** A hover is cut by the editor at 100,000 characters; a picture beyond this is left out, its words stay. */
const largestPicture = 60_000;

/** Shapes that differ, so that the state does not hang on a colour; the sentence beside them says it too. */
const marks: Record<Card['state'], string> = {
  good: '$(pass)',
  close: '$(warning)',
  bad: '$(error)',
  neutral: '$(info)',
};

export interface CardLink {
  readonly label: string;
  /** A command address without white space or brackets, from `commandLink`. */
  readonly target: string;
}

/**
 * The editor shows about ten lines before it scrolls, so the answer and the link come first and close together,
 * and the origins last.
 */
export function cardMarkdown(card: Card, theme: Theme, link: CardLink | undefined): string {
  const title = [
    escapeMarkdown(card.title),
    link === undefined ? '' : `[${escapeMarkdown(link.label)}](${link.target})`,
  ];
  const parts = [
    `${title.filter((part) => part !== '').join(' &ensp; ')}  \n${marks[card.state]} **${escapeMarkdown(card.answer)}**`,
    table(card.head, card.rows),
    picture(card, theme),
    card.origins.map((origin) => `*${escapeMarkdown(origin)}*`).join('  \n'),
  ];
  return parts.filter((part) => part !== '').join('\n\n');
}

/** An address that runs one of our own commands. */
export function commandLink(command: string, args: readonly unknown[]): string {
  const encoded = encodeURIComponent(JSON.stringify(args)).replace(
    /[!'()*~_]/g,
    (mark) => `%${mark.charCodeAt(0).toString(16)}`,
  );
  return `command:${command}?${encoded}`;
}

/**
 * Every ASCII mark as a character reference, one line. Letters, digits and a point between digits stay as they
 * are: alone they mean nothing in Markdown.
 */
export function escapeMarkdown(text: string): string {
  return text
    .replace(/\s+/g, ' ')
    .trim()
    .replace(/[!-\-/:-@[-`{-~]|(?<!\d)\.|\.(?!\d)/g, (mark) => `&#${mark.charCodeAt(0)};`);
}

/** UTF-8 safe in both hosts, neither of which has the other's way. */
export function base64(text: string): string {
  let binary = '';
  for (const byte of new TextEncoder().encode(text)) binary += String.fromCharCode(byte);
  return btoa(binary);
}

function table(head: readonly string[], rows: readonly (readonly string[])[]): string {
  const columns = Math.max(head.length, ...rows.map((row) => row.length));
  if (rows.length === 0 || columns === 0) return '';
  const line = (cells: readonly string[]) =>
    `| ${Array.from({ length: columns }, (_, column) => escapeMarkdown(cells[column] ?? '')).join('&ensp; | ')} |`;
  const rule = `|${' :-- |'.repeat(columns)}`;
  return [line(head), rule, ...rows.map(line)].join('\n');
}

function picture(card: Card, theme: Theme): string {
  const drawn = card.picture?.(theme);
  if (drawn === undefined) return '';
  const words = escapeMarkdown(drawn.alternative);
  const data = base64(drawn.svg);
  if (data.length > largestPicture) return words;
  return `![${words}](data:image/svg+xml;base64,${data}|width=${drawn.width},height=${drawn.height})`;
}
