/** A share as per cent with one decimal, a true minus sign and no break before the unit. */
export const percent = (share: number) => `${share < 0 ? '−' : ''}${Math.abs(100 * share).toFixed(1)}\u00a0%`;
