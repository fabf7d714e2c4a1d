import type { FindingLevel } from '@shared/schemas/finding'
import type { ScreenPoint } from '../model/camera'
import type { DrawingColours } from './colours'

type Context = CanvasRenderingContext2D
export type Line = readonly ScreenPoint[]

/** Draws marks so that they read on any picture: a light core in a dark halo. Everything is in screen pixels. */
export class Pen {
  /** Labels drawn so far, so that none covers another. */
  private readonly taken: Box[] = []

  constructor(
    private readonly context: Context,
    private readonly colours: DrawingColours,
  ) {}

  line(points: Line, { colour = this.colours.core, width = 3, dashed = false, closed = false } = {}): void {
    const { context } = this
    context.lineCap = 'round'
    context.lineJoin = 'round'
    context.beginPath()
    points.forEach(({ screenX, screenY }, i) =>
      i === 0 ? context.moveTo(screenX, screenY) : context.lineTo(screenX, screenY),
    )
    if (closed) context.closePath()
    context.setLineDash([])
    context.strokeStyle = this.colours.halo
    context.globalAlpha = 0.75
    context.lineWidth = width + 4
    context.stroke()
    context.globalAlpha = 1
    context.setLineDash(dashed ? [8, 7] : [])
    context.strokeStyle = colour
    context.lineWidth = width
    context.stroke()
    context.setLineDash([])
  }

  dot({ screenX, screenY }: ScreenPoint, { colour = this.colours.core, radius = 5 } = {}): void {
    const { context } = this
    context.beginPath()
    context.arc(screenX, screenY, radius, 0, 2 * Math.PI)
    context.fillStyle = colour
    context.strokeStyle = this.colours.halo
    context.lineWidth = 2.5
    context.fill()
    context.stroke()
  }

  /**
   * A label on a dark ground, its middle at a place; where another one lies it moves up, or stays away. Answers where
   * its right edge is.
   */
  label(
    text: string,
    { screenX, screenY }: ScreenPoint,
    { colour = this.colours.core, size = 15, must = false } = {},
  ): ScreenPoint | undefined {
    const { context } = this
    context.font = `600 ${size}px "Barlow Semi Condensed", sans-serif`
    const width = context.measureText(text).width + 12
    const height = size + 8
    const box = (y: number) => ({
      left: screenX - width / 2,
      right: screenX + width / 2,
      top: y - height / 2,
      bottom: y + height / 2,
    })
    const free = [screenY, screenY - height - 2].find(
      (y) => !this.taken.some((other) => overlap(other, box(y))),
    )
    const y = free ?? (must ? screenY : undefined)
    if (y === undefined) return undefined
    this.taken.push(box(y))
    context.textAlign = 'center'
    context.textBaseline = 'middle'
    context.beginPath()
    context.roundRect(screenX - width / 2, y - height / 2, width, height, 6)
    context.globalAlpha = 0.88
    context.fillStyle = this.colours.halo
    context.fill()
    context.globalAlpha = 1
    context.fillStyle = colour
    context.fillText(text, screenX, y + 1)
    return { screenX: screenX + width / 2, screenY: y }
  }

  /** A finding's shape: triangle for a check, octagon for a stop. */
  finding(level: FindingLevel, { screenX: x, screenY: y }: ScreenPoint): void {
    if (level === 'note') return
    const { context } = this
    const sides = level === 'check' ? 3 : 8
    const turn = level === 'check' ? -Math.PI / 2 : Math.PI / 8
    context.beginPath()
    for (let side = 0; side < sides; side += 1) {
      const angle = turn + (side * 2 * Math.PI) / sides
      context.lineTo(x + 11 * Math.cos(angle), y + 11 * Math.sin(angle))
    }
    context.closePath()
    context.fillStyle = level === 'check' ? this.colours.marker : this.colours.stop
    context.strokeStyle = this.colours.halo
    context.lineWidth = 2.5
    context.lineJoin = 'round'
    context.fill()
    context.stroke()
    context.fillStyle = this.colours.halo
    context.font = '600 13px "Barlow", sans-serif'
    context.textAlign = 'center'
    context.textBaseline = 'middle'
    context.fillText('!', x, y + (level === 'check' ? 1.5 : 0.5))
  }

  cross({ screenX: x, screenY: y }: ScreenPoint, reach: number, colour: string): void {
    this.line(
      [
        { screenX: x - reach, screenY: y },
        { screenX: x + reach, screenY: y },
      ],
      { colour, width: 1.5 },
    )
    this.line(
      [
        { screenX: x, screenY: y - reach },
        { screenX: x, screenY: y + reach },
      ],
      { colour, width: 1.5 },
    )
  }
}

interface Box {
  left: number
  top: number
  right: number
  bottom: number
}

const overlap = (a: Box, b: Box): boolean =>
  a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom
