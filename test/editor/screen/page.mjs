/**
 * The workbench's page as a person uses it: eyes for squiggles and hovers, hands for the mouse and the palette.
 */
import { chromium } from 'playwright-core';

/** @typedef {import('playwright-core').Page} Page */

/** @param {{ program: string, profile: string, width?: number, height?: number, scale?: number }} options */
export async function launch({ program, profile, width = 1280, height = 860, scale = 1 }) {
  const context = await chromium.launchPersistentContext(profile, {
    executablePath: program,
    headless: true,
    viewport: { width, height },
    deviceScaleFactor: scale,
    args: [
      '--disable-gpu',
      '--disable-quic',
      '--no-first-run',
      '--disable-background-networking',
      '--disable-component-update',
      '--disable-sync',
    ],
  });
  const page = context.pages()[0] ?? (await context.newPage());
  page.setDefaultTimeout(30_000);
  return { context, page };
}

/** @param {Page} page */
export async function openBoard(page, address) {
  await page.goto(address);
  await page.locator('.monaco-editor .view-line').first().waitFor({ timeout: 60_000 });
  // Keeps the pointer where no hover comes by itself.
  await page.mouse.move(5, 5);
}

/** @param {Page} page */
export async function waitForSquiggles(page) {
  await page.locator('.squiggly-error, .squiggly-warning').first().waitFor();
}

/** The first line on the screen that holds the words, once it is as wanted. @param {Page} page */
export async function lineWith(page, words, wanted = (_line) => true) {
  for (const deadline = Date.now() + 15_000; Date.now() < deadline; await page.waitForTimeout(100)) {
    const line = (await visibleLines(page)).find((text) => text.includes(words));
    if (line !== undefined && wanted(line)) return line;
  }
  throw new Error(`no line with "${words}" as expected on the screen`);
}

/** The text of the lines on the screen, top to bottom. @param {Page} page @returns {Promise<string[]>} */
function visibleLines(page) {
  return page.evaluate(() =>
    [...document.querySelectorAll('.part.editor .view-lines .view-line')]
      .map((line) => ({ top: line.getBoundingClientRect().top, text: line.textContent ?? '' }))
      .sort((a, b) => a.top - b.top)
      .map(({ text }) => text.replace(/\u00a0/g, ' ')),
  );
}

/** The screen rectangle of the first place of a piece of text in the editor. @param {Page} page */
export async function placeOf(page, text) {
  const place = await page.evaluate((wanted) => {
    for (const line of document.querySelectorAll('.part.editor .view-lines .view-line')) {
      const walker = document.createTreeWalker(line, NodeFilter.SHOW_TEXT);
      const nodes = [];
      while (walker.nextNode()) nodes.push(walker.currentNode);
      const whole = nodes
        .map((node) => node.nodeValue)
        .join('')
        .replace(/\u00a0/g, ' ');
      const start = whole.indexOf(wanted);
      if (start < 0) continue;
      const range = document.createRange();
      let passed = 0;
      for (const node of nodes) {
        const length = node.nodeValue.length;
        if (start >= passed && start < passed + length) range.setStart(node, start - passed);
        const end = start + wanted.length;
        if (end > passed && end <= passed + length) range.setEnd(node, end - passed);
        passed += length;
      }
      const { x, y, width, height } = range.getBoundingClientRect();
      return { x, y, width, height };
    }
    return undefined;
  }, text);
  if (place === undefined) throw new Error(`"${text}" is not on the screen`);
  return place;
}

/** Rests the pointer on a piece of text until a hover with the words comes. @param {Page} page */
export async function hover(page, text, words) {
  const { x, y, width, height } = await placeOf(page, text);
  await page.mouse.move(x + width / 2, y + height / 2);
  const card = page.locator('.monaco-hover:visible').filter({ hasText: words }).first();
  await card.waitFor();
  // The picture and the last layout come one frame later.
  await page.waitForFunction(() =>
    [...document.querySelectorAll('.monaco-hover img')].every(
      (image) => image.complete && image.naturalWidth > 0,
    ),
  );
  await page.waitForTimeout(300);
  return card;
}

/** @param {Page} page */
export async function leaveHover(page) {
  await page.keyboard.press('Escape');
  await page.mouse.move(5, 5);
  await page.locator('.monaco-hover:visible').first().waitFor({ state: 'hidden' });
}

/** What the card shows, blanks of any kind as one. */
export async function hoverText(card) {
  // Rendered text: with the bare text content the table's cells would run into each other.
  // biome-ignore lint/performance/useDomNodeTextContent: the line breaks between cells are wanted
  return (await card.innerText()).replace(/\s+/g, ' ');
}

/** What the palette lists for some words. @param {Page} page */
export async function paletteEntries(page, words) {
  await page.keyboard.press('F1');
  const input = page.locator('.quick-input-widget input');
  await input.waitFor();
  await input.fill(`>${words}`);
  await page.waitForTimeout(500);
  return page.locator('.quick-input-list .monaco-list-row').allTextContents();
}

/** Runs a command as a person does, by its full title. @param {Page} page */
export async function runCommand(page, title) {
  await paletteEntries(page, title);
  await page.locator('.quick-input-list .monaco-list-row', { hasText: title }).first().click();
}

/** @param {Page} page */
export async function dismiss(page) {
  await page.keyboard.press('Escape');
  await page.locator('.quick-input-widget').waitFor({ state: 'hidden' });
}

/** @param {Page} page */
export async function setTheme(page, label) {
  await page.keyboard.press('Control+k');
  await page.keyboard.press('Control+t');
  const input = page.locator('.quick-input-widget input');
  await page.locator('.quick-input-list .monaco-list-row').first().waitFor();
  await input.fill(label);
  await page.waitForTimeout(500);
  await page.keyboard.press('Enter');
  await page.locator('.quick-input-widget').waitFor({ state: 'hidden' });
  await page.waitForTimeout(500);
}
