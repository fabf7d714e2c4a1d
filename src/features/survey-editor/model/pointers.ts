import type { Camera, ScreenPoint } from './camera'
import type { PointerInput } from './inputs'

type Fingers = readonly [ScreenPoint, ScreenPoint]

/** Which pointers are down, and whether two of them pinch. */
export class Pointers {
  private readonly down = new Map<number, PointerInput>()
  private held: { camera: Camera; fingers: Fingers; ids: readonly [number, number] } | null = null

  /** The pointer whose gesture belongs to a tool: the only one there is. */
  get single(): boolean {
    return this.down.size === 1 && this.held === null
  }

  get pinching(): boolean {
    return this.held !== null
  }

  press(pointer: PointerInput): void {
    this.down.set(pointer.id, pointer)
  }

  move(pointer: PointerInput): boolean {
    if (!this.down.has(pointer.id)) return false
    this.down.set(pointer.id, pointer)
    return true
  }

  /** A pinch lasts until every finger is up, so that the last one leaves no mark. */
  lift(id: number): void {
    this.down.delete(id)
    if (this.down.size === 0) this.held = null
  }

  /** Begins a pinch when two fingers are down. */
  hold(camera: Camera): boolean {
    const [first, second] = [...this.down.values()]
    if (!first || !second || this.held) return false
    this.held = { camera, fingers: [first.at, second.at], ids: [first.id, second.id] }
    return true
  }

  /** Where the pinch began and where its fingers are now; none while one of them is up. */
  pinchNow(): { start: { camera: Camera; fingers: Fingers }; now: Fingers } | undefined {
    if (!this.held) return undefined
    const first = this.down.get(this.held.ids[0])
    const second = this.down.get(this.held.ids[1])
    return first && second ? { start: this.held, now: [first.at, second.at] } : undefined
  }
}
