import type { CatalogueCable, CatalogueFitting } from '@shared/schemas/catalogue'

/** Small letters without accents, so that a search finds what was typed on any keyboard. */
const plain = (text: string): string => text.normalize('NFD').replace(/\p{M}/gu, '').toLowerCase()

const wordsOf = (search: string): string[] => plain(search).split(/\s+/).filter(Boolean)

const hasAll = (texts: readonly string[], search: string): boolean => {
  const text = plain(texts.join(' '))
  return wordsOf(search).every((word) => text.includes(word))
}

/** Fittings whose name, id, mount, materials or cables hold every word of the search, in their order. */
export const findFittings = (fittings: readonly CatalogueFitting[], search: string): CatalogueFitting[] =>
  fittings.filter(({ fitting: { id, name, mount, materials, cables } }) =>
    hasAll([id, name, mount, ...materials, ...cables], search),
  )

/** Cables whose name, id or construction hold every word of the search, in their order. */
export const findCables = (cables: readonly CatalogueCable[], search: string): CatalogueCable[] =>
  cables.filter(({ cable: { id, name, construction } }) => hasAll([id, name, construction], search))
