/**
 * Cards as Markdown: the order of the parts, and that nothing from a file can act.
 * Outside source: the punctuation that CommonMark 0.31 lets begin a construct (section 2.4, ASCII punctuation), and
 * the table, strikethrough and bare-address extensions of GitHub Flavored Markdown 0.29.
 */
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { Card } from '../../core/index';
import { base64, cardMarkdown, commandLink, escapeMarkdown } from '../../extension/markdown';

const card: Card = {
  span: { start: 0, end: 2 },
  title: 'v6 · doubler',
  answer: '5.71 V, 0.51 V above the need',
  state: 'good',
  head: ['', 'typical'],
  rows: [
    ['voltage', '5.71 V'],
    ['ripple', '2.1 mV'],
  ],
  origins: ['RP2040 data sheet'],
};

/** What a reader sees of escaped text: character references as HTML resolves them. */
function resolved(markdown: string): string {
  return markdown.replace(/&#(\d+);/g, (_, code: string) => String.fromCharCode(Number(code)));
}

describe('escaping', () => {
  test('leaves no ASCII mark but the point between digits, the reference itself apart', () => {
    const marks = '!"#$%&\'()*+,-./:;<=>?@[\\]^_`{|}~';
    const rest = escapeMarkdown(`a${marks}b`).replace(/&#\d+;/g, '');
    expect(rest).toBe('ab');
    expect(escapeMarkdown('5.71 V')).toBe('5.71 V');
    expect(escapeMarkdown('1. item')).toBe('1&#46; item');
  });

  test.each([
    ['a command link', '[x](command:workbench.action.quit)'],
    ['an image', '![x](https://example.com/a.png)'],
    ['an icon', '$(flame)'],
    ['HTML', '<img src=x onerror=alert(1)>'],
    ['a bare address', 'https://example.com www.example.com someone@example.com'],
    ['emphasis and code', '*a* _b_ `c` ~~d~~'],
    ['a table', 'a | b'],
    ['a character reference', '&lt;b&gt; &#60;'],
  ])('shows %s as it is written', (_, text) => {
    const escaped = escapeMarkdown(text);
    expect(resolved(escaped)).toBe(text);
    expect(escaped.replace(/&#\d+;/g, '')).toMatch(/^[\w\s]*$/);
    expect(escaped.replace(/&#\d+;/g, '')).not.toContain('_');
  });

  test('any text comes back, blanks folded, on one line', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'binary' }), (text) => {
        const escaped = escapeMarkdown(text);
        expect(resolved(escaped)).toBe(text.replace(/\s+/g, ' ').trim());
        expect(escaped).not.toMatch(/[\r\n]/);
      }),
    );
  });
});

describe('a card', () => {
  test('has title and answer first, then the table, then the origins', () => {
    const text = resolved(cardMarkdown(card, 'dark', undefined)).replace(/&ensp;/g, '');
    expect(text.split('\n')).toEqual([
      'v6 · doubler  ',
      '$(pass) **5.71 V, 0.51 V above the need**',
      '',
      '|  | typical |',
      '| :-- | :-- |',
      '| voltage | 5.71 V |',
      '| ripple | 2.1 mV |',
      '',
      '*RP2040 data sheet*',
    ]);
  });

  test('without rows or origins has no empty parts', () => {
    const bare = cardMarkdown({ ...card, rows: [], head: [], origins: [] }, 'dark', undefined);
    expect(bare.split('\n')).toHaveLength(2);
  });

  test('marks each state by a shape of its own', () => {
    const states = (['good', 'close', 'bad', 'neutral'] as const).map(
      (state) => /\$\([a-z]+\)/.exec(cardMarkdown({ ...card, state }, 'dark', undefined))?.[0],
    );
    expect(new Set(states).size).toBe(4);
  });

  test('draws its picture for the theme, with its words, and leaves one out that is too large', () => {
    const drawn: Card = {
      ...card,
      picture: (theme) => ({
        svg: `<svg>${theme} Ω</svg>`,
        alternative: 'load [line]',
        width: 10,
        height: 5,
      }),
    };
    const text = cardMarkdown(drawn, 'high-contrast', undefined);
    const image = /!\[(.*?)\]\(data:image\/svg\+xml;base64,(.*?)\|width=10,height=5\)/.exec(text);
    expect(resolved(image?.[1] ?? '')).toBe('load [line]');
    expect(Buffer.from(image?.[2] ?? '', 'base64').toString('utf8')).toBe('<svg>high-contrast Ω</svg>');

    const large = {
      ...drawn,
      picture: () => ({ svg: 'x'.repeat(80_000), alternative: 'words', width: 1, height: 1 }),
    };
    const without = cardMarkdown(large, 'dark', undefined);
    expect(without).not.toContain('data:');
    expect(without).toContain('words');
  });
});

describe('a command link', () => {
  test('holds nothing that ends a Markdown link, and its arguments come back', () => {
    fc.assert(
      fc.property(fc.string(), (name) => {
        const target = commandLink('railLedger.sizeRail', [name]);
        expect(target).toMatch(/^command:railLedger\.sizeRail\?[\w%.-]*$/);
        expect(JSON.parse(decodeURIComponent(target.slice(target.indexOf('?') + 1)))).toEqual([name]);
      }),
    );
  });
});

describe('base64', () => {
  test.each(['', 'f', 'fo', 'foo', 'foob', 'µ Ω ±', '🪶'])('%s as Node encodes it', (text) => {
    expect(base64(text)).toBe(Buffer.from(text, 'utf8').toString('base64'));
  });
});
