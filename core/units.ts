/** 0 °C as an absolute temperature, K (exact). */
export const celsiusOffset = 273.15;
