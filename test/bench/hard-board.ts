import { boardDocument, type Board, type BoardDocument } from '#core/board/document.ts';
import { randomNumbers } from './random-numbers.ts';

type Point = [number, number];
type Random = () => number;

const widthMm = 160;
const heightMm = 100;
const gapMm = 0.2;

const rectangle = (x0: number, y0: number, x1: number, y1: number): Point[] => [
  [x0, y0],
  [x1, y0],
  [x1, y1],
  [x0, y1],
];

/**
 * A board that is hard on purpose, invented from a seed: 160 × 100 mm; inner planes cut by slots of 0.2 mm and long traces; outer
 * layers with pours and slanted traces; 20 regulators on lands of three sizes with pours of their own, most of them with via
 * fields, one land held by four thin spokes; some thousand vias. Everything is shifted by fractions of a cell.
 * @param layers copper layers: 2, 4 or 8
 */
export function hardBoard(seed: number, layers: 2 | 4 | 8): Board {
  const random = randomNumbers(seed);
  const between = (low: number, high: number) => low + (high - low) * random();
  const names = Array.from({ length: layers }, (_, k) => `L${k + 1}`);
  const pours: BoardDocument['pours'] = [];
  const viaFields: BoardDocument['viaFields'] = [];
  names.slice(1, -1).forEach((layer, k) => pours.push(...innerLayer(random, layer, `P${k % 2}`)));
  const outer = [names[0]!, names.at(-1)!];
  for (const layer of outer) pours.push(...outerLayer(random, layer));
  const regulators: BoardDocument['regulators'] = [];
  for (let k = 0; k < 20; k++) {
    const outline = (['small', 'middle', 'large'] as const)[k % 3]!;
    const at: Point = [16 + 32 * (k % 5) + between(-5, 5), 12.5 + 25 * Math.floor(k / 5) + between(-3, 3)];
    const ref = `U${k + 1}`;
    regulators.push({
      ref,
      part: outline,
      at,
      nets: { ground: `T${k}`, input: `I${k}`, output: `O${k}` },
      powerW: between(...powers[outline]),
    });
    pours.push(...ownCopper(random, names, k, outline, at));
    if (random() < 0.6) {
      const [columns, rows] = [6, 8];
      viaFields.push({
        id: `V${k}`,
        net: `T${k}`,
        at: [at[0] + 0.13, at[1] + 0.07],
        columns,
        rows,
        pitchMm: 0.9,
        drillMm: 0.3,
        platingUm: 25,
        filling: 'open',
        from: names[0]!,
        to: names.at(-1)!,
      });
    }
  }
  for (let k = 0; k < 8; k++) {
    viaFields.push({
      id: `G${k}`,
      net: 'P0',
      at: [between(12, 148), between(8, 92)],
      columns: 8,
      rows: 6,
      pitchMm: between(1.1, 1.9),
      drillMm: 0.3,
      platingUm: 25,
      filling: 'open',
      from: names[0]!,
      to: names.at(-1)!,
    });
  }
  return boardDocument.parse({
    format: 'dropwatt-board',
    version: 1,
    title: `Hard board ${seed}, ${layers} layers`,
    outline: { points: rectangle(0, 0, widthMm, heightMm), cutouts: [] },
    stackup: {
      copper: names.map((name) => ({ name, thicknessUm: name === names[0] || name === names.at(-1) ? 70 : 35 })),
      dielectric: names.slice(1).map(() => ({
        // Below the thickness from which a dielectric gets layers of its own, so that the unknowns are the copper's.
        thicknessMm: Math.min(0.7, 1.6 / (layers - 1)),
        inPlaneWPerMK: 0.9,
        throughWPerMK: 0.3,
      })),
      maxOperatingC: 130,
    },
    pours,
    viaFields,
    packages: Object.fromEntries(
      (['small', 'middle', 'large'] as const).map((name) => [
        name,
        {
          name,
          bodyMm: bodies[name],
          caseTopKPerW: 40,
          lands: [
            { name: 'tab', kind: 'tab', kPerW: 5, pads: [{ at: [0, 0], sizeMm: lands[name] }] },
            {
              name: 'leads',
              kind: 'lead',
              kPerW: 60,
              pads: [-1, 0, 1].map((k) => ({
                at: [k * 1.3, -lands[name][1] / 2 - 1.1] as Point,
                sizeMm: [0.7, 0.9] as Point,
              })),
            },
          ],
          source: 'invented for the benchmark',
        },
      ]),
    ),
    parts: Object.fromEntries(
      (['small', 'middle', 'large'] as const).map((name) => [
        name,
        {
          name,
          package: name,
          passElement: 'pmos',
          outputV: 3.3,
          outputTolerancePct: 1,
          inputMaxV: 20,
          outputMaxA: 3,
          dropoutV: [[1, 0.4]],
          groundA: [[1, 0.001]],
          landNets: { tab: 'ground', leads: 'output' },
          junctionMaxC: 400,
          source: 'invented for the benchmark',
        },
      ]),
    ),
    regulators,
    conditions: [
      { name: 'still', ambientC: 40, orientation: 'horizontal', air: { kind: 'still' } },
      { name: 'moving', ambientC: 40, orientation: 'horizontal', air: { kind: 'moving', speedMPerS: 1, towardDeg: 0 } },
    ],
    criteria: { name: 'none', rules: [{ quantity: 'junctionC', atMostC: 400, source: 'invented for the benchmark' }] },
  } satisfies BoardDocument);
}

