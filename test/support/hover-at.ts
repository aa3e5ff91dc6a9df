/**
 * The one helper of the hover tests: a board with `$0` where the pointer is, the card there as plain text.
 */
import { analyse, type Card, hoverCard } from '../../core/index';

export interface ShownCard {
  /** What the card highlights. */
  readonly over: string;
  readonly title: string;
  readonly answer: string;
  readonly state: Card['state'];
  /** Table and origins, one line each, cells joined by ` | `. */
  readonly body: string;
  readonly card: Card;
}

export function hoverAt(marked: string): ShownCard | undefined {
  const offset = marked.indexOf('$0');
  if (offset < 0) throw new Error('the board has no $0');
  const text = marked.replace('$0', '');
  const card = hoverCard(analyse(text, { file: 'rails.yaml' }), offset);
  if (card === undefined) return undefined;
  const lines = [card.head.join(' | '), ...card.rows.map((row) => row.join(' | ')), ...card.origins];
  return {
    over: text.slice(card.span.start, card.span.end),
    title: card.title,
    answer: card.answer,
    state: card.state,
    body: lines.join('\n'),
    card,
  };
}
