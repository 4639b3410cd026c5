/** Columns as wide as their widest entry; numbers to the right, the first and last column to the left. */
export function textTable(head: readonly string[], rows: readonly (readonly string[])[]): string[] {
  const widths = head.map((title, k) => Math.max(title.length, ...rows.map((row) => row[k]!.length)));
  const line = (row: readonly string[]) =>
    `  ${row.map((cell, k) => (k === 0 || k === row.length - 1 ? cell.padEnd(widths[k]!) : cell.padStart(widths[k]!))).join('  ')}`.trimEnd();
  return [line(head), `  ${widths.map((width) => '─'.repeat(width)).join('  ')}`, ...rows.map(line)];
}