const lands: Record<'small' | 'middle' | 'large', Point> = { small: [1, 1], middle: [3.3, 2], large: [6, 6] };
const powers: Record<'small' | 'middle' | 'large', Point> = { small: [0.1, 0.5], middle: [0.3, 1.2], large: [1, 3] };
const bodies: Record<'small' | 'middle' | 'large', [number, number, number]> = {
  small: [3, 2, 1],
  middle: [6.5, 3.5, 1.6],
  large: [6.6, 6.1, 2.3],
};

/** A plane of one net as a pour with holes: slots across, and corridors in which traces run. */
function innerLayer(random: Random, layer: string, net: string): BoardDocument['pours'] {
  const holes: Point[][] = [];
  const traces: BoardDocument['pours'] = [];
  const taken: [number, number, number, number][] = [];
  const free = (box: [number, number, number, number]) =>
    taken.every(([x0, y0, x1, y1]) => box[2] < x0 || box[0] > x1 || box[3] < y0 || box[1] > y1) && taken.push(box) > 0;
  for (let slot = 0; slot < 6; slot++) {
    const x = 20 + 24 * slot + 4 * random();
    const y = 5 + 30 * random();
    if (free([x, y, x + 0.2, y + 55])) holes.push(rectangle(x, y, x + 0.2, y + 55));
  }
  for (let tries = 0; traces.length < 25 && tries < 2000; tries++) {
    const [x, y, length] = [4 + 130 * random(), 4 + 90 * random(), 8 + 14 * random()];
    const box: [number, number, number, number] = [x - gapMm, y - gapMm, x + length + gapMm, y + 0.25 + gapMm];
    if (!free(box)) continue;
    holes.push(rectangle(...box));
    const points = rectangle(x, y, x + length, y + 0.25);
    traces.push({ id: `${layer}T${traces.length}`, layer, net: `${layer}S${traces.length}`, points });
  }
  return [
    { id: `${layer}P`, layer, net, points: rectangle(0.5, 0.5, widthMm - 0.5, heightMm - 0.5), holes },
    ...traces,
  ];
}

function outerLayer(random: Random, layer: string): BoardDocument['pours'] {
  const pours: BoardDocument['pours'] = [];
  for (let k = 0; k < 14; k++) {
    const [x, y] = [2 + 130 * random(), 2 + 75 * random()];
    const points = rectangle(x, y, x + 6 + 20 * random(), y + 5 + 16 * random());
    pours.push({ id: `${layer}A${k}`, layer, net: k % 3 ? `${layer}N${k}` : 'P0', points });
  }
  for (let k = 0; k < 160; k++) {
    const [x, y, length, width] = [25 + 110 * random(), 20 + 60 * random(), 6 + 18 * random(), 0.15 + 0.35 * random()];
    const angle = (Math.floor(4 * random()) * Math.PI) / 4;
    const [c, s] = [Math.cos(angle), Math.sin(angle)];
    const points = rectangle(0, -width / 2, length, width / 2).map(([u, v]): Point => [
      x + c * u - s * v,
      y + s * u + c * v,
    ]);
    pours.push({ id: `${layer}W${k}`, layer, net: `${layer}W${k}`, points });
  }
  return pours;
}

/** Bare board around a regulator, and in it its own pour; the second regulator's land hangs on four spokes. */
function ownCopper(
  random: Random,
  names: string[],
  k: number,
  outline: keyof typeof lands,
  at: Point,
): BoardDocument['pours'] {
  const [x, y] = at;
  const reach = 3 + 5 * random();
  const [w, h] = [lands[outline][0] / 2 + reach, lands[outline][1] / 2 + reach];
  const box = (layer: string, id: string, net: string, grow: number, coverage = 1, holes: Point[][] = []) => ({
    id: `${id}${k}${layer}`,
    layer,
    net,
    points: rectangle(x - w - grow, y - h - grow, x + w + grow, y + h + grow),
    holes,
    coverage,
  });
  const [top, bottom] = [names[0]!, names.at(-1)!];
  const holes: Point[][] = [];
  if (k === 1) {
    // Four openings around the land leave spokes of 0.24 mm.
    const [a, b, c] = [lands[outline][0] / 2, lands[outline][0] / 2 + 0.4, 0.12];
    const [d, e] = [lands[outline][1] / 2, lands[outline][1] / 2 + 0.4];
    holes.push(rectangle(x + c, y + d, x + b, y + e), rectangle(x - b, y + d, x - c, y + e));
    holes.push(rectangle(x + c, y - e, x + b, y - d), rectangle(x - b, y - e, x - c, y - d));
    holes.push(rectangle(x + a, y + c, x + b, y + d), rectangle(x - b, y + c, x - a, y + d));
    holes.push(rectangle(x + a, y - d, x + b, y - c), rectangle(x - b, y - d, x - a, y - c));
  }
  return [box(top, 'R', `T${k}`, 0, 1, holes), ...(k % 5 < 3 ? [box(bottom, 'B', `T${k}`, 2)] : [])];
}
