import { convertTyped } from './typed-units.ts';

export type ReadQuantity = { value: number } | { error: string };

const pattern = /^([+-]?(?:\d[\d.,]*|[.,]\d+)(?:e[+-]?\d{1,3})?)(.*)$/i;

/**
 * Reads what a person typed into a number field: decimal point or comma, spaces between thousands, a true minus,
 * a unit of the same kind as the field's ("35um", "1,4 mil", "130 mA"), and products and quotients of plain figures
 * before the unit ("2*3.5", "3 × 0.4in", "25/4 mm").
 */
export function readQuantity(text: string, unit: string): ReadQuantity {
  const parts = text.split(/([*×]|\/(?=\s*[\d.,]))/);
  if (parts.length === 1) return readSingle(text, unit);
  let product = 1;
  for (let index = 0; index < parts.length - 1; index += 2) {
    const factor = readSingle(parts[index] ?? '', '');
    if ('error' in factor) return { error: `“${text.trim()}” cannot be worked out. ${factor.error}` };
    product = combined(product, parts[index - 1], factor.value);
  }
  // The unit stands at the end; it is read with the last figure and turned into the field's unit once, for the whole.
  const last = pattern.exec((parts.at(-1) ?? '').trim());
  const figure = readSingle(last?.[1] ?? '', '');
  if (!last || 'error' in figure) return { error: `“${text.trim()}” cannot be worked out: a figure is missing.` };
  const whole = combined(product, parts.at(-2), figure.value);
  if (!Number.isFinite(whole)) return { error: `“${text.trim()}” is not a number that can be stored.` };
  // Twelve digits: 3 × 0.1 is to be 0.3.
  return readSingle(`${Number(whole.toPrecision(12))}${last[2] ?? ''}`, unit);
}

function combined(before: number, sign: string | undefined, value: number): number {
  return sign === '/' ? before / value : before * value;
}

function readSingle(text: string, unit: string): ReadQuantity {
  const trimmed = text
    .trim()
    .replace(/[\u2212\u2013]/g, '-')
    .replace(/(?<=\d)[\s\u00a0\u2009\u202f'’](?=\d)/g, '')
    .replace(/^([+-])\s+/, '$1');
  const match = pattern.exec(trimmed);
  if (!match) return { error: `“${text.trim()}” is not a number.` };
  const figures = match[1] ?? '';
  const ambiguous = ambiguousThousands(figures);
  if (ambiguous) return { error: ambiguous };
  const plain = plainFigures(figures);
  if (plain === null) return { error: `“${figures}” is not a number.` };
  const value = Number(plain);
  if (!Number.isFinite(value)) return { error: `“${figures}” is not a number that can be stored.` };
  const typedUnit = (match[2] ?? '').trim();
  const converted = convertTyped(value, typedUnit, unit);
  if (converted === null) {
    return { error: `“${typedUnit}” is not a unit for this field${unit ? `, which is in ${unit}` : ''}.` };
  }
  return { value: converted };
}

/** "1,000" is one to some and a thousand to others; asking beats guessing. "0,125" and "1,5" are clear. */
function ambiguousThousands(figures: string): string | null {
  const match = /^[+-]?([1-9]\d{0,2}),(\d{3})$/.exec(figures);
  if (!match) return null;
  return `“${figures}” can be read in two ways. Write ${match[1]}.${match[2]} or ${match[1]}${match[2]}.`;
}

const simple = /^([+-]?\d*)(?:[.,](\d*))?(e[+-]?\d+)?$/i;
const grouped = /^([+-]?\d{1,3})([.,])(\d{3}(?:\2\d{3})*)(?:(?!\2)[.,](\d*))?(e[+-]?\d+)?$/i;

/** Figures as the machine reads them; one point or comma is the decimal sign, more part thousands in threes. */
function plainFigures(figures: string): string | null {
  const one = simple.exec(figures);
  if (one) return `${one[1] ?? ''}.${one[2] ?? ''}${one[3] ?? ''}`;
  const many = grouped.exec(figures);
  if (!many) return null;
  return `${many[1] ?? ''}${(many[3] ?? '').replace(/[.,]/g, '')}.${many[4] ?? ''}${many[5] ?? ''}`;
}
