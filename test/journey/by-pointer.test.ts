import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { demoPassword, openBrowser, openPage } from './browser.ts';
import { readPdf } from './read-pdf.ts';

let browser: Browser;
beforeAll(async () => {
  browser = await openBrowser();
});
afterAll(() => browser.close());

async function signIn(page: Page, name: string): Promise<void> {
  await page.goto('/sign-in');
  await page.getByLabel('E-mail').fill(`${name}@brackwater.example`);
  await page.getByLabel('Password', { exact: true }).fill(demoPassword);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.waitForURL('**/assemblies');
}

/** Drags on the canvas between two points given as shares of its size. */
async function drag(page: Page, from: [number, number], to: [number, number]): Promise<void> {
  const box = (await page.locator('#board-canvas').boundingBox())!;
  const at = ([x, y]: [number, number]): [number, number] => [box.x + box.width * x, box.y + box.height * y];
  await page.mouse.move(...at(from));
  await page.mouse.down();
  await page.mouse.move(...at(to), { steps: 12 });
  await page.mouse.up();
}

test('three roles, by pointer – from the first pour – to the issued record', async () => {
  const designer = await openPage(browser);
  const { page } = designer;
  await signIn(page, 'ines');
  await page.getByRole('button', { name: /new assembly/i }).click();
  await page.getByLabel('Number').fill('PCA-0901');
  await page.getByLabel('Title').fill('Gate sensor supply');
  await page
    .getByRole('dialog')
    .getByRole('button', { name: /create/i })
    .click();
  await page.waitForURL('**/sketch*');
  const address = new URL(page.url()).pathname.replace(/\/sketch$/, '');

  // The first pour, two corners by dragging.
  await page.getByRole('radio', { name: /^Pour/ }).click();
  await drag(page, [0.35, 0.35], [0.65, 0.7]);
  await page.getByRole('tab', { name: /Objects/ }).click();
  await page.getByRole('grid').getByText('Pour').first().waitFor();

  // A regulator from the library, in the middle of the pour.
  await page.getByRole('radio', { name: /^Regulator/ }).click();
  await page
    .getByRole('dialog')
    .getByRole('button', { name: /QV50-SN/ })
    .click();
  const canvas = (await page.locator('#board-canvas').boundingBox())!;
  await page.mouse.click(canvas.x + canvas.width * 0.5, canvas.y + canvas.height * 0.55);
  await page.getByRole('grid').getByText('U1').first().waitFor();

  // Rails and the load.
  await page.getByRole('link', { name: 'Conditions', exact: true }).click();
  await page.getByRole('button', { name: 'Add supply' }).click();
  const supplies = page.getByRole('region', { name: 'Supplies' });
  for (const [label, value] of [
    ['Highest', '12'],
    ['Nominal', '9'],
    ['Lowest', '6,5'],
  ] as const) {
    await supplies.getByLabel(label).fill(value);
    await supplies.getByLabel(label).press('Enter');
  }
  await page.getByRole('region', { name: 'Rails' }).getByLabel('Fed from').selectOption({ label: 'Supply VIN' });
  const load = page.getByRole('group', { name: /Load currents/ }).getByLabel('U1');
  await load.fill('0.1');
  await load.press('Enter');
  await page.getByText(/^Saved/).waitFor();

  // The check that counts.
  await page.getByRole('link', { name: 'Results', exact: true }).click();
  await page.getByRole('button', { name: 'Run check' }).click();
  await page.getByRole('heading', { name: 'Junctions by condition' }).waitFor({ timeout: 120_000 });
  expect(await page.getByRole('region', { name: 'Matrix' }).textContent()).toMatch(/Within|Close/);

  // Submission: the one warning needs its reason first.
  await page.getByRole('link', { name: 'Review', exact: true }).click();
  const submit = page.getByRole('button', { name: /Submit PCA-0901 A/ });
  expect(await submit.isDisabled()).toBe(true);
  await page.getByLabel(/Why this may stay: Only one operating condition/).fill('Bench supply, one corner only.');
  await submit.click();
  await page.getByText('waits for a thermal reviewer', { exact: false }).first().waitFor();

  const reviewer = await openPage(browser);
  await signIn(reviewer.page, 'tobias');
  await reviewer.page.goto(`${address}/review`);
  await reviewer.page.getByText('Bench supply, one corner only.', { exact: false }).first().waitFor();
  await reviewer.page
    .getByRole('form', { name: 'Clear' })
    .getByLabel(/Your password/)
    .fill(demoPassword);
  await reviewer.page.getByRole('button', { name: /Clear PCA-0901 A/ }).click();
  await reviewer.page.getByText('waits for a quality engineer', { exact: false }).first().waitFor();

  const quality = await openPage(browser);
  await signIn(quality.page, 'marit');
  await quality.page.goto(`${address}/review`);
  await quality.page
    .getByRole('form', { name: 'Issue' })
    .getByLabel(/Your password/)
    .fill(demoPassword);
  await quality.page.getByRole('button', { name: /Issue PCA-0901 A/ }).click();
  await quality.page.getByText('issued and frozen', { exact: false }).first().waitFor();
  await quality.page.getByRole('link', { name: 'Record', exact: true }).click();
  const [download] = await Promise.all([
    quality.page.waitForEvent('download'),
    quality.page.getByRole('link', { name: 'Derating record, PDF, A4' }).click(),
  ]);
  const text = await readPdf(download);
  for (const word of ['PCA-0901', 'Ines Aldous', 'Tobias Renner', 'Marit Solvang', 'U1', 'Bench supply'])
    expect(text).toContain(word);
  expect(text).not.toContain('Not issued');
  for (const { complaints } of [designer, reviewer, quality]) expect(complaints).toEqual([]);
});
