/**
 * Contact time to a serious burn by surface temperature, °C, for metal, glass and plastic: figures credited to a US burn
 * institute by a safety engineer on the IEEE product safety list (emc-pstc, message 05244). Above 70 °C bare smooth metal
 * burns within a second after EN 563 (same list, message 08864). Thresholds, not limits: ISO 13732-1 sets none.
 */
const thresholds: readonly { time: string; metal: number; glass: number; plastic: number }[] = [
  { time: 'one second', metal: 68, glass: 78, plastic: 93 },
  { time: 'a second and a half', metal: 66, glass: 76, plastic: 91 },
  { time: 'three seconds', metal: 63, glass: 73, plastic: 88 },
  { time: 'five seconds', metal: 60, glass: 70, plastic: 85 },
  { time: 'ten seconds', metal: 57, glass: 67, plastic: 82 },
  { time: 'half a minute', metal: 55, glass: 65, plastic: 80 },
  { time: 'two minutes', metal: 52, glass: 62, plastic: 77 },
  { time: 'some minutes', metal: 49, glass: 59, plastic: 74 },
];

/** The source of the thresholds as a caution names it. */
export const burnSource = 'times after burn-institute figures quoted on the IEEE product safety list';

/** Time in words after which a touch burns; null below every threshold. */
export function burnTime(
  material: 'metal' | 'glass' | 'plastic',
  temperatureC: number,
): { time: string; thresholdC: number } | null {
  const met = thresholds.find((row) => temperatureC >= row[material]);
  return met ? { time: met.time, thresholdC: met[material] } : null;
}
