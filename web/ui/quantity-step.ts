/** One press of an arrow key, by unit: a change that a person can see the effect of. */
const steps: Record<string, number> = {
  mm: 0.1,
  µm: 1,
  m: 100,
  '°C': 1,
  K: 1,
  W: 0.05,
  V: 0.1,
  A: 0.01,
  Ω: 1,
  'K/W': 1,
  'W/K': 0.01,
  'W/(m·K)': 0.1,
  'W/(m²·K)': 1,
  'm/s': 0.1,
  '°': 1,
  '%': 1,
};

/** Value after `count` steps, kept inside the range and free of the dust of binary fractions. */
export function stepped(value: number, count: number, unit: string, minimum: number, maximum: number): number {
  const step = steps[unit] ?? 0.05;
  const next = Number((value + count * step).toPrecision(12));
  return Math.min(maximum, Math.max(minimum, next));
}
