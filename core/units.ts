/**
 * The one border between designers' units and SI. A quantity with another dimension is another type, so that a rise is
 * never taken for a temperature, nor a sheet conductance for a conductance. The brands vanish at run time.
 */
declare const dimension: unique symbol;
type Quantity<D extends string> = number & { readonly [dimension]: D };

/** Absolute temperature, K. */
export type Kelvin = Quantity<'temperature'>;
/** Difference of two temperatures, K. */
export type KelvinRise = Quantity<'rise'>;
/** W/K. */
export type Conductance = Quantity<'conductance'>;
/** k·t of a layer: W/K per square. */
export type SheetConductance = Quantity<'sheet conductance'>;
/** W/(m·K). */
export type Conductivity = Quantity<'conductivity'>;
/** W/(m²·K). */
export type FilmCoefficient = Quantity<'film coefficient'>;
export type Metre = Quantity<'length'>;

export const celsiusOffset = 273.15;
export const kelvin = (celsius: number) => (celsius + celsiusOffset) as Kelvin;
export const celsius = (temperature: Kelvin) => temperature - celsiusOffset;
export const rise = (kelvins: number) => kelvins as KelvinRise;
export const metresFromMm = (mm: number) => (mm * 1e-3) as Metre;
export const metresFromUm = (um: number) => (um * 1e-6) as Metre;
export const conductance = (value: number) => value as Conductance;
export const conductivity = (value: number) => value as Conductivity;
export const filmCoefficient = (value: number) => value as FilmCoefficient;
export const sheetConductance = (k: Conductivity, thickness: Metre) => (k * thickness) as SheetConductance;
