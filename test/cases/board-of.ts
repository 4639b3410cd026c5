import { boardDocument, type Board, type BoardDocument } from '#core/board/document.ts';
import { checkBoard } from '#core/check/check-board.ts';

type Land = BoardDocument['packages'][string]['lands'][number];
type Given = Pick<BoardDocument, 'outline' | 'stackup'> &
  Partial<Pick<BoardDocument, 'pours' | 'viaFields' | 'probes'>> & {
    bodyMm: [number, number, number];
    caseTopKPerW: number;
    underBodyKPerW?: number;
    lands: Land[];
    at?: [number, number];
    powerW?: number;
    filmWPerM2K?: number;
    ambientC?: number;
    /** Still air where left out; else towards +x. */
    airMPerS?: number;
  };

/** A test board of a publication: one part of known power, 25 °C, lying in still air unless it is moved, all its lands on net T. */
export function publishedBoard(given: Given): Board {
  const { bodyMm, caseTopKPerW, underBodyKPerW = null, lands, at = [0, 0], powerW = 1 } = given;
  return boardDocument.parse({
    format: 'dropwatt-board',
    version: 1,
    title: 'Published test board',
    outline: given.outline,
    stackup: given.stackup,
    pours: given.pours ?? [],
    viaFields: given.viaFields ?? [],
    packages: { model: { name: 'Model', bodyMm, caseTopKPerW, underBodyKPerW, lands, source: 'see the test' } },
    parts: {
      part: {
        name: 'Part',
        package: 'model',
        passElement: 'pmos',
        outputV: 3.3,
        outputTolerancePct: 1,
        inputMaxV: 40,
        outputMaxA: 5,
        dropoutV: [[1, 0.5]],
        groundA: [[1, 0.001]],
        landNets: Object.fromEntries(lands.map(({ name }) => [name, 'ground'])),
        junctionMaxC: 400,
        source: 'see the test',
      },
    },
    regulators: [{ ref: 'U1', part: 'part', at, nets: { ground: 'T', input: 'IN', output: 'OUT' }, powerW }],
    probes: given.probes ?? [],
    conditions: [
      {
        name: 'published',
        ambientC: given.ambientC ?? 25,
        orientation: 'horizontal',
        air: given.airMPerS ? { kind: 'moving', speedMPerS: given.airMPerS, towardDeg: 0 } : { kind: 'still' },
        filmWPerM2K: given.filmWPerM2K ?? null,
      },
    ],
    criteria: { name: 'none', rules: [{ quantity: 'junctionC', atMostC: 400, source: 'see the test' }] },
  } satisfies BoardDocument);
}

/** θJA of the board's one part, K/W, solved as the product does. */
export function thetaJa(board: Board): number {
  const { result } = checkBoard(board, [], { gridError: false });
  const [condition] = result.conditions;
  if (condition?.status !== 'converged') throw new Error(condition?.message ?? 'no solution');
  return condition.regulators[0]!.thetaJaKPerW!;
}

export const square = (side: number, at: [number, number] = [0, 0]): [number, number][] => {
  const [x, y] = at;
  const h = side / 2;
  return [
    [x - h, y - h],
    [x + h, y - h],
    [x + h, y + h],
    [x - h, y + h],
  ];
};

export const rectangle = (width: number, height: number, at: [number, number] = [0, 0]): [number, number][] => {
  const [x, y] = at;
  return [
    [x - width / 2, y - height / 2],
    [x + width / 2, y - height / 2],
    [x + width / 2, y + height / 2],
    [x - width / 2, y + height / 2],
  ];
};

/** Laminate as measured in the middle of the published range: 0.9 W/(m·K) in plane, 0.3 through. */
export const fr4 = (thicknessMm: number) => ({ thicknessMm, inPlaneWPerMK: 0.9, throughWPerMK: 0.3 });
