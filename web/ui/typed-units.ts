/** How a typed unit becomes the unit of a field: value × factor + offset. */
type Conversion = { factor: number; offset?: number };

/** 1 oz/ft² of copper: 28.3495 g over 929.03 cm² at 8.96 g/cm³ gives 34.1 µm; the trade and IPC-4562 call it 34.3 µm. */
const ounceUm = 34.3;
const inchMm = 25.4;
const footM = 0.3048;

const lengthInMm: Record<string, number> = {
  nm: 1e-6,
  um: 1e-3,
  mm: 1,
  cm: 10,
  m: 1000,
  mil: inchMm / 1000,
  in: inchMm,
};

function scaled(factors: Record<string, number>, divisor = 1): Record<string, Conversion> {
  return Object.fromEntries(Object.entries(factors).map(([unit, factor]) => [unit, { factor: factor / divisor }]));
}

/** By the unit of the field, then by the typed unit in its plain spelling (see `plainUnit`). */
const conversions: Record<string, Record<string, Conversion>> = {
  mm: scaled(lengthInMm),
  um: { ...scaled(lengthInMm, 1e-3), oz: { factor: ounceUm } },
  m: { ...scaled(lengthInMm, 1000), km: { factor: 1000 }, ft: { factor: footM } },
  'm/s': scaled({ 'm/s': 1, 'cm/s': 0.01, 'km/h': 1 / 3.6, 'ft/min': footM / 60, lfm: footM / 60 }),
  w: scaled({ w: 1, mw: 1e-3, uw: 1e-6, kw: 1e3 }),
  v: scaled({ v: 1, mv: 1e-3, uv: 1e-6, kv: 1e3 }),
  a: scaled({ a: 1, ma: 1e-3, ua: 1e-6, ka: 1e3 }),
  ohm: scaled({ ohm: 1, mohm: 1e-3, kohm: 1e3, k: 1e3 }),
  c: {
    c: { factor: 1 },
    degc: { factor: 1 },
    f: { factor: 5 / 9, offset: -160 / 9 },
    k: { factor: 1, offset: -273.15 },
  },
  // A rise of 1 °F is 5/9 K; the 32 °F between the zero points belong to temperatures only.
  k: { k: { factor: 1 }, mk: { factor: 1e-3 }, c: { factor: 1 }, f: { factor: 5 / 9 } },
  'k/w': scaled({ 'k/w': 1, 'c/w': 1, 'mk/w': 1e-3, 'k/mw': 1e3, 'c/mw': 1e3 }),
  'w/k': scaled({ 'w/k': 1, 'w/c': 1, 'mw/k': 1e-3 }),
  'w/mk': scaled({ 'w/mk': 1 }),
  'w/m2k': scaled({ 'w/m2k': 1 }),
  deg: scaled({ deg: 1, rad: 180 / Math.PI }),
  '%': scaled({ '%': 1 }),
  '': scaled({ '': 1, '%': 0.01 }),
};

/** One spelling for all: "µm", "μm", "um" → "um"; "°C" → "c"; "W/(m·K)" → "w/mk"; Ω → "ohm". */
function plainUnit(unit: string): string {
  const text = unit
    .replace(/[µμ]/g, 'u')
    .replace(/[ΩΩ]/g, 'ohm')
    .replace(/[²]/g, '2')
    .replace(/["″]/g, 'in')
    .replace(/[\s()·*^]/g, '');
  if (text === '°') return 'deg';
  return text.replace(/°/g, '').toLowerCase();
}

/**
 * Value in the unit of the field.
 * @returns null when the typed unit is not of the same kind
 */
export function convertTyped(value: number, typedUnit: string, fieldUnit: string): number | null {
  const typed = plainUnit(typedUnit);
  const wanted = plainUnit(fieldUnit);
  if (typed === '' || typed === wanted) return value;
  const conversion = conversions[wanted]?.[typed];
  if (!conversion) return null;
  // Twelve digits: a unit must not leave the dust of binary fractions behind (1.6 mil → 0.04064 mm).
  return Number((value * conversion.factor + (conversion.offset ?? 0)).toPrecision(12));
}
