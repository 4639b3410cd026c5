import { boundsOf, polygonArea } from '#core/geometry/polygon.ts';
import { formatGiven, formatNumber } from '#core/format.ts';
import type { RecordBlock, RecordSection } from '../record-document.ts';
import type { RecordInput } from '../record-input.ts';
import { stated } from '../stated.ts';

/** Layers, laminate and every piece of copper, in figures and drawn layer by layer. */
export function stackupSection({ board }: RecordInput): RecordSection {
  const { stackup, outline } = board;
  const box = boundsOf(outline.points);
  const areaMm2 = polygonArea(outline.points) - outline.cutouts.reduce((sum, cutout) => sum + polygonArea(cutout), 0);
  return {
    id: 'stackup',
    title: 'Board, stack-up and copper',
    blocks: [
      {
        kind: 'pairs',
        rows: [
          [
            'Outline',
            `${formatGiven(box.maxX - box.minX)} × ${formatGiven(box.maxY - box.minY, 'mm')}, area ${formatNumber(areaMm2 / 100, 2)} cm²`,
          ],
          [
            'Emissivity, top and bottom face',
            `${formatGiven(stackup.emissivityTop)} and ${formatGiven(stackup.emissivityBottom)}`,
          ],
          ['Maximum operating temperature of the laminate', formatGiven(stackup.maxOperatingC, '°C')],
        ],
      },
      layerTable({ board }),
      { kind: 'heading', text: 'Placement and copper, layer by layer, seen from the top' },
      { kind: 'copper', board },
      { kind: 'heading', text: 'Pours' },
      {
        kind: 'table',
        columns: [
          { title: 'Pour', weight: 1.6 },
          { title: 'Layer', weight: 1 },
          { title: 'Net', weight: 1.6 },
          { title: 'Area mm²', weight: 1, align: 'right' },
          { title: 'Coverage', weight: 1, align: 'right' },
          { title: 'Emissivity of the face', weight: 1.6, align: 'right' },
        ],
        rows: board.pours.map((pour) => [
          pour.id,
          pour.layer,
          pour.net,
          formatNumber(polygonArea(pour.points) - pour.holes.reduce((sum, hole) => sum + polygonArea(hole), 0), 1),
          formatGiven(pour.coverage),
          pour.emissivity === null ? 'as the board' : formatGiven(pour.emissivity),
        ]),
        empty: 'There is no pour.',
      },
      { kind: 'heading', text: 'Via fields' },
      {
        kind: 'table',
        columns: [
          { title: 'Via field', weight: 1.6 },
          { title: 'Net', weight: 1.4 },
          { title: 'Holes', weight: 1, align: 'right' },
          { title: 'Pitch mm', weight: 1, align: 'right' },
          { title: 'Finished hole mm', weight: 1.4, align: 'right' },
          { title: 'Plating µm', weight: 1.1, align: 'right' },
          { title: 'Filling', weight: 1 },
          { title: 'From – to', weight: 1.3 },
        ],
        rows: board.viaFields.map((via) => [
          via.id,
          via.net,
          `${via.columns} × ${via.rows}`,
          typeof via.pitchMm === 'number'
            ? formatGiven(via.pitchMm)
            : via.pitchMm.map((pitch) => formatGiven(pitch)).join(' × '),
          formatGiven(via.drillMm),
          formatGiven(via.platingUm),
          via.filling,
          `${via.from} – ${via.to}`,
        ]),
        empty: 'There is no via field.',
      },
      ...sinkTable({ board }),
    ],
  };
}

function layerTable({ board: { stackup, pours } }: Pick<RecordInput, 'board'>): RecordBlock {
  const rows = stackup.copper.flatMap((copper, index) => {
    const count = pours.filter((pour) => pour.layer === copper.name).length;
    const parts = [
      copper.plane &&
        `plane ${copper.plane.net}, coverage ${formatGiven(copper.plane.coverage)}, drawn in by ${formatGiven(copper.plane.insetMm, 'mm')}`,
      copper.traces && `background traces, coverage ${formatGiven(copper.traces.coverage)}`,
      count > 0 && `${count} pour${count === 1 ? '' : 's'}`,
    ].filter(Boolean);
    const layer = [copper.name, 'copper', stated(copper.thicknessUm / 1000), parts.join('; ') || 'bare'];
    const slab = stackup.dielectric[index];
    if (!slab) return [layer];
    const conductivity = `conductivity in plane ${formatGiven(slab.inPlaneWPerMK)}, through ${formatGiven(slab.throughWPerMK, 'W/(m·K)')}`;
    return [layer, ['', 'laminate', stated(slab.thicknessMm), conductivity]];
  });
  return {
    kind: 'table',
    columns: [
      { title: 'Layer', weight: 1 },
      { title: 'Material', weight: 1 },
      { title: 'Thickness mm', weight: 1, align: 'right' },
      { title: 'What it holds', weight: 5 },
    ],
    rows,
    empty: '',
  };
}

function sinkTable({ board }: Pick<RecordInput, 'board'>): RecordBlock[] {
  if (board.sinks.length === 0) return [];
  return [
    { kind: 'heading', text: 'Sinks' },
    {
      kind: 'table',
      columns: [
        { title: 'Sink', weight: 1.4 },
        { title: 'Layer', weight: 1 },
        { title: 'At mm', weight: 1.2, align: 'right' },
        { title: 'Size mm', weight: 1.2, align: 'right' },
        { title: 'Conductance W/K', weight: 1.4, align: 'right' },
        { title: 'To', weight: 1.2 },
      ],
      rows: board.sinks.map((sink) => [
        sink.id,
        sink.layer,
        sink.at.map((value) => formatGiven(value)).join(', '),
        sink.sizeMm.map((value) => formatGiven(value)).join(' × '),
        formatGiven(sink.conductanceWPerK),
        sink.toC === 'ambient' ? 'ambient' : formatGiven(sink.toC, '°C'),
      ]),
      empty: '',
    },
  ];
}
