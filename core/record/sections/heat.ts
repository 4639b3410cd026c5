import type { Board } from '#core/board/document.ts';
import { type HeatScale, heatScale } from '#core/drawing/heat-scale.ts';
import type { ConditionResult } from '#core/result/result.ts';
import type { HeatField } from '#core/thermal/heat-field.ts';
import { governingConditions, junctionLimit } from '../governing.ts';
import type { RecordHeat, RecordSection } from '../record-document.ts';
import type { RecordInput } from '../record-input.ts';

type Shown = {
  condition: ConditionResult;
  field: HeatField;
  airC: number;
  limits: { label: string; valueC: number }[];
};

/** The board with its heat: one drawing per governing condition and face that carries parts, all on one scale. */
export function heatSection({ board, result, fields }: RecordInput): RecordSection {
  const shown = governingConditions(result).flatMap((condition): Shown[] => {
    const field = fields.get(condition.name);
    const settings = board.conditions.find(({ name }) => name === condition.name);
    if (!field || !settings) return [];
    return [{ condition, field, airC: settings.ambientC + settings.boxRiseK, limits: limitsOf(board, condition) }];
  });
  if (shown.length === 0) {
    return {
      id: 'heat',
      title: 'Board and heat',
      blocks: [{ kind: 'text', text: 'No condition has a converged heat field.' }],
    };
  }
  const faces = facesOf(board);
  const ranges = shown.map(({ field }) => faces.map(({ layer }) => rangeOf(field, layer)));
  // The lowest limit of every drawing lies on the scale; to reach for all of them would leave too few bands below.
  const scale = heatScale(
    Math.min(...shown.map(({ airC }) => airC)),
    Math.max(...ranges.flat().map(({ hottestC }) => hottestC)),
    shown.flatMap(({ limits }) => limits.slice(0, 1).map(({ valueC }) => valueC)),
  );
  return {
    id: 'heat',
    title: 'Board and heat',
    blocks: [
      {
        kind: 'text',
        text: 'Surface temperature in each governing condition as bands with isotherms in °C, seen from the top; all drawings share one scale. A dashed isotherm is a limit. The figure beside a regulator is its junction temperature, which is above that of the surface.',
      },
      ...shown.flatMap((one, index) =>
        faces.map(({ side, layer }, face) => ({
          kind: 'heat' as const,
          drawing: drawingOf(board, one, side, layer, ranges[index]![face]!, scale),
        })),
      ),
    ],
  };
}

function drawingOf(
  board: Board,
  { condition, field, airC, limits }: Shown,
  side: 'top' | 'bottom',
  layer: string,
  range: { coolestC: number; hottestC: number },
  scale: HeatScale,
): RecordHeat {
  const onFace = new Set(board.regulators.filter((regulator) => regulator.side === side).map(({ ref }) => ref));
  return {
    condition: condition.name,
    board,
    field,
    layer,
    side,
    airC,
    ...range,
    scale,
    limits: limits.map((limit) => ({
      ...limit,
      reached: limit.valueC >= range.coolestC && limit.valueC <= range.hottestC,
    })),
    junctions: condition.regulators.flatMap(({ ref, junctionC, verdict }) =>
      junctionC === null || !onFace.has(ref) ? [] : [{ ref, junctionC, verdict }],
    ),
  };
}

/** Faces that carry parts; the top where none does. */
function facesOf(board: Board): { side: 'top' | 'bottom'; layer: string }[] {
  const placed = [...board.regulators, ...board.sources].map(({ side }) => side);
  const { copper } = board.stackup;
  const faces = (['top', 'bottom'] as const).filter((side) => placed.includes(side));
  return (faces.length > 0 ? faces : (['top'] as const)).map((side) => ({
    side,
    layer: (side === 'top' ? copper[0] : copper.at(-1))?.name ?? '',
  }));
}

function rangeOf(field: HeatField, layer: string): { coolestC: number; hottestC: number } {
  let coolestC = Infinity;
  let hottestC = -Infinity;
  for (const value of field.layers.find(({ name }) => name === layer)?.temperatureC ?? []) {
    if (!Number.isFinite(value)) continue;
    coolestC = Math.min(coolestC, value);
    hottestC = Math.max(hottestC, value);
  }
  return { coolestC, hottestC };
}

/** Junction limits, alike ones together, and the laminate's. */
function limitsOf(board: Board, condition: ConditionResult): { label: string; valueC: number }[] {
  const byValue = new Map<number, string[]>();
  const add = (valueC: number, name: string) => byValue.set(valueC, [...(byValue.get(valueC) ?? []), name]);
  for (const regulator of condition.regulators) {
    const limit = junctionLimit(regulator)?.limit;
    if (limit !== null && limit !== undefined) add(limit, regulator.ref);
  }
  add(board.stackup.maxOperatingC, 'laminate');
  return [...byValue].toSorted(([a], [b]) => a - b).map(([valueC, names]) => ({ valueC, label: shortList(names) }));
}

function shortList(names: readonly string[]): string {
  return names.length > 4 ? `${names.slice(0, 3).join(', ')} and ${names.length - 3} more` : names.join(', ');
}
