import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect, test } from 'vitest';

const css = readFileSync(join(import.meta.dirname, '../../web/theme.css'), 'utf8');

function tokens(selector: string): Record<string, string> {
  const block = css.slice(css.indexOf(`\n${selector} {`)).split('}')[0] ?? '';
  return Object.fromEntries([...block.matchAll(/--([\w-]+): (#[0-9a-f]{6});/g)].map((match) => [match[1], match[2]]));
}

/** WCAG 2.2, relative luminance and contrast ratio. */
function luminance(colour: string): number {
  const [red = 0, green = 0, blue = 0] = [1, 3, 5].map((start) => {
    const part = Number.parseInt(colour.slice(start, start + 2), 16) / 255;
    return part <= 0.04045 ? part / 12.92 : ((part + 0.055) / 1.055) ** 2.4;
  });
  return 0.2126 * red + 0.7152 * green + 0.0722 * blue;
}

function contrast(one: string, other: string): number {
  const [low = 0, high = 0] = [luminance(one), luminance(other)].sort((a, b) => a - b);
  return (high + 0.05) / (low + 0.05);
}

const themes = [
  ['light', ':root'],
  ['graphite', "[data-theme='graphite']"],
] as const;

test.each(themes)('theme %s – text on paper and panel – at least 4.5 to 1 (WCAG 1.4.3)', (_, selector) => {
  const colour = tokens(selector);
  for (const text of ['ink', 'ink-soft', 'copper', 'within', 'close', 'over', 'unknown']) {
    for (const ground of ['paper', 'panel']) {
      expect(contrast(colour[text] ?? '', colour[ground] ?? ''), `${text} on ${ground}`).toBeGreaterThanOrEqual(4.5);
    }
  }
  expect(contrast(colour['on-copper'] ?? '', colour.copper ?? '')).toBeGreaterThanOrEqual(4.5);
  expect(contrast(colour.ink ?? '', colour['copper-soft'] ?? '')).toBeGreaterThanOrEqual(4.5);
});

test.each(themes)('theme %s – edges of controls and the focus ring – at least 3 to 1 (WCAG 1.4.11)', (_, selector) => {
  const colour = tokens(selector);
  for (const edge of ['line-strong', 'focus']) {
    for (const ground of ['paper', 'panel']) {
      expect(contrast(colour[edge] ?? '', colour[ground] ?? ''), `${edge} on ${ground}`).toBeGreaterThanOrEqual(3);
    }
  }
});
