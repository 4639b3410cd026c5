/** A name that is not taken: the wanted one, or with the first free number behind it. */
export function freeName(wanted: string, taken: readonly string[]): string {
  if (!taken.includes(wanted)) return wanted;
  for (let number = 2; ; number++) {
    const name = `${wanted} ${number}`;
    if (!taken.includes(name)) return name;
  }
}
