import type { CornerCheck } from '@shared/calculation/checks/check-corners'
import type { Fitting } from '@shared/schemas/hardware'
import { inches } from '@shared/units/length'
import { type Box, meet, type Spot, type Stretch } from './drawing'

/** The face a fitting sits on, seen from above; the run's own direction is to the left. */
export type Face = 'left' | 'near' | 'right'

export interface FittingIn {
  fitting: Pick<Fitting, 'mount' | 'body' | 'hole' | 'headProjection'>
  face: Face
}

/** A post as it is cut; nm. */
export interface PostCut {
  /** Left to right, and from near to far. */
  along: number
  across: number
  cover: number
}

export interface FittingDrawn {
  /** What is drilled; nothing for a fitting on the face, or without a known hole. */
  hole?: Box
  /** The fitting below the face. */
  body?: Box
  /** What stands proud of the face. */
  head: Box
  cable: Stretch
}

export interface SectionShape {
  width: number
  height: number
  post: Box
  /** Within the covers; the post itself where there are none. */
  core: Box
  fittings: readonly FittingDrawn[]
  /** Where two holes meet; nothing where they do not. */
  overlap?: Box
  /** Wood behind the first fitting's body, and beside its hole. */
  back?: Stretch
  edge?: Stretch
}

const MARGIN = 12
/** Of cable, beyond the head. */
const CABLE = inches(0.75)
/** Drawn where a fitting's thickness is not in the hardware, and how much of its hole a body fills. */
const THICK = inches(0.5)
const FILLS = 0.7

/** A post cut level at the cable's height, seen from above, to scale. */
export function sectionShape(
  { along, across, cover }: PostCut,
  ends: readonly FittingIn[],
  side: number,
): SectionShape {
  const reach = (face: Face) =>
    Math.max(
      0,
      ...ends.filter((end) => end.face === face).map(({ fitting }) => fitting.headProjection + CABLE),
    )
  const [left, right, near] = [reach('left'), reach('right'), reach('near')]
  const scale = (side - 2 * MARGIN) / Math.max(left + along + right, across + near)
  const [x, y] = [MARGIN + left * scale, MARGIN]
  const post = { x, y, width: along * scale, height: across * scale }
  const inset = cover * scale
  const drawn = ends.map((end) => fittingOn(post, end, scale))
  const [first, second] = drawn
  const overlap = first?.hole && second?.hole ? meet(first.hole, second.hole) : undefined
  return {
    width: (left + along + right) * scale + 2 * MARGIN,
    height: (across + near) * scale + 2 * MARGIN,
    post,
    core: {
      x: x + inset,
      y: y + inset,
      width: Math.max(0, post.width - 2 * inset),
      height: Math.max(0, post.height - 2 * inset),
    },
    fittings: drawn,
    ...(overlap ? { overlap } : {}),
    ...(ends.length === 1 && first ? roomOf(post, inset, first) : {}),
  }
}

/** Lays a rectangle from a face inward (`depth` above 0) or outward, centred in the face. */
function fromFace(post: Box, face: Face, { depth, thick }: { depth: number; thick: number }): Box {
  const middle = { x: post.x + post.width / 2, y: post.y + post.height / 2 }
  const size = Math.abs(depth)
  if (face === 'near') {
    const edge = post.y + post.height
    return { x: middle.x - thick / 2, y: depth > 0 ? edge - size : edge, width: thick, height: size }
  }
  const isLeft = face === 'left'
  const edge = isLeft ? post.x : post.x + post.width
  return { x: isLeft === depth > 0 ? edge : edge - size, y: middle.y - thick / 2, width: size, height: thick }
}

function fittingOn(post: Box, { fitting, face }: FittingIn, scale: number): FittingDrawn {
  const { mount, body, hole, headProjection } = fitting
  const drilled = mount === 'drilled'
  const thick = (hole === undefined ? THICK : hole * FILLS) * scale
  const head = fromFace(post, face, {
    depth: 0 - headProjection * scale,
    thick: (hole ?? THICK) * 1.3 * scale,
  })
  return {
    ...(drilled && hole !== undefined
      ? { hole: fromFace(post, face, { depth: body * scale, thick: hole * scale }) }
      : {}),
    ...(drilled ? { body: fromFace(post, face, { depth: body * scale, thick }) } : {}),
    head,
    cable: cableFrom(head, face, CABLE * scale),
  }
}

function cableFrom(head: Box, face: Face, length: number): Stretch {
  const [x, y] = [head.x + head.width / 2, head.y + head.height / 2]
  const starts: Record<Face, [Spot, Spot]> = {
    left: [
      { x: head.x, y },
      { x: head.x - length, y },
    ],
    right: [
      { x: head.x + head.width, y },
      { x: head.x + head.width + length, y },
    ],
    near: [
      { x, y: head.y + head.height },
      { x, y: head.y + head.height + length },
    ],
  }
  return starts[face]
}

/** Only for a hole from the left. */
function roomOf(post: Box, inset: number, { hole }: FittingDrawn): Pick<SectionShape, 'back' | 'edge'> {
  if (!hole) return {}
  const end = hole.x + hole.width
  const [y, x] = [hole.y + hole.height / 2, hole.x + hole.width / 2]
  return {
    back: [
      { x: end, y },
      { x: post.x + post.width, y },
    ],
    edge: [
      { x, y: post.y + inset },
      { x, y: hole.y },
    ],
  }
}

/** Two runs' holes on the face of run B, set apart in height. */
export interface StaggerShape {
  width: number
  height: number
  face: Box
  /** Run A's hole from the left, hidden in the post. */
  a: Box
  /** Run B's: round in the face, or from the right where the runs are end to end. */
  b: Box & { round: boolean }
  /** Centre to centre. */
  apart: Stretch
  label: Spot
}

/** Wood shown above and below the holes, and room for the figure beside the post. */
const AROUND = inches(0.75)
const FIGURE = 86

/** The stagger that is needed between two runs' holes, in elevation, to scale. */
export function staggerShape({ kind, a, b, along, stagger }: CornerCheck, width: number): StaggerShape {
  const [thickA, thickB] = [a.fitting.hole ?? 0, b.fitting.hole ?? 0]
  const scale = (width - 2 * MARGIN - FIGURE) / along
  const tall = stagger + (thickA + thickB) / 2 + 2 * AROUND
  const face = { x: MARGIN, y: MARGIN, width: along * scale, height: tall * scale }
  const upper = face.y + (AROUND + thickB / 2) * scale
  const lower = upper + stagger * scale
  const round = kind === 'turned'
  const wide = (round ? thickB : b.fitting.body) * scale
  const right = face.x + face.width
  return {
    width,
    height: face.height + 2 * MARGIN,
    face,
    a: { x: face.x, y: lower - (thickA / 2) * scale, width: a.fitting.body * scale, height: thickA * scale },
    b: {
      x: round ? face.x + (face.width - wide) / 2 : right - wide,
      y: upper - (thickB / 2) * scale,
      width: wide,
      height: thickB * scale,
      round,
    },
    apart: [
      { x: right + 14, y: lower },
      { x: right + 14, y: upper },
    ],
    label: { x: right + 24, y: (lower + upper) / 2 + 4.5 },
  }
}
