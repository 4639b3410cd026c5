import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { formatQuantity } from '#core/format.ts';
import type { ConditionResult } from '#core/result/result.ts';
import { methodVersion } from '#core/thermal/method.ts';
import { demoPassword, openBrowser, openPage } from './browser.ts';

let browser: Browser;
beforeAll(async () => {
  browser = await openBrowser();
});
afterAll(() => browser.close());

test('a sketch settled in the browser – its junctions – are those of the server’s check to the last printed digit', async () => {
  const { page, complaints } = await openPage(browser);
  await page.goto('/sign-in');
  await page.getByLabel('E-mail').fill('ines@brackwater.example');
  await page.getByLabel('Password', { exact: true }).fill(demoPassword);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.waitForURL('**/assemblies');
  const list: { items: { number: string; revisions: { id: string; letter: string }[] }[] } = await page.evaluate(
    async () => (await fetch('/api/v1/assemblies')).json(),
  );
  const revision = list.items
    .find(({ number }) => number === 'PCA-0617')!
    .revisions.find(({ letter }) => letter === 'A')!.id;
  const stored: { result: { method: string; conditions: ConditionResult[] } } = await page.evaluate(
    async (id) => (await fetch(`/api/v1/revisions/${id}/result`)).json(),
    revision,
  );
  expect(stored.result.method).toBe(methodVersion);

  await page.goto(`/revisions/${revision}/sketch`);
  const name = await page.getByLabel('Condition', { exact: true }).inputValue();
  const { regulators } = stored.result.conditions.find((condition) => condition.name === name)!;
  expect(regulators.length).toBeGreaterThan(1);
  const strip = page.getByRole('region', { name: 'Rise ladders' });
  for (const { ref, junctionC } of regulators) {
    const plate = strip.getByRole('button').filter({ hasText: ref });
    await plate.getByText(formatQuantity(junctionC, '°C'), { exact: true }).waitFor();
  }
  expect(complaints).toEqual([]);
});
