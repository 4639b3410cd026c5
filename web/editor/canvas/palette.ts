/** Colours of the canvas in one theme. Heat colours are not in it: they are the same in both. */
export type Palette = {
  table: string;
  laminate: string;
  laminateEdge: string;
  ink: string;
  inkSoft: string;
  panel: string;
  grid: string;
  gridStrong: string;
  /** Copper from the top layer to the bottom one, told apart by lightness (and by hatch). */
  copper: readonly string[];
  land: string;
  body: string;
  bodyEdge: string;
  accent: string;
  /** Second tone beside a line, so that it shows on every ground. */
  halo: string;
  verdict: { within: string; close: string; over: string; 'not evaluated': string };
};

export const paperPalette: Palette = {
  table: '#ece7dd',
  laminate: '#f6f3ea',
  laminateEdge: '#3c3934',
  ink: '#22201d',
  inkSoft: '#5c574f',
  panel: '#fdfbf7',
  grid: 'rgb(60 57 52 / 0.10)',
  gridStrong: 'rgb(60 57 52 / 0.22)',
  copper: ['#d99a74', '#c27d54', '#a4633c', '#844a29'],
  land: '#8f4a24',
  body: 'rgb(54 52 49 / 0.86)',
  bodyEdge: '#22201d',
  accent: '#a94f28',
  halo: '#ffffff',
  verdict: { within: '#126b66', close: '#855c00', over: '#872561', 'not evaluated': '#67625a' },
};

export const graphitePalette: Palette = {
  table: '#151617',
  laminate: '#2b2e31',
  laminateEdge: '#c9c4ba',
  ink: '#ece8e1',
  inkSoft: '#b3ada3',
  panel: '#242629',
  grid: 'rgb(236 232 225 / 0.07)',
  gridStrong: 'rgb(236 232 225 / 0.16)',
  copper: ['#e0a27c', '#bf8059', '#9b6340', '#7a4a2c'],
  land: '#f0bd9b',
  body: 'rgb(12 13 14 / 0.86)',
  bodyEdge: '#8f8b84',
  accent: '#e29468',
  halo: '#0c0d0e',
  verdict: { within: '#5fc4ba', close: '#e2b34e', over: '#ea93c6', 'not evaluated': '#a8a49c' },
};

/** Tone of a copper layer by its place from the top. */
export function copperTone(palette: Palette, index: number, count: number): string {
  const last = palette.copper.length - 1;
  const place = count <= 1 ? 0 : Math.round((index / (count - 1)) * last);
  return palette.copper[place] ?? palette.accent;
}
