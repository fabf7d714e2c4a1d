import fc from 'fast-check'
import { expect, it } from 'vitest'
import { splitEvenly } from '@shared/survey/split-evenly'

const row = (bays: number[], post = 0) => ({ bays, posts: bays.slice(1).map(() => post) })

it.each([
  [[10, 10, 10, 10, 10], 25, [2, 2, 1]],
  [[10, 10, 10, 10, 10, 10, 10], 35, [3, 2, 2]],
  [[10, 10, 10], 30, [3]],
  [[10, 10, 10], undefined, [3]],
  [[40, 10, 10], 25, [1, 2]],
  [[5, 5, 5, 20], 30, [3, 1]],
  [[], 30, []],
])('%j under %s are parts of %j', (bays, longest, parts) => {
  expect(splitEvenly(row(bays), longest)).toEqual(parts)
})

it('counts the posts passed, not those where a part ends', () => {
  expect(splitEvenly(row([10, 10, 10, 10], 3), 49)).toEqual([4])
  expect(splitEvenly(row([10, 10, 10, 10], 3), 48)).toEqual([2, 2])
})

/** Every way to divide n bays. */
function* ways(n: number): Generator<number[]> {
  if (n === 0) yield []
  for (let first = 1; first <= n; first += 1) for (const rest of ways(n - first)) yield [first, ...rest]
}

it('is the best of all ways there are', { timeout: 60_000 }, () => {
  const bays = fc.array(fc.integer({ min: 1, max: 40 }), { minLength: 1, maxLength: 8 })
  fc.assert(
    fc.property(
      bays,
      fc.integer({ min: 0, max: 5 }),
      fc.integer({ min: 10, max: 120 }),
      (lengths, post, longest) => {
        const score = (sizes: number[]): [number, number] | undefined => {
          let at = 0
          let squares = 0
          for (const size of sizes) {
            const part = lengths.slice(at, (at += size))
            const length = part.reduce((sum, bay) => sum + bay, 0) + (size - 1) * post
            if (length > longest && size > 1) return undefined
            squares += length * length
          }
          return [sizes.length, squares]
        }
        const all = [...ways(lengths.length)].flatMap((sizes) => {
          const scored = score(sizes)
          return scored ? [scored] : []
        })
        const best = all.reduce((a, b) => (b[0] < a[0] || (b[0] === a[0] && b[1] < a[1]) ? b : a))
        expect(score(splitEvenly(row(lengths, post), longest))).toEqual(best)
      },
    ),
  )
})
