import type { Caution } from '#core/result/result.ts';
import { burnTime } from './burn-threshold.ts';
import type { FindingContext } from './finding-context.ts';
import { formatNumber } from '#core/format.ts';

/** Hazards to people and property; never a mere exceedance. The standing caution comes with every result. */
export function cautionsOf(context: FindingContext): Caution[] {
  return [...hotSurfaces(context), ...hotLaminate(context), ...hotNeighbours(context), standing];
}

const standing: Caution = {
  kind: 'general',
  ref: null,
  condition: null,
  message:
    'Heat burns skin and can set fire to a board and what lies near it. These figures are calculated: verify them by measurement before people or property depend on them. Local codes and the judgement of a licensed engineer go before this result.',
};

/** One caution a regulator, for its hottest condition. */
function hotSurfaces({ board, conditions }: FindingContext): Caution[] {
  return board.regulators.flatMap(({ ref }) => {
    const seen = conditions.flatMap(({ condition, result }) =>
      result.regulators
        .filter((regulator) => regulator.ref === ref && regulator.landC !== null && regulator.caseTopC !== null)
        .map((regulator) => ({ condition: condition.name, metalC: regulator.landC!, caseC: regulator.caseTopC! })),
    );
    const hottest = seen.reduce<(typeof seen)[number] | null>(
      (most, here) => (!most || here.metalC > most.metalC ? here : most),
      null,
    );
    if (!hottest) return [];
    const metal = burnTime('metal', hottest.metalC);
    const plastic = burnTime('plastic', hottest.caseC);
    if (!metal && !plastic) return [];
    const parts = [
      metal &&
        `bare metal at ${formatNumber(hottest.metalC, 0)} °C burns skin within ${metal.time} (threshold ${metal.thresholdC} °C)`,
      plastic &&
        `the case top at ${formatNumber(hottest.caseC, 0)} °C within ${plastic.time} (plastic, ${plastic.thresholdC} °C)`,
    ].filter(Boolean);
    return [
      {
        kind: 'hot-surface' as const,
        ref,
        condition: hottest.condition,
        message: `Hot surface at ${ref}: ${parts.join('; ')}. Do not touch; guard it and mark it where it can be reached.`,
      },
    ];
  });
}

function hotLaminate({ board, conditions }: FindingContext): Caution[] {
  return conditions.flatMap(({ condition, result }) =>
    result.board && result.board.maxC > board.stackup.maxOperatingC
      ? [
          {
            kind: 'laminate' as const,
            ref: null,
            condition: condition.name,
            message: `Laminate at ${formatNumber(result.board.maxC, 0)} °C, above its maximum operating temperature of ${formatNumber(board.stackup.maxOperatingC, 0)} °C: it may delaminate, char and burn.`,
          },
        ]
      : [],
  );
}

function hotNeighbours({ conditions }: FindingContext): Caution[] {
  return conditions.flatMap(({ condition, result }) =>
    result.sources
      .filter((source) => source.verdict === 'over')
      .map((source) => ({
        kind: 'neighbour' as const,
        ref: source.ref,
        condition: condition.name,
        message: `${source.ref} reaches ${formatNumber(source.temperatureC ?? NaN, 0)} °C, above its limit of ${formatNumber(source.limitC ?? NaN, 0)} °C: it may fail, vent or burn.`,
      })),
  );
}
