/** The item with the least distance, the earlier of equals; undefined of none. */
export function closest<T>(items: readonly T[], distance: (item: T) => number): T | undefined {
  return items.reduce<T | undefined>((best, item) => (best === undefined || distance(item) < distance(best) ? item : best), undefined);
}
