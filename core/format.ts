/** Shown in place of a value that is not there. */
export const missing = '–';
const minus = '\u2212';
const noBreakSpace = '\u00a0';

/** Decimals that a unit is printed with: as many as the calculation can honestly carry. */
const decimals: Record<string, number> = {
  '°C': 1,
  K: 1,
  W: 2,
  A: 3,
  V: 2,
  'K/W': 1,
  'W/K': 2,
  'W/(m·K)': 2,
  'W/(m²·K)': 1,
  mm: 2,
  µm: 0,
  m: 0,
  'm/s': 1,
  Ω: 1,
  '%': 0,
  '°': 0,
};

/**
 * Number with a point and a true minus sign, e.g. "−11.0"; "–" for null and for what is not finite.
 * @param digits decimals, 0 to 20
 */
export function formatNumber(value: number | null | undefined, digits: number): string {
  if (value === null || value === undefined || !Number.isFinite(value)) return missing;
  const text = value.toFixed(digits);
  const isZero = Number(text) === 0;
  return isZero ? text.replace('-', '') : text.replace('-', minus);
}

/**
 * Number and unit joined by a no-break space ("121.0 °C"); "–" for null.
 * Decimals follow the unit unless `digits` is given.
 */
export function formatQuantity(value: number | null | undefined, unit: string, digits?: number): string {
  const text = formatNumber(value, digits ?? decimals[unit] ?? 2);
  if (text === missing || unit === '') return text;
  return unit === '°' ? text + unit : text + noBreakSpace + unit;
}

/** As `formatQuantity`, with a sign in front of a rise: "+3.2 K". */
export function formatChange(value: number | null | undefined, unit: string, digits?: number): string {
  const text = formatQuantity(value, unit, digits);
  return text === missing || text.startsWith(minus) || Number.parseFloat(text) === 0 ? text : `+${text}`;
}

/** Ratio from 0 to 1 as a percentage: 0.834 → "83 %". */
export function formatRatio(value: number | null | undefined, digits = 0): string {
  return formatQuantity(value === null || value === undefined ? null : value * 100, '%', digits);
}

/** Number with as many digits as it has, at most `significant`, for tables of given values: 0.2, 35, 0.0004. */
export function formatGiven(value: number | null | undefined, unit = '', significant = 6): string {
  if (value === null || value === undefined || !Number.isFinite(value)) return missing;
  const text = String(Number(value.toPrecision(significant))).replace('-', minus);
  return unit === '' ? text : text + (unit === '°' ? '' : noBreakSpace) + unit;
}
