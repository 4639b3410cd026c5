import type { Finding } from '#core/result/result.ts';
import type { FindingContext, FindingRule } from './finding-context.ts';
import { aboveRating } from './findings/above-rating.ts';
import { conditionCount } from './findings/condition-count.ts';
import { dropperHeat } from './findings/dropper-heat.ts';
import { junctionCriteria } from './findings/junction-criteria.ts';
import { laminateOver } from './findings/laminate-over.ts';
import { missingInput } from './findings/missing-input.ts';
import { nearCorner } from './findings/near-corner.ts';
import { noHeadroom } from './findings/no-headroom.ts';
import { outsideOutline } from './findings/outside-outline.ts';
import { partsOverlap } from './findings/parts-overlap.ts';
import { shutdownCycling } from './findings/shutdown-cycling.ts';
import { supplyCorner } from './findings/supply-corner.ts';
import { tabCopper } from './findings/tab-copper.ts';
import { tabNetMismatch } from './findings/tab-net-mismatch.ts';
import { thermalNotice } from './findings/thermal-notice.ts';
import { viaUse } from './findings/via-use.ts';

/** Every rule, in the order in which findings are shown within a severity. */
const rules: readonly FindingRule[] = [
  outsideOutline,
  partsOverlap,
  tabNetMismatch,
  conditionCount,
  supplyCorner,
  junctionCriteria,
  missingInput,
  aboveRating,
  noHeadroom,
  dropperHeat,
  tabCopper,
  viaUse,
  laminateOver,
  shutdownCycling,
  nearCorner,
  thermalNotice,
];

const severities: readonly Finding['severity'][] = ['stop', 'warn', 'note'];

export function findAll(context: FindingContext): Finding[] {
  const found = rules.flatMap((rule) => rule(context));
  return severities.flatMap((severity) => found.filter((finding) => finding.severity === severity));
}
