/**
 * The README's picture: the card of a pump rail over the board that it is about.
 */
import { readFileSync } from 'node:fs';
import { hover, launch, openBoard, placeOf, setTheme, waitForSquiggles } from './page.mjs';

/** What the picture keeps around the card: the code below it that says what the rail is. */
const linesBelow = 9;
const margin = 12;

/**
 * @param {{ program: string, profile: string, open: (file: string, line?: number) => string, board: string,
 *   core: typeof import('../../../core/index'), file: string }} options `board` is the path of the board's file on disk
 */
export async function drawPicture({ program, profile, open, board, core, file }) {
  const text = readFileSync(board, 'utf8');
  const analysis = core.analyse(text, { file: 'rails.yaml' });
  const rails = core.pumpRails(analysis);
  const rail = rails.find(({ span }) => core.hoverCard(analysis, span.start)?.state === 'bad') ?? rails[0];
  if (rail === undefined) throw new Error('the board has no rail that a charge pump feeds');
  const line = text.slice(0, rail.span.start).split('\n').length;
  const { context, page } = await launch({ program, profile, width: 1040, height: 1400, scale: 1.5 });
  try {
    await openBoard(page, open('rails.yaml', line));
    await waitForSquiggles(page);
    await setTheme(page, 'Dark Modern');
    await page.keyboard.press('Control+b');
    const card = await hover(page, `${rail.name}:`, /Size this rail/);
    const name = await placeOf(page, `${rail.name}:`);
    const shape = await card.boundingBox();
    if (shape === null) throw new Error('the card is not on the screen');
    const top = Math.min(shape.y, name.y) - margin;
    const bottom = Math.max(shape.y + shape.height, name.y + linesBelow * name.height * 1.2) + margin;
    await page.screenshot({
      path: file,
      clip: { x: 48, y: top, width: shape.x + shape.width - 48, height: bottom - top },
    });
  } finally {
    await context.close();
  }
}
