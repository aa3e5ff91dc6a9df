/**
 * The pass by eye: what a person sees and does in the workbench's page, and a picture of each for the record.
 */
import { join } from 'node:path';
import {
  dismiss,
  hover,
  hoverText,
  launch,
  leaveHover,
  lineWith,
  openBoard,
  paletteEntries,
  placeOf,
  runCommand,
  setTheme,
  waitForSquiggles,
} from './page.mjs';

const themes = [
  { label: 'Light Modern', file: 'light' },
  { label: 'Dark Modern', file: 'dark' },
  { label: 'Dark High Contrast', file: 'high-contrast' },
  { label: 'Light High Contrast', file: 'high-contrast-light' },
];
const sizeTitle = 'Rail Ledger: Size this rail';
const waysTitle = 'Rail Ledger: Ways to make this rail';

/**
 * @param {{ program: string, profile: string, open: (file: string) => string, pictures: string,
 *   check: (name: string, body: () => Promise<void>) => Promise<void> }} options
 */
export async function screenPass({ program, profile, open, pictures, check }) {
  const { context, page } = await launch({ program, profile });
  const picture = (name) => page.screenshot({ path: join(pictures, `${name}.png`) });
  /** A check that leaves a picture of what it saw when it fails. */
  const see = (name, body) =>
    check(name, async () => {
      try {
        await body();
      } catch (error) {
        await picture(`failed-${name.replace(/[^a-z]+/gi, '-')}`);
        throw error;
      }
    });
  try {
    await openBoard(page, open('rails.yaml'));
    await see('squiggles are drawn', () => waitForSquiggles(page));

    for (const { label, file } of themes) {
      await see(`the card is drawn in the theme ${label}`, async () => {
        await setTheme(page, label);
        const text = await hoverText(await hover(page, 'vlamp', /Size this rail/));
        if (!/\d V\b/.test(text)) throw new Error(`no voltage in the card: ${text}`);
        await picture(`hover-${file}`);
        await leaveHover(page);
        await hover(page, '5.0..6.6 V', /rail-low/);
        await picture(`squiggle-${file}`);
        await leaveHover(page);
      });
    }

    await see('the palette sizes the rail, and one undo takes it back', async () => {
      const before = await lineWith(page, 'flying:');
      await runCommand(page, sizeTitle);
      const write = page.locator('.quick-input-list .monaco-list-row', { hasText: 'Write it into the file' });
      await write.waitFor();
      await picture('size-proposal');
      await page.keyboard.press('Enter');
      await lineWith(page, 'flying:', (line) => line !== before);
      await picture('size-written');
      await page
        .locator('.part.editor .monaco-editor')
        .first()
        .click({ position: { x: 500, y: 40 } });
      await page.keyboard.press('ControlOrMeta+z');
      await lineWith(page, 'flying:', (line) => line === before);
    });

    await see('the link in the card opens the proposal', async () => {
      const card = await hover(page, 'vlamp', /Size this rail/);
      await card.getByText('Size this rail').click();
      await page
        .locator('.quick-input-list .monaco-list-row', { hasText: 'Write it into the file' })
        .waitFor();
      await dismiss(page);
    });

    await see('the palette lists ways to make a rail, and the chosen one is written', async () => {
      await openBoard(page, open('wanted.rails.yaml'));
      const place = await placeOf(page, 'up: #');
      await page.mouse.click(place.x + 4, place.y + place.height / 2);
      await runCommand(page, waysTitle);
      const way = page.locator('.quick-input-list .monaco-list-row', { hasText: 'doubler on v5' }).first();
      await way.waitFor({ timeout: 60_000 });
      await picture('ways');
      await page.keyboard.press('Enter');
      await lineWith(page, 'pump: {');
      await picture('ways-written');
      await page.keyboard.press('ControlOrMeta+z');
      await dismiss(page);
    });

    await see('words of the file stay words in the card', async () => {
      await openBoard(page, open('marks.rails.yaml'));
      const text = await hoverText(await hover(page, 'gone', /doubler/));
      const name = '[x](command:workbench.action.quit) ~~gone~~ $(flame) <b>b</b> *a*';
      if (!text.includes(name)) throw new Error(`the rail's name is not shown as written: ${text}`);
      await picture('hover-marks');
      await leaveHover(page);
    });

    await see('the palette offers sizing on boards only', async () => {
      await openBoard(page, open('plain.yaml'));
      const entries = await paletteEntries(page, 'Rail Ledger');
      if (entries.some((entry) => entry.includes('Rail Ledger')))
        throw new Error(`listed beside a plain YAML file: ${entries.join(', ')}`);
      await dismiss(page);
    });
  } finally {
    await context.close();
  }
}
