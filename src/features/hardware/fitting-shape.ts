import type { Fitting } from '@shared/schemas/hardware'
import { inches } from '@shared/units/length'

export type DrawnFitting = Pick<
  Fitting,
  'mount' | 'body' | 'headProjection' | 'cutPastFace' | 'takeUp' | 'hole' | 'spotFace'
>

/** From one place along the cable to another, in the drawing's own units. */
export interface Span {
  from: number
  to: number
}

export interface FittingShape {
  /** Depth of the post that is drawn, nanometres. */
  postDepth: number
  /** How deep past the post's face the bare cable ends, nanometres; negative before the face. */
  depth: number
  post: Span
  /** None for a fitting on the face. */
  body: Span | undefined
  head: Span
  cutPastFace: Span
  /** From where the cable ends to where its end is once the whole take-up is used. */
  takeUp: Span
  /** From its end to the edge of the drawing. */
  cable: Span
  /** Heights across the cable. */
  bodyHeight: number
  headHeight: number
}

/** A 4x4 post as it is milled; a body that would not leave a back wall in it is drawn in a deeper one. */
const POST = inches(3.5)
const BACK_WALL = inches(0.5)
const CABLE_SHOWN = inches(1.25)
/** Drawn where the fitting says nothing. */
const HOLE = inches(9 / 16)
const HEAD = inches(3 / 4)

/**
 * Where the parts of a fitting lie along the cable, drawn to one scale that fits the width. The post is at the left.
 * @param width of the drawing, in its own units
 */
export function fittingShape(fitting: DrawnFitting, width: number): FittingShape {
  const { mount, body, headProjection, cutPastFace, takeUp, hole, spotFace } = fitting
  const postDepth = mount === 'drilled' ? Math.max(POST, body + BACK_WALL) : POST
  // Along the cable, from the post's face outward.
  const end = headProjection - cutPastFace
  const left = Math.min(-postDepth, end - takeUp)
  const right = Math.max(headProjection, end) + CABLE_SHOWN
  const scale = width / (right - left)
  const at = (place: number) => (place - left) * scale
  const span = (from: number, to: number): Span => ({ from: at(from), to: at(to) })
  return {
    postDepth,
    depth: -end + 0,
    post: span(-postDepth, 0),
    body: mount === 'drilled' ? span(0 - body, 0) : undefined,
    head: span(0, headProjection),
    cutPastFace: span(Math.min(end, headProjection), Math.max(end, headProjection)),
    takeUp: span(end - takeUp, end),
    cable: span(end, right),
    bodyHeight: (hole ?? HOLE) * scale,
    headHeight: Math.max(spotFace ?? HEAD, hole ?? HOLE) * scale,
  }
}
