import AxeBuilder from '@axe-core/playwright';
import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { demoPassword, openBrowser, openPage } from './browser.ts';

let browser: Browser;
beforeAll(async () => {
  browser = await openBrowser();
});
afterAll(() => browser.close());

test.each(['light', 'dark'] as const)(
  'every page of a revision, %s – for axe – has no violation',
  async (colorScheme) => {
    const { page } = await openPage(browser);
    await page.emulateMedia({ colorScheme, reducedMotion: 'reduce' });
    await page.goto('/sign-in');
    await page.getByLabel('E-mail').fill('ines@brackwater.example');
    await page.getByLabel('Password', { exact: true }).fill(demoPassword);
    await page.getByRole('button', { name: 'Sign in' }).click();
    await page.waitForURL('**/assemblies');
    const list: { items: { number: string; revisions: { id: string; letter: string }[] }[] } = await page.evaluate(
      async () => (await fetch('/api/v1/assemblies')).json(),
    );
    const main = list.items.find(({ number }) => number === 'PCA-0617')!;
    const revision = main.revisions.find(({ letter }) => letter === 'A')!.id;
    const places = [
      '/assemblies',
      '/library',
      '/method',
      '/team',
      ...['sketch', 'conditions', 'rails', 'results', 'review', 'record'].map(
        (view) => `/revisions/${revision}/${view}`,
      ),
    ];
    for (const place of places) {
      await page.goto(place);
      await page.getByRole('main').waitFor();
      await page.waitForLoadState('networkidle');
      const { violations } = await new AxeBuilder({ page }).analyze();
      expect(
        violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ target }) => target.join(' ')).join(', ')}`),
        place,
      ).toEqual([]);
    }
  },
);
