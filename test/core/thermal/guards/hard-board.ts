import { boardDocument, type Board, type BoardDocument } from '#core/board/document.ts';
import { fr4, publishedBoard, rectangle } from '#test/cases/board-of.ts';

type Given = Partial<Pick<BoardDocument, 'pours' | 'viaFields' | 'sources' | 'sinks' | 'probes'>> & {
  /** Fixed film coefficient of both faces, W/(m²·K); still air when left out. */
  filmWPerM2K?: number;
  /** A second part at the other end. */
  second?: boolean;
};

/** Corners of the board, mm. */
export const hardBoardMm: readonly [number, number] = [32, 20];

/**
 * A board that is small and hard: three layers with a plane of another net and a slot in it, two pours and vias under one part,
 * a pour apart under the other, a heat source with a body, a screw held at its own temperature.
 */
export function hardBoard({ filmWPerM2K, second = true, ...given }: Given = {}): Board {
  const [length, width] = hardBoardMm;
  const base = publishedBoard({
    bodyMm: [4, 4, 1],
    caseTopKPerW: 40,
    underBodyKPerW: 200,
    lands: [
      { name: 'tab', kind: 'tab', kPerW: 5, pads: [{ at: [0, 0.5], sizeMm: [3, 3] }] },
      { name: 'lead', kind: 'lead', kPerW: 60, pads: [{ at: [0, -3], sizeMm: [2, 1] }] },
    ],
    outline: { points: rectangle(length, width, [length / 2, width / 2]) },
    stackup: {
      copper: [
        { name: 'L1', thicknessUm: 35 },
        { name: 'L2', thicknessUm: 18, plane: { net: 'PWR', coverage: 1, insetMm: 1 } },
        { name: 'L3', thicknessUm: 70 },
      ],
      dielectric: [fr4(0.25), fr4(1.2)],
      maxOperatingC: 130,
    },
    pours: given.pours ?? [
      { id: 'p1', layer: 'L1', net: 'T', points: rectangle(10, 9, [8, 10]), holes: [rectangle(0.6, 6, [11, 10])] },
      { id: 'p2', layer: 'L3', net: 'T', points: rectangle(12, 14, [9, 10]) },
      { id: 'p3', layer: 'L1', net: 'OTHER', points: rectangle(9, 9, [24, 10]) },
    ],
    viaFields: given.viaFields ?? [
      {
        id: 'v1',
        net: 'T',
        at: [8, 13.2],
        columns: 3,
        rows: 2,
        pitchMm: 1,
        drillMm: 0.3,
        platingUm: 25,
        filling: 'open',
        from: 'L1',
        to: 'L3',
      },
    ],
    at: [8, 10],
    ...(filmWPerM2K !== undefined && { filmWPerM2K }),
  });
  const [first] = base.regulators;
  return boardDocument.parse({
    ...base,
    regulators: second ? [first!, { ...first!, ref: 'U2', at: [24, 9.3], rotationDeg: 90 }] : [first!],
    sources: given.sources ?? [
      { ref: 'Q1', at: [16.2, 5.1], sizeMm: [2, 3], bodyMm: [2, 3, 1], powerW: 0.2, rotationDeg: 30 },
    ],
    sinks: given.sinks ?? [{ id: 's1', at: [30, 2], sizeMm: [2, 2], layer: 'L3', conductanceWPerK: 0.01, toC: 40 }],
    probes: given.probes ?? [],
  });
}
