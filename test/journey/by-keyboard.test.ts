import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { demoPassword, openBrowser, openPage } from './browser.ts';
import { press, tabTo, typeInto } from './keyboard.ts';
import { readPdf } from './read-pdf.ts';

let browser: Browser;
beforeAll(async () => {
  browser = await openBrowser();
});
afterAll(() => browser.close());

async function signIn(page: Page, name: string): Promise<void> {
  await page.goto('/sign-in');
  await page.getByRole('button', { name: 'Sign in' }).waitFor();
  await typeInto(page, /^E-mail/, `${name}@brackwater.example`);
  await typeInto(page, /^Password/, demoPassword);
  await press(page, 'Enter');
  await page.waitForURL('**/assemblies');
  await page.getByRole('heading', { name: 'Assemblies' }).waitFor();
}

/** To the board: the canvas is one stop of the Tab key. */
const toCanvas = (page: Page) => tabTo(page, /^Board canvas/);

test('three roles, by keyboard alone – from the first pour – to the issued record', async () => {
  const { page } = await openPage(browser);
  await signIn(page, 'ines');
  await tabTo(page, /^New assembly/i);
  await press(page, 'Enter');
  await page.getByRole('dialog').waitFor();
  await page.keyboard.type('PCA-0902');
  await typeInto(page, /^Title/, 'Gate sensor supply');
  await press(page, 'Enter');
  await page.waitForURL('**/sketch*');
  await page.locator('#board-canvas').waitFor();
  const address = new URL(page.url()).pathname.replace(/\/sketch$/, '');

  // The pour: from a corner left below the middle to one right above it.
  await toCanvas(page);
  await press(page, 'p');
  await toCanvasAgain(page);
  await press(page, 'Shift+ArrowLeft', 3);
  await press(page, 'Shift+ArrowDown', 2);
  await press(page, 'Enter');
  await press(page, 'Shift+ArrowRight', 6);
  await press(page, 'Shift+ArrowUp', 5);
  await press(page, 'Enter');

  await press(page, 'u');
  await page.getByRole('dialog').waitFor();
  await page.keyboard.type('QV50-SN');
  await tabTo(page, /QV50-SN/);
  await press(page, 'Enter');
  await toCanvasAgain(page);
  await press(page, 'Shift+ArrowLeft', 3);
  await press(page, 'Shift+ArrowDown', 2);
  await press(page, 'Enter');
  await page.getByText(/^U1/).first().waitFor();

  await page.evaluate(() => document.body.focus());
  await tabTo(page, /^Conditions$/, true);
  await press(page, 'Enter');
  await page.waitForURL('**/conditions*');
  await page.getByRole('button', { name: 'Add supply' }).waitFor();
  await tabTo(page, /^Add supply/);
  await press(page, 'Enter');
  for (const [label, value] of [
    ['Highest', '12'],
    ['Nominal', '9'],
    ['Lowest', '6.5'],
  ] as const) {
    await typeInto(page, new RegExp(`^${label}`), value);
    await press(page, 'Enter');
    await page.keyboard.press('Shift+Tab');
    await page.keyboard.press('Shift+Tab');
    await page.keyboard.press('Shift+Tab');
  }
  await tabTo(page, /^Fed from/);
  await page.keyboard.type('Supply VIN');
  await tabTo(page, /^U1/);
  await page.keyboard.type('0.1');
  await press(page, 'Enter');
  await page.getByText(/^Saved/).waitFor();

  await tabTo(page, /^Results$/);
  await press(page, 'Enter');
  await page.waitForURL('**/results*');
  await page.getByRole('button', { name: 'Run check' }).waitFor();
  await tabTo(page, /^Run check/);
  await press(page, 'Enter');
  await page.getByRole('heading', { name: 'Junctions by condition' }).waitFor({ timeout: 120_000 });
  await tabTo(page, /^Review$/);
  await press(page, 'Enter');
  await page.getByRole('button', { name: /Submit PCA-0902 A/ }).waitFor();
  await typeInto(page, /^Why this may stay: Only one/, 'One corner only.');
  await tabTo(page, /^Submit PCA-0902 A/);
  await press(page, 'Enter');
  await page.getByText('waits for a thermal reviewer', { exact: false }).first().waitFor();

  for (const [name, word, done] of [
    ['tobias', 'Clear', 'waits for a quality engineer'],
    ['marit', 'Issue', 'issued and frozen'],
  ] as const) {
    const next = await openPage(browser);
    await signIn(next.page, name);
    await next.page.goto(`${address}/review`);
    await next.page.getByRole('button', { name: new RegExp(`${word} PCA-0902 A`) }).waitFor();
    await typeInto(next.page, /^Your password/, demoPassword);
    await tabTo(next.page, new RegExp(`^${word} PCA-0902 A`));
    await press(next.page, 'Enter');
    await next.page.getByText(done, { exact: false }).first().waitFor();
    if (name !== 'marit') continue;
    await tabTo(next.page, /^Record$/);
    await press(next.page, 'Enter');
    await next.page.getByRole('link', { name: /PDF, Letter/ }).waitFor();
    await tabTo(next.page, /PDF, Letter/);
    const [download] = await Promise.all([next.page.waitForEvent('download'), press(next.page, 'Enter')]);
    const text = await readPdf(download);
    expect(text).toContain('PCA-0902');
    expect(text).not.toContain('Not issued');
  }
});

async function toCanvasAgain(page: Page): Promise<void> {
  const isThere = await page.evaluate(() => document.activeElement?.id === 'board-canvas');
  if (!isThere) await toCanvas(page);
}
