import type { PhotoPoint } from '@shared/geometry/point'
import type { Survey } from '@shared/schemas/survey'
import { applyOperation } from '@shared/survey/apply-operation'
import { invertOperation } from '@shared/survey/invert-operation'
import { OperationRefused } from '@shared/survey/operation-refused'
import type { SurveyOperation } from '@shared/survey/survey-operation'
import { makeTools } from '../tools/all-tools'
import { oneGesture } from '../tools/one-gesture'
import type { ToolHost, ToolMachine } from '../tools/tool'
import type { ToolName } from '../tools/tool-names'
import {
  type Camera,
  fit,
  keepInView,
  leastZoom,
  panBy,
  pinch,
  screenPoint,
  toPhoto,
  toScreen,
  type Viewport,
  zoomAround,
} from './camera'
import type { Selection } from './editor-context'
import type { EditorState } from './editor-state'
import { doAgain, emptyHistory, type History, remember, takeBack } from './history'
import { hitTest } from './hit-test'
import { type PointerInput, reachOf, type ToolPointer, type WheelInput } from './inputs'
import { Pointers } from './pointers'
import { placeOfSelection } from './marks'
import { stillThere } from './selection'

export interface EditorOptions {
  survey: Survey
  /** Sizes of the pictures, by photo id of the survey. */
  pictures: ReadonlyMap<string, Viewport>
  canEdit: boolean
  /** Told of every change this hand makes, its undoing included; never of what the server sends. */
  onOperation: (operation: SurveyOperation) => void
  /** Told, in a sentence, of a change that did not fit. */
  onRefusal: (message: string) => void
  runsFor: (survey: Survey) => SurveyOperation[]
}

const UNKNOWN_PICTURE: Viewport = { width: 1600, height: 1200 }
const HERE: Camera = { zoom: 1, left: 0, top: 0 }

/**
 * The survey editor without a screen: it takes what hands do and keeps what is to be shown. React and Konva look at
 * `getSnapshot` and know nothing else of it.
 */
export class Editor {
  private state: EditorState
  private history: History = emptyHistory
  private pictures: ReadonlyMap<string, Viewport>
  private readonly listeners = new Set<() => void>()
  private readonly pointers = new Pointers()
  private readonly tools: Record<ToolName, ToolMachine>
  /** The tool of the gesture in hand: the chosen one, or *move photo* while a panning button is held. */
  private active: ToolMachine

  constructor(private readonly options: EditorOptions) {
    this.pictures = options.pictures
    this.state = {
      survey: options.survey,
      photoId: options.survey.photos[0]?.id ?? null,
      viewport: { width: 0, height: 0 },
      cameras: {},
      tool: 'select',
      selection: { kind: 'none' },
      draft: null,
      loupe: null,
      cursor: null,
      placing: null,
      hint: '',
      canEdit: options.canEdit,
      canUndo: false,
      canRedo: false,
    }
    this.tools = makeTools(this.host())
    this.active = this.tools.select
    this.state = { ...this.state, hint: this.active.hint }
  }

  // — what is shown —

