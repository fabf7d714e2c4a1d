export interface Sort {
  /** The key of the column. */
  key: string
  down: boolean
}

export type SortValue = string | number | null | undefined

const isMissing = (value: SortValue): value is null | undefined | '' =>
  value === null || value === undefined || value === ''

const inOrder = new Intl.Collator('en', { numeric: true, sensitivity: 'base' })

const compare = (a: string | number, b: string | number): number =>
  typeof a === 'number' && typeof b === 'number' ? a - b : inOrder.compare(`${a}`, `${b}`)

/** Rows by a value, up or down; equal rows keep their order and rows without a value stay last either way. */
export function sortRows<Row>(
  rows: readonly Row[],
  valueOf: (row: Row) => SortValue,
  down: boolean,
): readonly Row[] {
  return [...rows].sort((one, other) => {
    const [a, b] = [valueOf(one), valueOf(other)]
    if (isMissing(a) || isMissing(b)) return Number(isMissing(a)) - Number(isMissing(b))
    return down ? compare(b, a) : compare(a, b)
  })
}

/** What pressing a column's header does: first up, then down, then as the rows came. */
export function nextSort(sort: Sort | undefined, key: string): Sort | undefined {
  if (sort?.key !== key) return { key, down: false }
  return sort.down ? undefined : { key, down: true }
}
