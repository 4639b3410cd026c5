/** Copper foil and barrels, W/(m·K): between 386 (Cengel, ex. 3-5) and 398 (Incropera, ex. 3.9, 335 K). */
export const copperWPerMK = 390;
/** Epoxy resin in a plugged via, W/(m·K): common practice. */
export const resinWPerMK = 0.3;
/** Solder under a land as a conductance per area, W/(m²·K): 50 W/(m·K) over 0.1 mm, common practice. */
export const solderWPerM2K = 5e5;
/** Gap that keeps copper of two nets apart where the document does not draw one, mm: common practice. */
export const clearanceMm = 0.2;

/**
 * Sheet conductance of copper that covers a share c of its layer in no known pattern, as a share of the full sheet's:
 * c/(2 − c), the two-dimensional Maxwell value for separate islands, between the bounds 0 and c.
 */
export const patternedShare = (coverage: number) => coverage / (2 - coverage);
