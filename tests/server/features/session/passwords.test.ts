import { describe, expect, it } from 'vitest'
import { hashNewPassword, passwordMatches } from '../../../../server/features/session/passwords'

/** The middle one of three runs, in milliseconds. */
async function timed(work: () => Promise<unknown>): Promise<number> {
  const times: number[] = []
  for (let run = 0; run < 3; run += 1) {
    const began = performance.now()
    await work()
    times.push(performance.now() - began)
  }
  return times.sort((a, b) => a - b)[1]!
}

describe('a password', () => {
  it('is kept as a bcrypt hash of work factor 10 or more', async () => {
    const hash = await hashNewPassword('tide table of june', 'password')
    expect(Number(/^\$2b\$(\d\d)\$/.exec(hash)?.[1])).toBeGreaterThanOrEqual(10)
    expect(await passwordMatches('tide table of june', hash)).toBe(true)
    expect(await passwordMatches('tide table of July', hash)).toBe(false)
  })

  it('takes as long to refuse where there is no person as where it is wrong', async () => {
    const hash = await hashNewPassword('tide table of june', 'password')
    const wrong = await timed(() => passwordMatches('not this one at all', hash))
    const nobody = await timed(() => passwordMatches('not this one at all', undefined))
    const tooLong = await timed(() => passwordMatches('x'.repeat(100), hash))
    // Both run the same number of rounds; without them the ratio is near nought.
    for (const each of [nobody / wrong, tooLong / wrong]) {
      expect(each).toBeGreaterThan(0.4)
      expect(each).toBeLessThan(2.5)
    }
  })

  it('does not match by its first 72 bytes', async () => {
    const hash = await hashNewPassword('å'.repeat(36), 'password')
    expect(await passwordMatches('å'.repeat(36), hash)).toBe(true)
    expect(await passwordMatches(`${'å'.repeat(36)}x`, hash)).toBe(false)
  })
})
