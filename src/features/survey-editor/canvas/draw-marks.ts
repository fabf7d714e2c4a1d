import type { PhotoPoint } from '@shared/geometry/point'
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

/** Everything of the survey on this photo: rectangle, bays, posts, in that order, so that posts lie uppermost. */
export function drawMarks(pen: Pen, { state, camera, captions, colours }: Drawing): void {
  const photo = photoOf(state.survey, state.photoId)
  if (!photo) return
  const strokes = drawnStrokes(state)
  const place = (at: PhotoPoint) => toScreen(camera, at)
  const selected = (kind: string, id: string) =>
    state.selection.kind === kind && 'id' in state.selection && state.selection.id === id
  drawRectangle(pen, { state, camera, captions, colours })
  for (const bay of state.survey.bays) {
    const line = bayLine(bay, strokes)
    if (!line) continue
    const [from, to] = [place(line[0]), place(line[1])]
    const caption = captions.bays.get(bay.id)
    const colour = selected('bay', bay.id) ? colours.chalk : colours.core
    pen.line([from, to], { colour, width: 2.5, dashed: caption?.missing ?? true })
    const middle = half(from, to)
    const width = pen.label(caption?.text ?? '?', middle, { colour })
    if (caption?.level) pen.finding(caption.level, { ...middle, screenX: middle.screenX + width / 2 + 12 })
  }
  for (const [id, stroke] of strokes) {
    const isSelected = selected('post', id)
    drawStroke(pen, {
      stroke,
      camera,
      colour: isSelected ? colours.chalk : colours.core,
      handles: isSelected,
    })
    const top = place(stroke.top)
    const flag = { screenX: top.screenX, screenY: top.screenY - 16 }
    const width = pen.label(id, flag, { colour: isSelected ? colours.chalk : colours.core, size: 14 })
    const level = captions.posts.get(id)
    if (level) pen.finding(level, { ...flag, screenX: flag.screenX + width / 2 + 11 })
  }
}

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
