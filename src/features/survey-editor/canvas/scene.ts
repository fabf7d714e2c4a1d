import Konva from 'konva/lib/Core'
import { Image as KonvaImage } from 'konva/lib/shapes/Image'
import type { Captions } from '../model/captions'
import type { Editor } from '../model/editor'
import type { EditorState } from '../model/editor-state'
import { type DrawingColours, readColours } from './colours'
import { drawLoupe } from './draw-loupe'
import { drawDraft, drawMarks, type Drawing } from './draw-marks'
import { Pen } from './pen'

/**
 * The photo and its marks on a Konva stage. It looks at the editor and draws what changed; a pointer's move reaches no
 * React component and redraws only the layer that shows it.
 */
export class Scene {
  private readonly stage: Konva.Stage
  private readonly photo = new KonvaImage({ image: undefined, listening: false })
  private readonly layers: { photo: Konva.Layer; marks: Konva.Layer; hand: Konva.Layer }
  private readonly unsubscribe: () => void
  private colours: DrawingColours
  private captions: Captions = { bays: new Map(), posts: new Map() }
  private image: HTMLImageElement | null = null
  private drawn: EditorState | null = null
  private frame = 0

  constructor(
    private readonly container: HTMLDivElement,
    private readonly editor: Editor,
  ) {
    this.colours = readColours(container)
    this.stage = new Konva.Stage({ container, width: 1, height: 1, listening: false })
    const layer = (draw: (context: CanvasRenderingContext2D) => void) => {
      const made = new Konva.Layer({ listening: false })
      made.add(new Konva.Shape({ listening: false, sceneFunc: (context) => draw(context._context) }))
      return made
    }
    const photo = new Konva.Layer({ listening: false })
    photo.add(this.photo)
    this.layers = {
      photo,
      marks: layer((context) => drawMarks(new Pen(context, this.colours), this.drawing())),
      hand: layer((context) => this.drawHand(context)),
    }
    this.stage.add(this.layers.photo, this.layers.marks, this.layers.hand)
    this.unsubscribe = editor.subscribe(() => this.schedule())
    this.schedule()
  }

  setCaptions(captions: Captions): void {
    this.captions = captions
    this.redraw()
  }

  setImage(image: HTMLImageElement | null): void {
    this.image = image
    this.photo.image(image ?? undefined)
    this.redraw()
  }

  /** After the theme or the fonts have changed. */
  redraw(): void {
    this.colours = readColours(this.container)
    this.drawn = null
    this.schedule()
  }

  resize(width: number, height: number): void {
    this.stage.size({ width, height })
    this.editor.resize({ width, height })
    this.redraw()
  }

  destroy(): void {
    cancelAnimationFrame(this.frame)
    this.unsubscribe()
    this.stage.destroy()
  }

  /** At most once a frame, however fast the pointer moves. */
  private schedule(): void {
    if (this.frame !== 0) return
    this.frame = requestAnimationFrame(() => {
      this.frame = 0
      this.draw()
    })
  }

  private draw(): void {
    const before = this.drawn
    const now = this.editor.getSnapshot()
    this.drawn = now
    const changed = (...keys: (keyof EditorState)[]) =>
      !before || keys.some((key) => before[key] !== now[key])
    const moved = changed('cameras', 'photoId', 'viewport')
    if (moved) {
      const { zoom, left, top } = this.editor.camera
      const { width, height } = this.editor.picture
      this.photo.position({ x: left, y: top })
      this.photo.size({ width: width * zoom, height: height * zoom })
      this.layers.photo.draw()
    }
    if (moved || changed('survey', 'selection', 'draft')) this.layers.marks.draw()
    if (moved || changed('draft', 'loupe', 'cursor')) this.layers.hand.draw()
  }

  private drawing(): Drawing {
    return {
      state: this.editor.getSnapshot(),
      camera: this.editor.camera,
      captions: this.captions,
      colours: this.colours,
    }
  }

  private drawHand(context: CanvasRenderingContext2D): void {
    const drawing = this.drawing()
    drawDraft(new Pen(context, this.colours), drawing)
    const { loupe, viewport } = drawing.state
    if (!loupe || !this.image) return
    const scale = this.image.naturalWidth / this.editor.picture.width
    drawLoupe(context, {
      at: loupe,
      image: this.image,
      scale,
      camera: drawing.camera,
      viewport,
      colours: this.colours,
    })
  }
}
