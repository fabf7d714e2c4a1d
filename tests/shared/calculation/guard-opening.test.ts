import { describe, expect, it } from 'vitest'
import { guardOpening } from '@shared/calculation/guard-opening'
import { type Guard, makeGuardSchema } from '@shared/schemas/guard'
import { storedQuantities } from '@shared/schemas/quantities'
import { inches } from '@shared/units/length'

const guard = (more: Partial<Guard> = {}): Guard => makeGuardSchema(storedQuantities).parse(more)
const under = (top: number, bottom = 0) => ({ bottom: inches(bottom), top: inches(top) })

describe('guardOpening', () => {
  it('ends 1 1/2 in under the height where the underside was not given', () => {
    expect(guardOpening(guard(), false)).toEqual(under(34.5))
    expect(guardOpening(guard({ topRailUnderside: inches(33), bottom: inches(2) }), false)).toEqual(
      under(33, 2),
    )
  })

  it('takes the stair’s figures for stairs only, each where given', () => {
    const both = guard({
      topRailUnderside: inches(34),
      stair: { topRailUnderside: inches(32.5) },
      bottom: inches(1),
    })
    expect(guardOpening(both, true)).toEqual(under(32.5, 1))
    expect(guardOpening(both, false)).toEqual(under(34, 1))
    expect(guardOpening(guard({ stair: { height: inches(34) } }), true)).toEqual(under(32.5))
    expect(guardOpening(guard({ stair: { bottom: inches(3) } }), true)).toEqual(under(34.5, 3))
  })
})
