import { OperationRefused } from './operation-refused'

/** Puts an item into a copy of the list, at the index or the end. */
export function withItem<Item>(list: readonly Item[], item: Item, index = list.length): Item[] {
  return list.toSpliced(Math.min(index, list.length), 0, item)
}

/** The place of the item with this id. @throws OperationRefused `not-there` */
export function placeOf(list: readonly { id: string }[], id: string, noun: string): number {
  const index = list.findIndex((item) => item.id === id)
  if (index < 0) throw new OperationRefused('not-there', `There is no ${noun} ${id} in this survey any more.`)
  return index
}

/** The item with this id. @throws OperationRefused `not-there` */
export function itemOf<Item extends { id: string }>(list: readonly Item[], id: string, noun: string): Item {
  const item = list.find((candidate) => candidate.id === id)
  if (!item) throw new OperationRefused('not-there', `There is no ${noun} ${id} in this survey any more.`)
  return item
}

/** @throws OperationRefused `already-there` when the id is taken. */
export function assertNew(list: readonly { id: string }[], id: string, noun: string): void {
  if (list.some((item) => item.id === id)) {
    throw new OperationRefused('already-there', `There is a ${noun} ${id} in this survey already.`)
  }
}

/** The list with the item of this id replaced. */
export function withChanged<Item extends { id: string }>(
  list: readonly Item[],
  id: string,
  change: (item: Item) => Item,
): Item[] {
  return list.map((item) => (item.id === id ? change(item) : item))
}

/** A copy with some keys set and some taken away; a key that is absent stays absent. */
export function withFields<Thing extends object>(
  thing: Thing,
  { set, unset }: { set: Partial<Thing>; unset: readonly (keyof Thing)[] },
): Thing {
  const changed = { ...thing }
  for (const [key, value] of Object.entries(set)) {
    if (value !== undefined) changed[key as keyof Thing] = value as Thing[keyof Thing]
  }
  for (const key of unset) delete changed[key]
  return changed
}

/** A copy without one key. */
export function withoutKey<Thing extends object>(thing: Thing, key: keyof Thing): Thing {
  const changed = { ...thing }
  delete changed[key]
  return changed
}

/** @throws OperationRefused `not-there` with the first id that the list lacks. */
export function assertAllThere(list: readonly { id: string }[], ids: readonly string[], noun: string): void {
  for (const id of ids) itemOf(list, id, noun)
}
