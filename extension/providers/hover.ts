/**
 * Hover: the core's card about the thing under the pointer, in the colours of the present theme.
 */
import * as vscode from 'vscode';
import type { Analyses } from '../analyses';
import { sizeRailCommand } from '../commands/names';
import { toRange, toTheme } from '../convert';
import { cardMarkdown, commandLink } from '../markdown';

export function hoverProvider(analyses: Analyses): vscode.HoverProvider {
  return {
    async provideHover(document, position, cancellation) {
      const analysis = await analyses.of(document);
      if (analysis === undefined || cancellation.isCancellationRequested) return undefined;
      const core = await analyses.loadCore();
      const card = core.hoverCard(analysis, document.offsetAt(position));
      if (card === undefined) return undefined;
      const link =
        card.sizable === undefined
          ? undefined
          : {
              label: 'Size this rail',
              target: commandLink(sizeRailCommand, [card.sizable, { uri: document.uri.toString() }]),
            };
      const theme = toTheme(vscode.window.activeColorTheme.kind);
      const markdown = new vscode.MarkdownString(cardMarkdown(card, theme, link), true);
      // Only our own command may run from here; anything else in the text stays text.
      markdown.isTrusted = { enabledCommands: [sizeRailCommand] };
      return new vscode.Hover(markdown, toRange(document, card.span));
    },
  };
}
