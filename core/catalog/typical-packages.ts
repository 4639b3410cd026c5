import type { PackageModel } from '#core/board/package.ts';

const source =
  'Typical compact model of the outline, common practice, no single source; replace by the data sheet’s values';

type Pads = PackageModel['lands'][number]['pads'];

/** A row of equal pads at `y`, centred on x = 0. */
const row = (count: number, pitchMm: number, y: number, sizeMm: [number, number]): Pads =>
  Array.from({ length: count }, (_, k) => ({ at: [(k - (count - 1) / 2) * pitchMm, y], sizeMm }));
/** A column of equal pads at `x`, centred on y = 0. */
const column = (count: number, pitchMm: number, x: number, sizeMm: [number, number]): Pads =>
  Array.from({ length: count }, (_, k) => ({ at: [x, (k - (count - 1) / 2) * pitchMm], sizeMm }));

const model = (
  name: string,
  bodyMm: [number, number, number],
  caseTopKPerW: number,
  lands: PackageModel['lands'],
  underBodyKPerW: number | null = null,
): PackageModel => ({ name, bodyMm, emissivity: 0.9, caseTopKPerW, underBodyKPerW, lands, psiJtKPerW: null, source });

const tab = (kPerW: number, ...pads: Pads) => ({ name: 'tab', kind: 'tab' as const, kPerW, pads });
const leads = (kPerW: number, ...pads: Pads) => ({ name: 'leads', kind: 'lead' as const, kPerW, pads });

/** Real package outlines with typical thermal models; lands in mm, resistances in K/W. */
export const typicalPackages: Readonly<Record<string, PackageModel>> = {
  'SOT-23-5': model(
    'SOT-23-5',
    [2.9, 1.6, 1.15],
    75,
    [leads(45, ...row(3, 0.95, -1.3, [0.6, 1.0]), ...row(2, 1.9, 1.3, [0.6, 1.0]))],
    1000,
  ),
  'SOT-89': model('SOT-89', [4.5, 2.5, 1.5], 60, [
    tab(16, { at: [0, 0.9], sizeMm: [1.8, 1.9] }, { at: [0, -1.1], sizeMm: [0.9, 2.2] }),
    leads(80, ...row(2, 3, -1.8, [0.8, 1.2])),
  ]),
  'SOT-223': model(
    'SOT-223',
    [6.5, 3.5, 1.6],
    40,
    [
      tab(12, { at: [0, 3.1], sizeMm: [3.5, 1.4] }),
      { name: 'mid', kind: 'lead', kPerW: 72, pads: [{ at: [0, -3.1], sizeMm: [1.2, 1.4] }] },
      { name: 'outer', kind: 'lead', kPerW: 125, pads: row(2, 4.6, -3.1, [1.2, 1.4]) },
    ],
    160,
  ),
  'TO-252': model('TO-252', [6.6, 6.1, 2.3], 50, [
    tab(3, { at: [0, 1.5], sizeMm: [5.8, 6.2] }),
    leads(100, ...row(2, 4.56, -4.8, [1.5, 2.2])),
  ]),
  'TO-263': model('TO-263', [10.2, 8.4, 4.4], 43, [
    tab(1.2, { at: [0, 1.3], sizeMm: [10.7, 8.9] }),
    leads(45, ...row(3, 2.54, -6.6, [1.2, 2.7])),
  ]),
  'SO-8': model(
    'SO-8',
    [3.9, 4.9, 1.5],
    40,
    [leads(45, ...column(4, 1.27, -2.7, [1.55, 0.6]), ...column(4, 1.27, 2.7, [1.55, 0.6]))],
    350,
  ),
  'SO-8-EP': model('SO-8 with exposed pad', [3.9, 4.9, 1.5], 50, [
    tab(6, { at: [0, 0], sizeMm: [2.3, 2.3] }),
    leads(80, ...column(4, 1.27, -2.7, [1.55, 0.6]), ...column(4, 1.27, 2.7, [1.55, 0.6])),
  ]),
  'DFN-8-3x3': model('DFN-8 3 × 3 with exposed pad', [3, 3, 0.9], 30, [
    tab(5, { at: [0, 0], sizeMm: [1.6, 2.4] }),
    leads(150, ...column(4, 0.65, -1.45, [0.6, 0.35]), ...column(4, 0.65, 1.45, [0.6, 0.35])),
  ]),
  'QFN-20-5x5': model('QFN-20 5 × 5 with exposed pad', [5, 5, 0.9], 30, [
    tab(3.9, { at: [0, 0], sizeMm: [3.15, 3.15] }),
    leads(
      150,
      ...column(5, 0.65, -2.35, [0.8, 0.35]),
      ...column(5, 0.65, 2.35, [0.8, 0.35]),
      ...row(5, 0.65, -2.35, [0.35, 0.8]),
      ...row(5, 0.65, 2.35, [0.35, 0.8]),
    ),
  ]),
  'HTSSOP-20-EP': model('HTSSOP-20 with exposed pad', [6.5, 4.4, 1.1], 30, [
    tab(3, { at: [0, 0], sizeMm: [3.7, 2.4] }),
    leads(60, ...row(10, 0.65, -2.9, [0.4, 1.4]), ...row(10, 0.65, 2.9, [0.4, 1.4])),
  ]),
  'MSOP-8': model(
    'MSOP-8',
    [3, 3, 0.95],
    35,
    [leads(55, ...row(4, 0.65, -2.2, [0.4, 1.3]), ...row(4, 0.65, 2.2, [0.4, 1.3]))],
    450,
  ),
};
