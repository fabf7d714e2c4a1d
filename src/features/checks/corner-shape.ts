import type { CornerCheck, EndHole } from '@shared/calculation/checks/check-corners'

/** A rectangle on the drawing. */
export interface Box {
  x: number
  y: number
  width: number
  height: number
}

export interface CornerShape {
  post: Box
  /** Within the covers; the post itself where there are none. */
  core: Box
  a: Box
  b: Box
  /** Where both holes are; nothing where they do not meet. */
  overlap?: Box
  side: number
}

const MARGIN = 14

/**
 * A post cut level through its holes, to scale, seen from above: run A's hole goes in from the left face along the
 * post's `along`, run B's from the near face along `across`, or from the right face where they are end to end.
 */
export function cornerShape({ kind, a, b, along, across }: CornerCheck, side: number): CornerShape {
  const scale = (side - 2 * MARGIN) / Math.max(along, across)
  const [width, height] = [along * scale, across * scale]
  const post = { x: (side - width) / 2, y: (side - height) / 2, width, height }
  const cover = (a.post.post.cover ?? 0) * scale
  const core = {
    x: post.x + cover,
    y: post.y + cover,
    width: Math.max(0, width - 2 * cover),
    height: Math.max(0, height - 2 * cover),
  }
  const size = ({ fitting }: EndHole) => ({ body: fitting.body * scale, hole: (fitting.hole ?? 0) * scale })
  const [first, second] = [size(a), size(b)]
  const boxA = { x: post.x, y: post.y + (height - first.hole) / 2, width: first.body, height: first.hole }
  const boxB =
    kind === 'turned'
      ? {
          x: post.x + (width - second.hole) / 2,
          y: post.y + height - second.body,
          width: second.hole,
          height: second.body,
        }
      : {
          x: post.x + width - second.body,
          y: post.y + (height - second.hole) / 2,
          width: second.body,
          height: second.hole,
        }
  const overlap = meet(boxA, boxB)
  return { post, core, a: boxA, b: boxB, side, ...(overlap ? { overlap } : {}) }
}

function meet(a: Box, b: Box): Box | undefined {
  const x = Math.max(a.x, b.x)
  const y = Math.max(a.y, b.y)
  const width = Math.min(a.x + a.width, b.x + b.width) - x
  const height = Math.min(a.y + a.height, b.y + b.height) - y
  return width > 0 && height > 0 ? { x, y, width, height } : undefined
}
