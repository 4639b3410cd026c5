import { expect, test } from 'vitest';
import { fr4, publishedBoard, rectangle, square, thetaJa } from './board-of.ts';

/*
 * Published boards, all by one convention: nothing is tuned to a case. Tolerances: 20 % where one assumption is needed
 * (board size, copper weight), 15 % on measured boards that state everything, 15 % on ratios within one publication.
 */
const twoLayers = (mm: number, um = 35) => ({
  copper: [
    { name: 'L1', thicknessUm: um },
    { name: 'L2', thicknessUm: um },
  ],
  dielectric: [fr4(mm)],
  maxOperatingC: 130,
});

const sot223 = {
  bodyMm: [6.5, 3.5, 1.6] as [number, number, number],
  caseTopKPerW: 40,
  underBodyKPerW: 160,
  lands: [
    {
      name: 'tab',
      kind: 'tab' as const,
      kPerW: 15,
      pads: [{ at: [0, 3.1] as [number, number], sizeMm: [3.5, 1.4] as [number, number] }],
    },
    {
      name: 'mid',
      kind: 'lead' as const,
      kPerW: 75,
      pads: [{ at: [0, -3.1] as [number, number], sizeMm: [1.2, 1.4] as [number, number] }],
    },
    {
      name: 'outer',
      kind: 'lead' as const,
      kPerW: 125,
      pads: [-2.3, 2.3].map((x) => ({ at: [x, -3.1] as [number, number], sizeMm: [1.2, 1.4] as [number, number] })),
    },
  ],
};

// LM1117 data sheet, December 2001, table 1: SOT-223, 1 oz, still air; coupon sizes scaled off its drawings.
const coupon = (outline: [number, number][], pours: { layer: string; points: [number, number][] }[]) =>
  publishedBoard({
    ...sot223,
    outline: { points: outline },
    stackup: twoLayers(1.53),
    pours: pours.map((pour, index) => ({ id: `p${index}`, net: 'T', ...pour })),
    powerW: 0.8,
  });
const layout2 = () => coupon(rectangle(28.4, 13.5), [{ layer: 'L1', points: rectangle(7.9, 7.7) }]);
const layout11 = () =>
  coupon(rectangle(36.8, 41.9), [
    { layer: 'L1', points: rectangle(8.8, 7.7) },
    { layer: 'L2', points: rectangle(26.5, 27) },
  ]);

test('SOT-223, 0.066 in² on top (layout 2) – published 123 K/W – within 20 %', () => {
  const theta = thetaJa(layout2());
  expect(theta / 123).toBeGreaterThan(0.8);
  expect(theta / 123).toBeLessThan(1.2);
});

test('SOT-223, 1 in² below without vias (layout 11) – published 79 K/W and 0.64 of layout 2 – within 20 and 15 %', () => {
  const theta = thetaJa(layout11());
  expect(Math.abs(theta / 79 - 1)).toBeLessThan(0.2);
  expect(Math.abs(theta / thetaJa(layout2()) / (79 / 123) - 1)).toBeLessThan(0.15);
});

// LM317 SLVS044Z, figure 8-21: TO-263, 1 oz, no mask, θJA against copper area, read off the curve (± 1 K/W).
const to263 = (in2: number) =>
  publishedBoard({
    bodyMm: [10.2, 8.4, 4.4],
    caseTopKPerW: 43,
    lands: [
      { name: 'tab', kind: 'tab', kPerW: 1.2, pads: [{ at: [0, 1.3], sizeMm: [10.7, 8.9] }] },
      {
        name: 'leads',
        kind: 'lead',
        kPerW: 45,
        pads: [-2.54, 0, 2.54].map((x) => ({ at: [x, -6.6], sizeMm: [1.2, 2.7] })),
      },
    ],
    outline: { points: square(60) },
    stackup: twoLayers(1.53),
    pours: [{ id: 'p1', layer: 'L1', net: 'T', points: square(Math.sqrt(in2 * 645.16), [0, 1.3]), emissivity: 0.1 }],
  });

test('TO-263 on 0.5 and 1.1 in² – published 44.5 and 35.1 K/W – within 20 %, their ratio within 15 %', () => {
  const [half, large] = [thetaJa(to263(0.5)), thetaJa(to263(1.1))];
  expect(Math.abs(half / 44.5 - 1)).toBeLessThan(0.2);
  expect(Math.abs(large / 35.1 - 1)).toBeLessThan(0.2);
  expect(Math.abs(large / half / (35.1 / 44.5) - 1)).toBeLessThan(0.15);
});

