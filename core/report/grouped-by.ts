/** At least one of something. */
export type Some<Item> = readonly [Item, ...Item[]]

/** Items by a name that is made of each, names and items in the order in which they come. */
export function groupedBy<Item>(items: Iterable<Item>, name: (item: Item) => string): Map<string, Some<Item>> {
  const groups = new Map<string, [Item, ...Item[]]>()
  for (const item of items) {
    const key = name(item)
    const group = groups.get(key)
    if (group) group.push(item)
    else groups.set(key, [item])
  }
  return groups
}
