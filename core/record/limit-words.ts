import type { Board } from '#core/board/document.ts';
import { ruleSource } from '#core/derating/limits.ts';
import { formatNumber, formatQuantity } from '#core/format.ts';
import type { LimitResult, RegulatorResult } from '#core/result/result.ts';

export const quantityWords: Record<LimitResult['quantity'], string> = {
  junctionC: 'Junction temperature',
  inputV: 'Input voltage',
  outputA: 'Output current',
};

/** The same in one or two words, for narrow columns. */
export const shortQuantityWords: Record<LimitResult['quantity'], string> = {
  junctionC: 'Junction',
  inputV: 'Input voltage',
  outputA: 'Output current',
};

const units = { junctionC: '°C', inputV: 'V', outputA: 'A' } as const;

/** Actual or limit with its unit: "110.0 °C". */
export function limitValue(quantity: LimitResult['quantity'], value: number | null): string {
  return formatQuantity(value, units[quantity]);
}

/** Margin with its unit; kelvins for a temperature. */
export function marginText({ quantity, margin }: Pick<LimitResult, 'quantity' | 'margin'>): string {
  return formatQuantity(margin, quantity === 'junctionC' ? 'K' : units[quantity]);
}

export function ratioText(ratio: number | null): string {
  return formatNumber(ratio, 3);
}

/** Sign of the maker's own maximum among the rules R1, R2, … of the criteria. */
export const makersSign = 'M';

/** R1, R2, … by the order of the rules in the criteria; M for the maker's own maximum, which always applies. */
export function limitSigns(board: Board, { limits }: RegulatorResult): string[] {
  const { rules } = board.criteria;
  return limits.map((limit, index) => {
    const rule = rules[index];
    return rule && rule.quantity === limit.quantity && ruleSource(board, rule) === limit.source
      ? `R${index + 1}`
      : makersSign;
  });
}