// BD00IA5WEFJ data sheet, page 6: HTSOP-J8, board 70 × 70 × 1.6 mm, measured; copper weight and vias are the assumption.
const layers = (back: number | null) =>
  publishedBoard({
    bodyMm: [3.9, 4.9, 1.5],
    caseTopKPerW: 50,
    lands: [
      { name: 'pad', kind: 'tab', kPerW: 6, pads: [{ at: [0, 0], sizeMm: [2.3, 2.3] }] },
      {
        name: 'leads',
        kind: 'lead',
        kPerW: 80,
        pads: [-1.905, -0.635, 0.635, 1.905].flatMap((y) =>
          [-2.7, 2.7].map((x) => ({ at: [x, y] as [number, number], sizeMm: [1.55, 0.6] as [number, number] })),
        ),
      },
    ],
    outline: { points: square(70) },
    stackup: twoLayers(1.53),
    pours: back === null ? [] : [{ id: 'p1', layer: 'L2', net: 'T', points: square(back) }],
    viaFields:
      back === null
        ? []
        : [
            {
              id: 'v1',
              net: 'T',
              at: [0, 0],
              columns: 2,
              rows: 2,
              pitchMm: 1,
              drillMm: 0.3,
              platingUm: 25,
              filling: 'open',
              from: 'L1',
              to: 'L2',
            },
          ],
  });

test('HTSOP-J8 on one layer – published 153.2 K/W – within 20 %', () => {
  expect(Math.abs(thetaJa(layers(null)) / 153.2 - 1)).toBeLessThan(0.2);
});

test('HTSOP-J8 with vias to a whole back layer – published 59.2 K/W – within 20 %', () => {
  expect(Math.abs(thetaJa(layers(70)) / 59.2 - 1)).toBeLessThan(0.2);
});

// TPS73HD3xx data sheet SLVS167C, page 20: HTSSOP PowerPAD, one layer of 1 oz on 5 × 5 in, copper 2 × 2 in, measured:
// 1/0.0235 K/W in still air, 1/0.0346 K/W at "300", taken as 300 ft/min = 1.52 m/s. Package typical of its outline.
const powerPad = (airMPerS: number) =>
  publishedBoard({
    bodyMm: [6.5, 4.4, 1.1],
    caseTopKPerW: 30,
    lands: [
      { name: 'pad', kind: 'tab', kPerW: 3, pads: [{ at: [0, 0], sizeMm: [3.7, 2.4] }] },
      {
        name: 'leads',
        kind: 'lead',
        kPerW: 60,
        pads: [-2.9, 2.9].map((y) => ({ at: [0, y], sizeMm: [6.2, 1.4] })),
      },
    ],
    outline: { points: square(127) },
    stackup: twoLayers(1.53),
    pours: [{ id: 'p1', layer: 'L1', net: 'T', points: square(50.8) }],
    airMPerS,
  });

test('HTSSOP on 4 in² – published 42.6 K/W still and 28.9 at 1.52 m/s – within 20 %, their ratio within 15 %', () => {
  const [still, moving] = [thetaJa(powerPad(0)), thetaJa(powerPad(1.52))];
  expect(Math.abs(still / 42.6 - 1)).toBeLessThan(0.2);
  expect(Math.abs(moving / 28.9 - 1)).toBeLessThan(0.2);
  expect(Math.abs(moving / still / (28.9 / 42.6) - 1)).toBeLessThan(0.15);
});

// TPS7A7001 data sheet SBVS134D, page 3: SO-8 PowerPAD on the JESD51-7 board (76.2 × 114.3 mm, 2 × 70 and 2 × 35 µm),
// simulated: planes of 3 × 3 in, 5 % copper outside, 3 × 2 vias to the ground plane; 46.4 K/W, θJC top 54.2, bottom 6.8.
test('SO-8 with pad on the JEDEC four-layer board – published 46.4 K/W – within 15 %', () => {
  const board = publishedBoard({
    bodyMm: [3.9, 4.9, 1.5],
    caseTopKPerW: 54.2,
    lands: [
      { name: 'pad', kind: 'tab', kPerW: 6.8, pads: [{ at: [0, 0], sizeMm: [2.3, 2.3] }] },
      {
        name: 'leads',
        kind: 'lead',
        kPerW: 80,
        pads: [-1.905, -0.635, 0.635, 1.905].flatMap((y) =>
          [-2.7, 2.7].map((x) => ({ at: [x, y] as [number, number], sizeMm: [1.55, 0.6] as [number, number] })),
        ),
      },
    ],
    outline: { points: rectangle(76.2, 114.3) },
    stackup: {
      copper: [
        { name: 'L1', thicknessUm: 70, traces: { coverage: 0.05 } },
        { name: 'L2', thicknessUm: 35 },
        { name: 'L3', thicknessUm: 35 },
        { name: 'L4', thicknessUm: 70, traces: { coverage: 0.05 } },
      ],
      dielectric: [fr4(0.3), fr4(0.8), fr4(0.3)],
      maxOperatingC: 130,
    },
    pours: [
      { id: 'p2', layer: 'L2', net: 'T', points: rectangle(76.2, 76.2) },
      { id: 'p3', layer: 'L3', net: 'PWR', points: rectangle(76.2, 76.2) },
    ],
    viaFields: [
      {
        id: 'v1',
        net: 'T',
        at: [0, 0],
        columns: 2,
        rows: 3,
        pitchMm: 0.8,
        drillMm: 0.3,
        platingUm: 25,
        filling: 'open',
        from: 'L1',
        to: 'L2',
      },
    ],
  });
  expect(Math.abs(thetaJa(board) / 46.4 - 1)).toBeLessThan(0.15);
});
