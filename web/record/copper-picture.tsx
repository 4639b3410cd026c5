import type { Board } from '#core/board/document.ts';
import { bodyRing, landRings } from '#core/board/footprint.ts';
import { boundsOf } from '#core/geometry/polygon.ts';
import { viaCentres } from '#core/thermal/via-conductance.ts';

type Ring = readonly (readonly [number, number])[];

/** Copper of every layer beside each other: planes filled, pours outlined and hatched, lands, bodies, holes. */
export function CopperPicture({ board }: { board: Board }) {
  const box = boundsOf(board.outline.points);
  const [width, height] = [box.maxX - box.minX, box.maxY - box.minY];
  const unit = Math.max(width, height) / 100;
  const path = (rings: readonly Ring[]) =>
    rings
      .map((ring) => `M${ring.map(([x, y]) => `${(x - box.minX).toFixed(2)} ${(box.maxY - y).toFixed(2)}`).join('L')}Z`)
      .join('');
  const last = board.stackup.copper.length - 1;
  return (
    <div className="grid gap-4 sm:grid-cols-2">
      {board.stackup.copper.map((layer, index) => (
        <figure key={layer.name}>
          <svg
            role="img"
            aria-label={`Copper of layer ${layer.name}`}
            viewBox={`${-unit} ${-unit} ${width + 2 * unit} ${height + 2 * unit}`}
            className="w-full"
          >
            <path
              d={path([board.outline.points, ...board.outline.cutouts])}
              fillRule="evenodd"
              fill={layer.plane ? 'var(--copper-soft)' : 'var(--panel)'}
              stroke="var(--ink)"
              strokeWidth={unit * 0.3}
            />
            {board.pours
              .filter((pour) => pour.layer === layer.name)
              .map((pour) => (
                <path
                  key={pour.id}
                  d={path([pour.points, ...pour.holes])}
                  fillRule="evenodd"
                  fill="var(--copper)"
                  fillOpacity={0.25 + 0.4 * pour.coverage}
                  stroke="var(--copper)"
                  strokeWidth={unit * 0.25}
                />
              ))}
            {board.regulators
              .filter(({ side }) => (side === 'top' ? index === 0 : index === last))
              .map((regulator) => {
                const body = bodyRing(board, regulator);
                return (
                  <g key={regulator.ref}>
                    <path d={path(landRings(board, regulator).map(({ ring }) => ring))} fill="var(--copper)" />
                    {body ? <path d={path([body])} fill="none" stroke="var(--ink)" strokeWidth={unit * 0.25} /> : null}
                    <text
                      x={regulator.at[0] - box.minX}
                      y={box.maxY - regulator.at[1]}
                      fontSize={unit * 2.6}
                      textAnchor="middle"
                      dominantBaseline="central"
                      fill="var(--ink)"
                      stroke="var(--panel)"
                      strokeWidth={unit * 0.5}
                      paintOrder="stroke"
                    >
                      {regulator.ref}
                    </text>
                  </g>
                );
              })}
            {board.viaFields.flatMap((via) =>
              viaCentres(via).map(([x, y], hole) => (
                <circle
                  key={`${via.id} ${hole}`}
                  cx={x - box.minX}
                  cy={box.maxY - y}
                  r={via.drillMm / 2}
                  fill="var(--panel)"
                  stroke="var(--ink)"
                  strokeWidth={unit * 0.1}
                />
              )),
            )}
          </svg>
          <figcaption className="text-sm">
            {layer.name}
            {layer.plane ? `, plane ${layer.plane.net}` : ''}
          </figcaption>
        </figure>
      ))}
    </div>
  );
}
