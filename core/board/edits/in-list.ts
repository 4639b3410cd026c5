/** The list with one item replaced; the very same list when nothing changed or nothing fits. */
export function replaced<T>(list: readonly T[], isMeant: (item: T) => boolean, change: (item: T) => T): T[] {
  let changed = false;
  const next = list.map((item) => {
    if (!isMeant(item)) return item;
    const after = change(item);
    changed ||= after !== item;
    return after;
  });
  return changed ? next : (list as T[]);
}

/** The list without the items that are meant; the very same list when there is none. */
export function without<T>(list: readonly T[], isMeant: (item: T, index: number) => boolean): T[] {
  const kept = list.filter((item, index) => !isMeant(item, index));
  return kept.length === list.length ? (list as T[]) : kept;
}
