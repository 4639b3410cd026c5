import type { Page } from 'playwright-core';

/** Words of the element that has the focus: its label, its name, or its text. */
function focusedWords(page: Page): Promise<string> {
  return page.evaluate(() => {
    const element = document.activeElement;
    if (!element || element === document.body) return '';
    const labels =
      element instanceof HTMLInputElement ||
      element instanceof HTMLSelectElement ||
      element instanceof HTMLTextAreaElement;
    const label = labels ? [...(element.labels ?? [])].map((one) => one.textContent).join(' ') : '';
    return (element.getAttribute('aria-label') ?? (label || element.textContent) ?? '').replace(/\s+/g, ' ').trim();
  });
}

/**
 * Presses Tab until the focus stands on what these words name, as a person without a pointer would.
 * @throws Error after 250 presses, with what was met last
 */
export async function tabTo(page: Page, words: RegExp, back = false): Promise<void> {
  const met: string[] = [];
  for (let presses = 0; presses < 250; presses++) {
    await page.keyboard.press(back ? 'Shift+Tab' : 'Tab');
    const now = await focusedWords(page);
    if (words.test(now)) return;
    met.push(now.slice(0, 40));
  }
  throw new Error(`Tab never reached ${words}; the last were ${met.slice(-12).join(' | ')}`);
}

/** Moves to a field and types into it in place of what it holds; Enter commits. */
export async function typeInto(page: Page, words: RegExp, text: string): Promise<void> {
  await tabTo(page, words);
  await page.keyboard.press('Control+A');
  await page.keyboard.type(text);
}

export async function press(page: Page, key: string, times = 1): Promise<void> {
  for (let count = 0; count < times; count++) await page.keyboard.press(key);
}
