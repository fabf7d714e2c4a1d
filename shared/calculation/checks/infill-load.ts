import { forcePushed, tensionPushed, type TautCable } from './taut-cable'

/** What a cable does under its share of the infill load. */
export interface InfillAnswer {
  /** q, N. */
  load: number
  /** At mid-span, nm. */
  deflection: number
  /** T′, N. */
  tension: number
}

const HALVINGS = 200

/**
 * One cable under the infill load of the guard rules.
 *
 * Formula: `q = load · pitch / side` on one cable at mid-span, x from `f(x) = q`, then T′.
 * Units: nm and N; pitch square to the cable; the load acts on a square of the side given.
 * Source: section 8 of the calculation; IRC Table R301.5 and IBC 1607 (50 lbf on 1 sq ft).
 *
 * @example 50 lbf on 12 in at a pitch of 3 in: q = 12.5 lbf
 */
export function infillLoad(
  cable: TautCable,
  { value, side }: { value: number; side: number },
  pitch: number,
): InfillAnswer {
  const load = (value * pitch) / side
  // f rises with x without end, so that doubling finds a bracket and halving the root.
  let high = cable.span
  while (forcePushed(cable, high) < load) high *= 2
  let low = 0
  for (let i = 0; i < HALVINGS && high - low > high * Number.EPSILON; i += 1) {
    const middle = (low + high) / 2
    if (forcePushed(cable, middle) < load) low = middle
    else high = middle
  }
  const deflection = (low + high) / 2
  return { load, deflection, tension: tensionPushed(cable, deflection) }
}
