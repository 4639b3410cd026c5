import { useId } from 'react';
import type { Board } from '#core/board/document.ts';
import { bodyRing, landRings, rectangleRing } from '#core/board/footprint.ts';
import { heatBands, isotherms, type MmRing } from '#core/drawing/heat-bands.ts';
import { heatScale } from '#core/drawing/heat-scale.ts';
import { isothermLabels } from '#core/drawing/isotherm-label.ts';
import { formatGiven, formatQuantity } from '#core/format.ts';
import { boundsOf, polygonContains } from '#core/geometry/polygon.ts';
import type { ConditionResult } from '#core/result/result.ts';
import type { HeatField } from '#core/thermal/heat-field.ts';
import { HeatLegend } from './heat-legend.tsx';

type Props = { board: Board; condition: ConditionResult; field: HeatField; layer: string; airC: number };

/** Still picture of a board and its heat: bands, labelled isotherms, limit isotherms, parts with their junctions, scale bar. */
export function BoardPicture({ board, condition, field, layer, airC }: Props) {
  const clip = useId();
  const box = boundsOf(board.outline.points);
  const width = box.maxX - box.minX;
  const height = box.maxY - box.minY;
  const unit = Math.max(width, height) / 100;
  const path = (rings: readonly MmRing[]) =>
    rings
      .map((ring) => `M${ring.map(([x, y]) => `${(x - box.minX).toFixed(3)} ${(box.maxY - y).toFixed(3)}`).join('L')}Z`)
      .join('');
  const values = field.layers.find(({ name }) => name === layer)?.temperatureC ?? new Float32Array();
  const seen = values.filter((value) => Number.isFinite(value));
  const hottest = seen.reduce((most, value) => Math.max(most, value), airC);
  const coolest = seen.reduce((least, value) => Math.min(least, value), hottest);
  const scale = heatScale(airC, hottest);
  const lines = isotherms(field, layer, scale.levels.slice(1));
  const limits = limitsOf(condition);
  const onBoard = ([x, y]: readonly [number, number]) =>
    x > box.minX + 3 * unit &&
    x < box.maxX - 3 * unit &&
    y > box.minY + 2 * unit &&
    y < box.maxY - 2 * unit &&
    polygonContains(board.outline.points, x, y);
  const top = board.stackup.copper[0]?.name === layer;
  return (
    <figure className="flex min-w-0 flex-col gap-3">
      <svg
        role="img"
        aria-label={`${condition.name}, layer ${layer}: hottest ${formatQuantity(hottest, '°C')}, coolest ${formatQuantity(coolest, '°C')}; the table of results holds the same figures`}
        viewBox={`${-unit} ${-unit} ${width + 2 * unit} ${height + 2 * unit}`}
        className="max-h-[30rem] w-full"
      >
        <clipPath id={clip}>
          <path d={path([board.outline.points, ...board.outline.cutouts])} clipRule="evenodd" />
        </clipPath>
        <g clipPath={`url(#${clip})`}>
          {heatBands(field, layer, scale).map((band) => (
            <path key={band.fromC} d={path(band.polygons.flat())} fill={band.colour} fillRule="evenodd" />
          ))}
          {lines.map((line) => (
            <path key={line.valueC} d={path(line.rings)} fill="none" stroke="#3a322b" strokeWidth={unit * 0.12} />
          ))}
          {limits.flatMap(({ valueC }) =>
            isotherms(field, layer, [valueC]).map((line) => (
              <g key={valueC} fill="none">
                <path d={path(line.rings)} stroke="#fff" strokeWidth={unit * 0.6} />
                <path
                  d={path(line.rings)}
                  stroke="#000"
                  strokeWidth={unit * 0.32}
                  strokeDasharray={`${unit * 1.2} ${unit * 0.6}`}
                />
              </g>
            )),
          )}
          {board.pours
            .filter((pour) => pour.layer === layer)
            .map((pour) => (
              <path
                key={pour.id}
                d={path([pour.points, ...pour.holes])}
                fill="none"
                stroke="#5a2a12"
                strokeWidth={unit * 0.25}
              />
            ))}
        </g>
        <path
          d={path([board.outline.points, ...board.outline.cutouts])}
          fill="none"
          stroke="var(--ink)"
          strokeWidth={unit * 0.3}
        />
        {board.regulators
          .filter((regulator) => (regulator.side === 'top') === top)
          .map((regulator) => {
            const body = bodyRing(board, regulator);
            return (
              <g key={regulator.ref} fill="none" stroke="#000">
                <path d={path(landRings(board, regulator).map(({ ring }) => ring))} strokeWidth={unit * 0.12} />
                {body ? <path d={path([body])} strokeWidth={unit * 0.22} /> : null}
              </g>
            );
          })}
        {board.sources.map((source) => (
          <path
            key={source.ref}
            d={path([rectangleRing(source.at, source.sizeMm, source.rotationDeg)])}
            fill="none"
            stroke="#000"
            strokeWidth={unit * 0.18}
          />
        ))}
        {isothermLabels(lines, onBoard, 6 * unit).map((label) => (
          <Plate
            key={label.valueC}
            x={label.at[0] - box.minX}
            y={box.maxY - label.at[1]}
            size={unit * 1.7}
            text={formatGiven(label.valueC)}
          />
        ))}
        {board.regulators.map(({ ref, at }) => {
          const found = condition.regulators.find((regulator) => regulator.ref === ref);
          const text = found?.junctionC === null || !found ? ref : `${ref} ${formatQuantity(found.junctionC, '°C')}`;
          return <Plate key={ref} x={at[0] - box.minX} y={box.maxY - at[1]} size={unit * 2.1} text={text} />;
        })}
        {board.sources.map(({ ref, at }) => (
          <Plate key={ref} x={at[0] - box.minX} y={box.maxY - at[1]} size={unit * 1.9} text={ref} />
        ))}
      </svg>
      <HeatLegend
        scale={scale}
        title={`Layer ${layer}`}
        range={{ minC: coolest, maxC: hottest }}
        limits={limits.filter(({ valueC }) => valueC <= scale.maxC)}
      />
    </figure>
  );
}

function limitsOf(condition: ConditionResult) {
  const byValue = new Map<number, string[]>();
  for (const regulator of condition.regulators) {
    const limits = regulator.limits.flatMap((limit) =>
      limit.quantity === 'junctionC' && limit.limit !== null ? [limit.limit] : [],
    );
    if (limits.length === 0) continue;
    const least = Math.min(...limits);
    byValue.set(least, [...(byValue.get(least) ?? []), regulator.ref]);
  }
  return [...byValue].map(([valueC, refs]) => ({ valueC, label: `Limit ${refs.join(', ')}` }));
}

/** Words on a light plate, readable over every band. */
function Plate({ x, y, size, text }: { x: number; y: number; size: number; text: string }) {
  const width = text.length * size * 0.56 + size * 0.5;
  return (
    <g aria-hidden="true">
      <rect x={x - width / 2} y={y - size * 0.72} width={width} height={size * 1.44} fill="#fff" fillOpacity="0.88" />
      <text x={x} y={y} fontSize={size} fill="#1d1b19" fontWeight="600" textAnchor="middle" dominantBaseline="central">
        {text}
      </text>
    </g>
  );
}
