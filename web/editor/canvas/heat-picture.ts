import type { Board } from '#core/board/document.ts';
import type { ConditionResult } from '#core/result/result.ts';
import { type HeatScale, heatScale } from '#core/drawing/heat-scale.ts';
import { heatBands, isotherms } from '#core/drawing/heat-bands.ts';
import type { HeatLimit } from '#web/heat/heat-legend.tsx';
import type { ConditionCheck } from '../solve/checks.ts';
import type { HeatPicture } from './draw-heat.ts';

/** Limits that are drawn as isotherms: the laminate's, and the lowest derated junction limit of the condition. */
export function heatLimits(board: Board, condition: ConditionResult): HeatLimit[] {
  const junctions = condition.regulators.flatMap((regulator) =>
    regulator.limits.flatMap((limit) => (limit.quantity === 'junctionC' && limit.limit !== null ? [limit.limit] : [])),
  );
  return [
    ...(junctions.length > 0 ? [{ label: 'Lowest junction limit', valueC: Math.min(...junctions) }] : []),
    { label: 'Laminate limit', valueC: board.stackup.maxOperatingC },
  ];
}

/** Scale of one condition: from the air to the hottest cell of any layer or the highest limit. */
export function conditionScale(check: ConditionCheck): HeatScale {
  const condition = check.board.conditions.find((candidate) => candidate.name === check.condition.name);
  const airC = (condition?.ambientC ?? 25) + (condition?.boxRiseK ?? 0);
  const limits = heatLimits(check.board, check.condition).map((limit) => limit.valueC);
  return heatScale(airC, check.condition.board?.maxC ?? airC, limits);
}

/** Everything that is drawn of one layer's heat; null where there is no solution. */
export function heatPicture(check: ConditionCheck, layerName: string): HeatPicture | null {
  if (!check.field || check.condition.status !== 'converged') return null;
  const scale = conditionScale(check);
  const { field } = check;
  const limits = heatLimits(check.board, check.condition);
  const bands = heatBands(field, layerName, scale);
  return {
    bands,
    // The border of a band is the isotherm of its lower temperature; the ground of the picture has none.
    lines: bands
      .filter(({ fromC }) => fromC > scale.minC && limits.every(({ valueC }) => valueC !== fromC))
      .map(({ fromC, polygons }) => ({ valueC: fromC, rings: polygons.flat() })),
    limits: limits.flatMap(({ label, valueC }) =>
      isotherms(field, layerName, [valueC]).map((line) => ({ label, line })),
    ),
  };
}
