/** ISO time as "2026-12-01 14:05 +00:00": date, time and offset, whatever the reader's machine is set to. */
export function formatTime(iso: string): string {
  return `${iso.slice(0, 10)} ${iso.slice(11, 16)} +00:00`;
}
