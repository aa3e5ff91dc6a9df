/**
 * Hover: the computed number is in the card, the picture is a picture, and only our own command is trusted.
 */
import * as vscode from 'vscode';
import { analyse, hoverCard } from '../../../core/index';
import { equal, ok } from '../expect';
import { test } from '../runner';
import { closeEditor, openFixture, rangeOf } from '../workspace';

async function hoverAt(document: vscode.TextDocument, position: vscode.Position): Promise<vscode.Hover> {
  const hovers = await vscode.commands.executeCommand<vscode.Hover[]>(
    'vscode.executeHoverProvider',
    document.uri,
    position,
  );
  ok(hovers[0], 'there is a hover');
  return hovers[0];
}

function markdownOf(hover: vscode.Hover): vscode.MarkdownString {
  const [content] = hover.contents;
  ok(content instanceof vscode.MarkdownString, 'the hover is Markdown');
  return content;
}

/** What a reader sees of escaped text. */
function plain(markdown: string): string {
  return markdown.replace(/&#(\d+);/g, (_, code) => String.fromCharCode(Number(code)));
}

export function hoverTests(): void {
  test('the card of a pump rail says the computed voltage', async () => {
    const { document } = await openFixture('rails.yaml');
    const name = rangeOf(document, 'vlamp');
    const analysis = analyse(document.getText(), { file: 'rails.yaml' });
    const card = hoverCard(analysis, document.offsetAt(name.start));
    ok(card, 'the core has a card');
    const hover = await hoverAt(document, name.start);
    const text = plain(markdownOf(hover).value);
    ok(text.includes(card.title) && text.includes(card.answer), `title and answer are in the hover: ${text}`);

    const voltage = analysis.report.rails['vlamp']?.voltage?.typical;
    ok(voltage !== undefined, 'the voltage is computed');
    // A doubler on 3.3 V cannot reach 6.6 V, and one that is only a little starved stays above its input.
    ok(voltage > 3.3 && voltage < 6.6, `the voltage is possible: ${voltage}`);
    const written = /(-?\d+(?:\.\d+)?) V\b/.exec(card.answer);
    ok(written, `the answer holds a voltage: ${card.answer}`);
    const close = Math.abs(Number(written[1]) - voltage) < 0.01;
    ok(close, `the answer holds the report's voltage ${voltage}: ${card.answer}`);
    equal(
      hover.range && [document.offsetAt(hover.range.start), document.offsetAt(hover.range.end)],
      [card.span.start, card.span.end],
      'range',
    );
    await closeEditor();
  });

  test('its picture is an SVG image with words beside it, and only "Size this rail" may run from it', async () => {
    const { document } = await openFixture('rails.yaml');
    const markdown = markdownOf(await hoverAt(document, rangeOf(document, 'vlamp').start));
    const image = /!\[(.+?)\]\(data:image\/svg\+xml;base64,([A-Za-z0-9+/=]+)\|width=\d+,height=\d+\)/.exec(
      markdown.value,
    );
    ok(image, 'there is an image with an alternative text');
    ok(atob(image[2]!).startsWith('<svg'), 'the image is SVG');
    equal(markdown.supportHtml ?? false, false, 'HTML');
    ok(markdown.value.includes('(command:railLedger.sizeRail?'), 'the size command is offered');
    await closeEditor();
  });
}
