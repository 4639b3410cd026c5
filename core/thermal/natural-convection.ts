import type { AirProperties } from './air-properties.ts';

export type Attitude = 'face-up' | 'face-down' | 'upright';

const gravity = 9.80665;

/** @param air at the film temperature */
export function rayleigh(air: AirProperties, riseK: number, lengthM: number): number {
  return (gravity * air.expansion * Math.abs(riseK) * lengthM ** 3) / (air.viscosity * air.diffusivity);
}

/**
 * Nusselt number of a warm plate in still air.
 * upright: Churchill and Chu (1975), all Ra, length = height; face-up and face-down: Raithby and Hollands, Handbook of
 * Heat Transfer (from memory), length = area ÷ perimeter. Face up: 5 to 13 % below 0.54·Ra^¼ (Cengel, table 9-1) from Ra 1e4 to 1e7.
 * Face down: within 12 % of 0.27·Ra^¼ (the same) from 1e5 to 1e6 and of 0.52·Ra^⅕ (Incropera 9.32, from memory) from 1e4 to 1e6;
 * beyond 1e7 the published fits part by a quarter and more.
 */
export function naturalNusselt(attitude: Attitude, ra: number, prandtl: number): number {
  if (ra <= 0) return attitude === 'upright' ? 0.68 : attitude === 'face-up' ? 1 : 2.5 / Math.log(1 + 2.5 / 1e-3);
  if (attitude === 'upright') {
    return (0.825 + (0.387 * ra ** (1 / 6)) / (1 + (0.492 / prandtl) ** (9 / 16)) ** (8 / 27)) ** 2;
  }
  if (attitude === 'face-up') {
    const thin = 0.835 * 0.515 * ra ** 0.25;
    const laminar = 1.4 / Math.log(1 + 1.4 / thin);
    const turbulent = 0.14 * ra ** (1 / 3);
    return (laminar ** 10 + turbulent ** 10) ** 0.1;
  }
  const thin = (0.527 * ra ** 0.2) / (1 + (1.9 / prandtl) ** 0.9) ** (2 / 9);
  return 2.5 / Math.log(1 + 2.5 / thin);
}

/**
 * Mean film coefficient, W/(m²·K).
 * @param air at the film temperature
 */
export function naturalFilm(attitude: Attitude, air: AirProperties, riseK: number, lengthM: number): number {
  return (naturalNusselt(attitude, rayleigh(air, riseK, lengthM), air.prandtl) * air.conductivity) / lengthM;
}
