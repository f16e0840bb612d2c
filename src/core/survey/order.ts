/**
 * A list sorted by the `order` keys of its items; items with equal keys keep their places, and an item without a key
 * stands where the list has it, after the item before it.
 */
export function ordered<T extends { order?: number }>(list: readonly T[]): T[] {
  let last = -Infinity;
  const keyed = list.map((item) => ({ item, key: (last = item.order ?? last) }));
  return keyed.sort((a, b) => (a.key === b.key ? 0 : a.key - b.key)).map(({ item }) => item);
}
