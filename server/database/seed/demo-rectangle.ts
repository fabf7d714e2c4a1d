import type { Rectangle } from '@shared/schemas/photo'
import { inches } from '@shared/units/length'
import type { DemoTruth } from './demo-truth'

type Corner = 0 | 1 | 2 | 3

/** The corner across the depth of the rectangle from each corner. */
const across: Record<Corner, Corner> = { 0: 3, 1: 2, 2: 1, 3: 0 }

/** The mat on the deck as a surveyor marks it: clockwise from the near left corner, `width` along the near side. */
export function demoRectangle({ reference: { width, depth, cornersPx } }: DemoTruth): Rectangle {
  const height = (a: Corner, b: Corner) => cornersPx[a][1] + cornersPx[b][1]
  const near: [Corner, Corner] = height(0, 1) > height(2, 3) ? [0, 1] : [2, 3]
  const [left, right] =
    cornersPx[near[0]][0] < cornersPx[near[1]][0] ? near : ([near[1], near[0]] as [Corner, Corner])
  const corners = [left, across[left], across[right], right].map((corner) => cornersPx[corner])
  return {
    width: inches(width),
    depth: inches(depth),
    corners: corners as [(typeof corners)[0], (typeof corners)[0], (typeof corners)[0], (typeof corners)[0]],
  }
}
