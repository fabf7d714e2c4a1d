import type { PhotoPoint } from '@shared/geometry/point'
import type { Survey } from '@shared/schemas/survey'
import { newSurvey } from '@shared/survey/new-survey'
import { applyOperation } from '@shared/survey/apply-operation'
import type { SurveyOperation } from '@shared/survey/survey-operation'
import { screenPoint, toScreen } from '../../src/features/survey-editor/model/camera'
import { commandFor } from '../../src/features/survey-editor/model/commands'
import { Editor } from '../../src/features/survey-editor/model/editor'
import type { PointerInput } from '../../src/features/survey-editor/model/inputs'

/** Drives the editor as a hand would, in photo pixels. */
export class TestEditor {
  readonly editor: Editor
  readonly sent: SurveyOperation[] = []
  readonly refusals: string[] = []

  constructor({
    survey = withPhoto(),
    canEdit = true,
    runsFor = () => [],
  }: { survey?: Survey; canEdit?: boolean; runsFor?: (survey: Survey) => SurveyOperation[] } = {}) {
    this.editor = new Editor({
      survey,
      pictures: new Map([['F1', { width: 2000, height: 1500 }]]),
      canEdit,
      onOperation: (operation) => this.sent.push(operation),
      onRefusal: (message) => this.refusals.push(message),
      runsFor,
    })
    this.editor.resize({ width: 1000, height: 750 })
  }

  get survey(): Survey {
    return this.editor.getSnapshot().survey
  }

  get state() {
    return this.editor.getSnapshot()
  }

  down(at: PhotoPoint, pointer: Partial<PointerInput> = {}): this {
    this.editor.pointerDown(this.pointer(at, pointer))
    return this
  }

  move(at: PhotoPoint, pointer: Partial<PointerInput> = {}): this {
    this.editor.pointerMove(this.pointer(at, pointer))
    return this
  }

  up(at: PhotoPoint, pointer: Partial<PointerInput> = {}): this {
    this.editor.pointerUp(this.pointer(at, pointer))
    return this
  }

  tap(at: PhotoPoint, pointer: Partial<PointerInput> = {}): this {
    return this.down(at, pointer).up(at, pointer)
  }

  drag(from: PhotoPoint, to: PhotoPoint, pointer: Partial<PointerInput> = {}): this {
    const half: PhotoPoint = [(from[0] + to[0]) / 2, (from[1] + to[1]) / 2]
    return this.down(from, pointer).move(half, pointer).move(to, pointer).up(to, pointer)
  }

  key(key: string, { ctrl = false, shift = false } = {}): this {
    const command = commandFor({ key, ctrlKey: ctrl, metaKey: false, shiftKey: shift })
    if (command?.when(this.editor)) command.perform(this.editor)
    return this
  }

  private pointer(at: PhotoPoint, given: Partial<PointerInput>): PointerInput {
    return { id: 1, kind: 'mouse', at: toScreen(this.editor.camera, at), ...given }
  }
}

export const screen = screenPoint

/** An empty survey with one photo of 2000 by 1500 px. */
export const withPhoto = (): Survey =>
  applyOperation(newSurvey('Deck', { length: 'in', force: 'lbf' }), {
    type: 'photo.add',
    photo: { id: 'F1', file: 'deck.jpg', posts: {} },
  })
