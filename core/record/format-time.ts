/**
 * A time as "2026-12-01 14:05:33 +00:00": date, time and UTC offset, whatever the reader's machine is set to.
 * @param iso any ISO 8601 time with its offset
 */
export function formatTime(iso: string): string {
  const utc = new Date(iso).toISOString();
  return `${utc.slice(0, 10)} ${utc.slice(11, 19)} +00:00`;
}
