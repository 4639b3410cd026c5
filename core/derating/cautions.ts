import type { Caution } from '#core/result/result.ts';
import { burnSource, burnTime } from './burn-threshold.ts';
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

type Surface = { ref: string; condition: string; metalC: number; caseC: number | null };

/** One caution a part, for its hottest condition. */
function hotSurfaces({ board, conditions }: FindingContext): Caution[] {
  const surfaces = conditions.flatMap(({ condition, result }): Surface[] => [
    ...result.regulators.flatMap(({ ref, landC, caseTopC }) =>
      landC === null || caseTopC === null ? [] : [{ ref, condition: condition.name, metalC: landC, caseC: caseTopC }],
    ),
    ...result.sources.flatMap(({ ref, maxC }) =>
      maxC === null ? [] : [{ ref, condition: condition.name, metalC: maxC, caseC: null }],
    ),
  ]);
  return [...board.regulators, ...board.sources].flatMap(({ ref }) => {
    const hottest = surfaces
      .filter((surface) => surface.ref === ref)
      .reduce<Surface | null>((most, here) => (most && most.metalC >= here.metalC ? most : here), null);
    return hottest ? hotSurface(hottest) : [];
  });
}

function hotSurface({ ref, condition, metalC, caseC }: Surface): Caution[] {
  const metal = burnTime('metal', metalC);
  const plastic = caseC === null ? null : burnTime('plastic', caseC);
  const parts = [
    metal &&
      `bare metal at ${formatNumber(metalC, 0)} °C burns skin within ${metal.time} (from ${metal.thresholdC} °C on)`,
    plastic &&
      `the plastic case at ${formatNumber(caseC, 0)} °C within ${plastic.time} (from ${plastic.thresholdC} °C on)`,
  ].filter(Boolean);
  if (parts.length === 0) return [];
  return [
    {
      kind: 'hot-surface',
      ref,
      condition,
      message: `Hot surface at ${ref}: ${parts.join('; ')}; ${burnSource}. Do not touch; guard it and mark it where it can be reached.`,
    },
  ];
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
