/** Copper foil and barrels, W/(m·K): between 386 (Cengel, ex. 3-5) and 398 (Incropera, ex. 3.9, 335 K). */
export const copperWPerMK = 390;
/** Epoxy resin in a plugged via, W/(m·K): common practice. */
export const resinWPerMK = 0.3;
/** Solder under a land as a conductance per area, W/(m²·K): 50 W/(m·K) over 0.1 mm, common practice. */
export const solderWPerM2K = 5e5;
/**
 * Conductivities of laminate, W/(m·K), that the published boards of the accuracy table stand for. FR-4 was measured as 1.06 in plane
 * and 0.34 through (Sarvar, Poole and Witting, J. Electron. Mater. 19 (1990) 1345), about 3 to 1 (Graebner and Azar, J. Heat
 * Transfer 119 (1997) 401); filled laminates reach the upper ends.
 */
export const laminateRange = { inPlane: [0.2, 2], through: [0.15, 1] } as const;
/** Emissivity of bare polished copper: 0.03 (from memory); the least that a face of a board can be expected to have. */
export const leastEmissivity = 0.03;
/** Gap that keeps copper of two nets apart where the document does not draw one, mm: common practice. */
export const clearanceMm = 0.2;

/**
 * Sheet conductance of copper that covers a share c of its layer in no known pattern, as a share of the full sheet's:
 * c/(2 − c), the two-dimensional Maxwell value for separate islands (from memory; c from 0 to 1),
 * between the bounds 0 and c: at most 0.17 below the upper one.
 */
export const patternedShare = (coverage: number) => coverage / (2 - coverage);
