import { forcePushed, type TautCable } from './taut-cable'

/** Two neighbouring cables and the sphere between them; nm. */
export interface SphereBetween {
  /** Square to the cables, centre to centre. */
  pitch: number
  /** Of the cables. */
  diameter: number
  /** Of the sphere. */
  sphere: number
}

const SCAN = 48
const NARROWINGS = 90
/** 1 / φ */
const GOLDEN = (Math.sqrt(5) - 1) / 2

/**
 * The largest push on a smooth rigid sphere between two neighbouring cables at mid-span: what it takes to force it
 * through.
 *
 * Formula: rc = (sphere + d) / 2; with the sphere's centre X from the cable plane, ρ = √(X² + (pitch / 2)²), each cable
 * is moved rc − ρ along ρ and pushes back, `P(X) = 2 · f(rc − ρ) · X / ρ`; the answer is the greatest P over
 * 0 < X < √(rc² − (pitch / 2)²). Zero when the sphere passes without touching.
 * Units: nm and N.
 * Source: section 8 of the calculation. No US code sets a force for the sphere.
 *
 * @example with EA 0 the greatest push is where ρ³ = rc · pitch² / 4
 */
export function pushThrough(cable: TautCable, { pitch, diameter, sphere }: SphereBetween): number {
  const reach = (sphere + diameter) / 2
  const half = pitch / 2
  if (half >= reach) return 0
  const last = Math.sqrt(reach * reach - half * half)
  const push = (x: number) => {
    const rho = Math.hypot(x, half)
    return (2 * forcePushed(cable, reach - rho) * x) / rho
  }
  let best = 0
  for (let i = 1; i < SCAN; i += 1) if (push((last * i) / SCAN) > push((last * best) / SCAN)) best = i
  return greatest(push, (last * Math.max(0, best - 1)) / SCAN, (last * (best + 1)) / SCAN)
}

/** The greatest value of a function with one peak between two places, by golden section. */
function greatest(value: (x: number) => number, from: number, to: number): number {
  let [low, high] = [from, to]
  let [left, right] = [high - GOLDEN * (high - low), low + GOLDEN * (high - low)]
  let [atLeft, atRight] = [value(left), value(right)]
  for (let i = 0; i < NARROWINGS; i += 1) {
    if (atLeft < atRight) {
      ;[low, left, atLeft] = [left, right, atRight]
      right = low + GOLDEN * (high - low)
      atRight = value(right)
    } else {
      ;[high, right, atRight] = [right, left, atLeft]
      left = high - GOLDEN * (high - low)
      atLeft = value(left)
    }
  }
  return Math.max(atLeft, atRight)
}
