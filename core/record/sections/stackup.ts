import { formatGiven } from '#core/format.ts';
import type { RecordSection } from '../record-document.ts';
import type { RecordInput } from '../record-input.ts';

export function stackupSection({ board }: RecordInput): RecordSection {
  const { stackup } = board;
  const rows = stackup.copper.flatMap((copper, index) => {
    const pours = board.pours.filter((pour) => pour.layer === copper.name).length;
    const parts = [
      copper.plane &&
        `plane ${copper.plane.net}, coverage ${formatGiven(copper.plane.coverage)}, inset ${formatGiven(copper.plane.insetMm, 'mm')}`,
      copper.traces && `background traces, coverage ${formatGiven(copper.traces.coverage)}`,
      pours > 0 && `${pours} pour${pours === 1 ? '' : 's'}`,
    ].filter(Boolean);
    const layer = [copper.name, 'copper', formatGiven(copper.thicknessUm, 'µm'), parts.join('; ') || 'bare'];
    const slab = stackup.dielectric[index];
    if (!slab) return [layer];
    const laminate = `in plane ${formatGiven(slab.inPlaneWPerMK)}, through ${formatGiven(slab.throughWPerMK, 'W/(m·K)')}`;
    return [layer, ['', 'laminate', formatGiven(slab.thicknessMm, 'mm'), laminate]];
  });
  return {
    id: 'stackup',
    title: 'Stack-up and copper',
    blocks: [
      {
        kind: 'table',
        columns: [
          { title: 'Layer', weight: 1 },
          { title: 'Material', weight: 1 },
          { title: 'Thickness', weight: 1, align: 'right' },
          { title: 'What it holds', weight: 5 },
        ],
        rows,
        empty: '',
      },
      {
        kind: 'pairs',
        rows: [
          [
            'Emissivity top / bottom',
            `${formatGiven(stackup.emissivityTop)} / ${formatGiven(stackup.emissivityBottom)}`,
          ],
          ['Maximum operating temperature of the laminate', formatGiven(stackup.maxOperatingC, '°C')],
        ],
      },
      {
        kind: 'table',
        columns: [
          { title: 'Via field', weight: 1.2 },
          { title: 'Net', weight: 1 },
          { title: 'Holes', weight: 1, align: 'right' },
          { title: 'Pitch mm', weight: 1.1, align: 'right' },
          { title: 'Finished hole mm', weight: 1.3, align: 'right' },
          { title: 'Plating µm', weight: 1, align: 'right' },
          { title: 'Filling', weight: 1 },
          { title: 'From – to', weight: 1.2 },
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
    ],
  };
}
