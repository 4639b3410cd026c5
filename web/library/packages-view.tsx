import type { PackageModel } from '#core/board/package.ts';
import { formatGiven } from '#core/format.ts';
import { Cell, Row, Table } from '#web/ui/table.tsx';
import { Browse } from './browse.tsx';
import { PackageDrawing } from './package-drawing.tsx';
import { Source, Values } from './values.tsx';

type Props = { packages: Record<string, PackageModel>; shown: string | null; onShow: (key: string) => void };

/** Package outlines with their compact thermal models. */
export function PackagesView({ packages, shown, onShow }: Props) {
  const entries = Object.entries(packages).map(([key, { name, bodyMm }]) => ({
    key,
    name,
    note: `body ${bodyMm.map((length) => formatGiven(length)).join(' × ')} mm`,
  }));
  return (
    <Browse label="Packages" entries={entries} shown={shown} onShow={onShow}>
      {(key) => {
        const model = packages[key];
        return model ? <PackageDetail model={model} /> : null;
      }}
    </Browse>
  );
}

const head = [
  { label: 'Land' },
  { label: 'Kind' },
  { label: 'Pads', numeric: true },
  { label: 'Size in mm' },
  { label: 'Junction to land in K/W', numeric: true },
];

function PackageDetail({ model }: { model: PackageModel }) {
  const { bodyMm, lands } = model;
  return (
    <>
      <Source>{model.source}</Source>
      <div className="mt-4 grid items-start gap-x-8 lg:grid-cols-[1fr_16rem]">
        <Values
          values={[
            ['Body', `${bodyMm.map((length) => formatGiven(length)).join(' × ')} mm`],
            ['Emissivity', formatGiven(model.emissivity)],
            ['Junction to case top', formatGiven(model.caseTopKPerW, 'K/W')],
            [
              'Junction to board under the body',
              model.underBodyKPerW === null ? null : formatGiven(model.underBodyKPerW, 'K/W'),
            ],
            [
              'ψ junction to top',
              model.psiJtKPerW === null
                ? null
                : `${formatGiven(model.psiJtKPerW, 'K/W')}, for reading measurements only`,
            ],
          ]}
        />
        <PackageDrawing model={model} />
      </div>
      <h3 className="mt-8 mb-1">Lands</h3>
      <Table caption={`Lands of ${model.name}`} head={head}>
        {lands.map(({ name, kind, pads, kPerW }) => (
          <Row key={name}>
            <Cell className="font-semibold">{name}</Cell>
            <Cell>{kind}</Cell>
            <Cell numeric>{pads.length}</Cell>
            <Cell>
              {[...new Set(pads.map(({ sizeMm }) => sizeMm.map((length) => formatGiven(length)).join(' × ')))].join(
                '; ',
              )}
            </Cell>
            <Cell numeric>{formatGiven(kPerW)}</Cell>
          </Row>
        ))}
      </Table>
    </>
  );
}
