import type { FindingLevel } from '@shared/schemas/finding'
import { type Camera, type ScreenPoint, toScreen } from '../model/camera'
import type { Captions } from '../model/captions'
import type { EditorState } from '../model/editor-state'
import { bayLine, photoOf, type Stroke, strokesOf } from '../model/marks'
import type { DrawingColours } from './colours'
import type { Pen } from './pen'

export interface Drawing {
  state: EditorState
  camera: Camera
  captions: Captions
  colours: DrawingColours
}

const half = (a: ScreenPoint, b: ScreenPoint): ScreenPoint => ({
  screenX: (a.screenX + b.screenX) / 2,
  screenY: (a.screenY + b.screenY) / 2,
})

/** Everything of the survey on this photo: rectangle, lines, then labels, what is selected first, so that it is never covered. */
export function drawMarks(pen: Pen, drawing: Drawing): void {
  const { state, camera, captions } = drawing
  if (!photoOf(state.survey, state.photoId)) return
  const strokes = drawnStrokes(state)
  drawRectangle(pen, drawing)
  const bays = state.survey.bays.flatMap((bay): Labelled[] => {
    const line = bayLine(bay, strokes)
    if (!line) return []
    const [from, to] = [toScreen(camera, line[0]), toScreen(camera, line[1])]
    const caption = captions.bays.get(bay.id)
    const selected = isSelected(state, 'bay', bay.id)
    pen.line([from, to], {
      colour: colourOf(drawing, selected),
      width: 2.5,
      dashed: caption?.missing ?? true,
    })
    return [
      { text: caption?.text ?? '?', at: half(from, to), level: caption?.level ?? null, selected, size: 15 },
    ]
  })
  const posts = [...strokes].map(([id, stroke]): Labelled => {
    const selected = isSelected(state, 'post', id)
    drawStroke(pen, { stroke, camera, colour: colourOf(drawing, selected), handles: selected })
    const top = toScreen(camera, stroke.top)
    const at = { screenX: top.screenX, screenY: top.screenY - 16 }
    return { text: id, at, level: captions.posts.get(id) ?? null, selected, size: 14 }
  })
  const labels = [...posts, ...bays].sort((a, b) => Number(b.selected) - Number(a.selected))
  for (const { text, at, level, selected, size } of labels) {
    const edge = pen.label(text, at, { colour: colourOf(drawing, selected), size, must: selected })
    if (level) pen.finding(level, edge ? { ...edge, screenX: edge.screenX + 12 } : at)
  }
}

interface Labelled {
  text: string
  at: ScreenPoint
  level: FindingLevel | null
  selected: boolean
  size: number
}

const isSelected = ({ selection }: EditorState, kind: 'post' | 'bay', id: string): boolean =>
  selection.kind === kind && selection.id === id
const colourOf = ({ colours }: Drawing, selected: boolean): string =>
  selected ? colours.chalk : colours.core

/** The strokes as they stand, the one in hand where the hand has it. */
function drawnStrokes(state: EditorState): Map<string, Stroke> {
  const strokes = strokesOf(state.survey, photoOf(state.survey, state.photoId))
  if (state.draft?.kind === 'stroke' && state.draft.post) strokes.set(state.draft.post, state.draft.stroke)
  return strokes
}

interface StrokeLook {
  stroke: Stroke
  camera: Camera
  colour: string
  handles: boolean
}

function drawStroke(pen: Pen, { stroke, camera, colour, handles }: StrokeLook): void {
  const [base, top] = [toScreen(camera, stroke.base), toScreen(camera, stroke.top)]
  pen.line([base, top], { colour, width: 4 })
  // The tick that the taut line ends with, at the foot.
  const left = { ...base, screenX: base.screenX - 7 }
  const right = { ...base, screenX: base.screenX + 7 }
  pen.line([left, right], { colour, width: 3 })
  if (handles) {
    pen.dot(base, { colour, radius: 7 })
    pen.dot(top, { colour, radius: 7 })
  }
}

function drawRectangle(pen: Pen, { state, camera, colours }: Drawing): void {
  const photo = photoOf(state.survey, state.photoId)
  const { draft } = state
  const corners =
    draft?.kind === 'corners' || draft?.kind === 'rectangle' ? draft.corners : photo?.rectangle?.corners
  if (!corners || corners.length === 0) return
  const points = corners.map((corner) => toScreen(camera, corner))
  const colour = state.selection.kind === 'rectangle' ? colours.chalk : colours.core
  pen.line(points, { colour, width: 2, dashed: true, closed: corners.length === 4 })
  for (const point of points) pen.dot(point, { colour, radius: 4 })
}

/** What the hand is drawing, and where the keyboard points. */
export function drawDraft(pen: Pen, { state, camera, colours }: Drawing): void {
  const { draft, cursor } = state
  if (draft?.kind === 'stroke' && !draft.post) {
    drawStroke(pen, { stroke: draft.stroke, camera, colour: colours.chalk, handles: false })
  }
  if (draft?.kind === 'bay') {
    const strokes = strokesOf(state.survey, photoOf(state.survey, state.photoId))
    const from = strokes.get(draft.from)
    const onto = draft.onto ? strokes.get(draft.onto) : undefined
    if (from) {
      const middle = ({ base, top }: Stroke) => half(toScreen(camera, base), toScreen(camera, top))
      pen.line([middle(from), onto ? middle(onto) : toScreen(camera, draft.to)], { colour: colours.chalk })
    }
  }
  if (cursor) pen.cross(toScreen(camera, cursor), 18, colours.chalk)
}