  readonly subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener)
    return () => this.listeners.delete(listener)
  }

  readonly getSnapshot = (): EditorState => this.state

  get camera(): Camera {
    const { photoId, cameras, viewport } = this.state
    return (
      (photoId === null ? undefined : cameras[photoId]) ??
      (viewport.width > 0 ? fit(this.picture, viewport) : HERE)
    )
  }

  get picture(): Viewport {
    return this.pictures.get(this.state.photoId ?? '') ?? UNKNOWN_PICTURE
  }

  /** The state the current tool is in, for tests and for the canvas's cursor. */
  get toolState(): string {
    return this.active.stateName
  }

  // — changes of the survey —

  readonly perform = (operation: SurveyOperation): void => {
    const opposite = this.apply(operation)
    if (opposite) this.remembered(remember(this.history, opposite))
  }

  /** A change and the runs it asks for, as the house would lay them, in one gesture. */
  readonly performAndLay = (operation: SurveyOperation): void => {
    const { survey } = this.state
    // A change that does not fit is refused in the ordinary way.
    if (!fits(survey, operation)) return this.perform(operation)
    this.perform(oneGesture([operation, ...this.options.runsFor(applyOperation(survey, operation))]))
  }

  readonly undo = (): void => {
    this.cancel()
    const operation = this.history.undos.at(-1)
    if (!operation) return
    const opposite = this.apply(operation)
    if (opposite) this.remembered(takeBack(this.history, opposite))
    // Somebody else has changed what it would undo: the step is dropped, since it can never fit again.
    else this.remembered({ ...this.history, undos: this.history.undos.slice(0, -1) })
  }

  readonly redo = (): void => {
    this.cancel()
    const operation = this.history.redos.at(-1)
    if (!operation) return
    const opposite = this.apply(operation)
    if (opposite) this.remembered(doAgain(this.history, opposite))
    else this.remembered({ ...this.history, redos: this.history.redos.slice(0, -1) })
  }

  /** The survey as the server has it, with what this hand has not sent yet; never enters the history. */
  readonly receive = (survey: Survey, pictures: ReadonlyMap<string, Viewport> = this.pictures): void => {
    if (survey === this.state.survey && pictures === this.pictures) return
    this.pictures = pictures
    const photoId = survey.photos.some(({ id }) => id === this.state.photoId)
      ? this.state.photoId
      : (survey.photos[0]?.id ?? null)
    this.set({ survey, photoId, selection: stillThere(survey, this.state.selection) })
  }

  // — tools, photos, selection —

  readonly select = (selection: Selection): void => {
    this.set({ selection })
    this.reveal()
  }

  readonly chooseTool = (tool: ToolName): void => {
    if (!this.state.canEdit && tool !== 'select' && tool !== 'pan') return
    this.cancel()
    this.active = this.tools[tool]
    this.set({ tool, draft: null, placing: null })
  }

  readonly choosePhoto = (photoId: string): void => {
    this.cancel()
    this.set({ photoId, cursor: null, placing: null, draft: null })
  }

  readonly setPlacing = (placing: string | null): void => {
    if (this.state.tool !== 'post') this.chooseTool('post')
    this.set({ placing })
  }

  /** Drops the gesture in hand; nothing of it stays. Says whether there was one. */
  readonly cancel = (): boolean => {
    const busy = this.active.cancel()
    this.set({ draft: null, loupe: null })
    return busy
  }

  // — the view —

  readonly resize = (viewport: Viewport): void => {
    if (viewport.width === this.state.viewport.width && viewport.height === this.state.viewport.height) return
    this.set({ viewport })
    this.reveal()
  }

  readonly fitPhoto = (): void => this.look(fit(this.picture, this.state.viewport))

  readonly zoomBy = (factor: number, at = this.middle()): void =>
    this.look(zoomAround(this.camera, { at, factor, least: leastZoom(this.picture, this.state.viewport) }))

  // — the hand —

  readonly pointerDown = (pointer: PointerInput): void => {
    this.pointers.press(pointer)
    if (this.pointers.hold(this.camera)) {
      this.cancel()
      return
    }
    if (!this.pointers.single) return
    this.active = pointer.panning ? this.tools.pan : this.tools[this.state.tool]
    this.state = { ...this.state, cursor: null }
    this.active.pointerDown(this.seen(pointer))
    this.set({})
  }

  readonly pointerMove = (pointer: PointerInput): void => {
    if (!this.pointers.move(pointer)) return
    const pinched = this.pointers.pinchNow()
    if (pinched) this.look(pinch(pinched.start, pinched.now, leastZoom(this.picture, this.state.viewport)))
    if (!this.pointers.single) return
    this.active.pointerMove(this.seen(pointer))
    this.set({})
  }

  readonly pointerUp = (pointer: PointerInput): void => {
    const single = this.pointers.single
    this.pointers.lift(pointer.id)
    if (!single) return
    this.active.pointerUp(this.seen(pointer))
    this.active = this.tools[this.state.tool]
    this.set({})
  }

  /** The system took the pointer away (a call, a gesture of its own). */
  readonly pointerLost = (id: number): void => {
    this.pointers.lift(id)
    this.cancel()
  }

  readonly wheel = ({ at, deltaY, pinching }: WheelInput): void =>
    this.zoomBy(Math.exp(-deltaY * (pinching ? 0.01 : 0.0015)), at)

  // — the keyboard as a hand —

  /** Moves the selected mark, or the cursor where none is selected, by photo pixels. */
  readonly nudge = (dx: number, dy: number): void => {
    const { survey, photoId, selection, tool, canEdit } = this.state
    const photo = survey.photos.find(({ id }) => id === photoId)
    const mark = selection.kind === 'post' ? photo?.posts[selection.id] : undefined
    if (tool === 'select' && photo && mark && selection.kind === 'post' && canEdit) {
      const by = ([x, y]: PhotoPoint): PhotoPoint => [x + dx, y + dy]
      const moved = { base: by(mark.base), ...(mark.top ? { top: by(mark.top) } : {}) }
      this.perform({ type: 'photo.mark', photo: photo.id, post: selection.id, mark: moved })
      return
    }
    const [x, y] = this.state.cursor ?? toPhoto(this.camera, this.middle())
    this.set({ cursor: [x + dx, y + dy] })
  }

  /** A tap of the current tool where the keyboard's cursor stands. */
  readonly tapAtCursor = (): void => {
    const { cursor } = this.state
    if (!cursor) return this.set({ cursor: toPhoto(this.camera, this.middle()) })
    const pointer = { id: -1, kind: 'mouse' as const, at: toScreen(this.camera, cursor) }
    this.pointerDown(pointer)
    this.pointerUp(pointer)
    this.set({ cursor })
  }

  // — inside —

  /** Applies a change and says its opposite; tells of a change that does not fit and leaves everything as it was. */
  private apply(operation: SurveyOperation): SurveyOperation | undefined {
    if (!this.state.canEdit) return undefined
    try {
      const opposite = invertOperation(this.state.survey, operation)
      const survey = applyOperation(this.state.survey, operation)
      this.set({ survey, selection: stillThere(survey, this.state.selection) })
      this.options.onOperation(operation)
      return opposite
    } catch (error) {
      if (!(error instanceof OperationRefused)) throw error
      this.options.onRefusal(error.message)
      return undefined
    }
  }

  private remembered(history: History): void {
    this.history = history
    this.set({ canUndo: history.undos.length > 0, canRedo: history.redos.length > 0 })
  }

  private look(camera: Camera): void {
    const { photoId, viewport, cameras } = this.state
    if (photoId === null) return
    this.set({ cameras: { ...cameras, [photoId]: keepInView(camera, this.picture, viewport) } })
  }

  /** Moves the photo where the selected mark would be out of sight; a photo shown whole needs no moving. */
  private reveal(): void {
    const { survey, photoId, selection, viewport } = this.state
    if (photoId === null || !this.state.cameras[photoId] || viewport.width === 0) return
    const at = placeOfSelection(survey, photoId, selection)
    if (!at) return
    const { screenX, screenY } = toScreen(this.camera, at)
    const margin = Math.min(40, viewport.width / 4, viewport.height / 4)
    const inside =
      screenX > margin &&
      screenX < viewport.width - margin &&
      screenY > margin &&
      screenY < viewport.height - margin
    if (!inside) this.look(panBy(this.camera, viewport.width / 2 - screenX, viewport.height / 2 - screenY))
  }

  private middle() {
    return screenPoint(this.state.viewport.width / 2, this.state.viewport.height / 2)
  }

  private seen({ kind, at }: PointerInput): ToolPointer {
    return { kind, screen: at, photo: toPhoto(this.camera, at) }
  }

  private host(): ToolHost {
    const current = () => this.state
    return {
      get state() {
        return current()
      },
      targetAt: ({ photo, kind }) => hitTest(this.state, photo, reachOf(kind) / this.camera.zoom),
      perform: this.perform,
      select: this.select,
      draw: (draft) => this.set({ draft }),
      showLoupe: (loupe) => this.set({ loupe }),
      panBy: (dx, dy) => this.look(panBy(this.camera, dx, dy)),
      setPlacing: (placing) => this.set({ placing }),
      performAndLay: this.performAndLay,
    }
  }

  private set(changes: Partial<EditorState>): void {
    this.state = { ...this.state, ...changes, hint: this.active?.hint ?? '' }
    for (const listener of this.listeners) listener()
  }
}

function fits(survey: Survey, operation: SurveyOperation): boolean {
  try {
    applyOperation(survey, operation)
    return true
  } catch (error) {
    if (error instanceof OperationRefused) return false
    throw error
  }
}
