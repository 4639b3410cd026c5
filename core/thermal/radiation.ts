/** Stefan–Boltzmann constant, W/(m²·K⁴) (CODATA). */
const sigma = 5.670374419e-8;

/**
 * Radiation to black surroundings at air temperature as a film coefficient, W/(m²·K): ε·σ·(Ts² + Ta²)·(Ts + Ta)
 * (exact for a grey, diffuse face that sees nothing else; Cengel, 1-5). Emissivity from 0.03, rises up to 250 K: beyond, a notice.
 */
export function radiationFilm(emissivity: number, surfaceK: number, ambientK: number): number {
  return emissivity * sigma * (surfaceK * surfaceK + ambientK * ambientK) * (surfaceK + ambientK);
}

/** What the film's heat flux gains beyond `radiationFilm` per kelvin of the face, W/(m²·K): 4·ε·σ·Ts³ less the film itself, 0 at least. */
export function radiationSlope(emissivity: number, surfaceK: number, ambientK: number): number {
  return Math.max(0, 4 * emissivity * sigma * surfaceK ** 3 - radiationFilm(emissivity, surfaceK, ambientK));
}
