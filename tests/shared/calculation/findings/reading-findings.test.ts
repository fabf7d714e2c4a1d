import { describe, expect, it } from 'vitest'
import { bay, calculate, codes, oneBay, post } from '../support/inputs'

const reading = (id: string, at: string, value: number, struck?: string) => ({
  id,
  at,
  value,
  ...(struck ? { struck } : {}),
})
const withReadings = (...readings: object[]) => oneBay({ bays: [bay('B1', ['P1', 'P2'], [], { readings })] })

describe('readings at one place', () => {
  it('may differ by three reading limits, 3/16 in, and no more', () => {
    expect(codes(withReadings(reading('a', 'top', 48), reading('b', 'top', 48.1875)))).toEqual([])
    const given = withReadings(reading('a', 'top', 48), reading('b', 'top', 48.1876))
    expect(calculate(given).findings).toMatchObject([
      { level: 'check', code: 'readings-differ', where: { bay: 'B1' } },
    ])
  })

  it('are not compared with struck ones', () => {
    expect(codes(withReadings(reading('a', 'top', 48), reading('b', 'top', 84, 'digits swapped')))).toEqual(
      [],
    )
  })

  it('are named with their figures in the survey’s units', () => {
    const [finding] = calculate(
      withReadings(reading('a', 'bottom', 48), reading('b', 'bottom', 48.25)),
    ).findings
    expect(finding?.text).toBe(
      'The readings of bay B1 at the bottom lie 1/4 in apart, from 48 in to 48 1/4 in. Read it again and strike the wrong one.',
    )
  })
})

describe('top against bottom', () => {
  it('may differ by 1/4 in, and no more', () => {
    expect(codes(withReadings(reading('a', 'top', 48), reading('b', 'bottom', 48.25)))).toEqual([])
    const given = withReadings(reading('a', 'top', 48), reading('b', 'bottom', 48.2501))
    expect(calculate(given).findings).toMatchObject([
      { level: 'check', code: 'post-out-of-plumb', where: { bay: 'B1' } },
    ])
  })
})

describe('a bay in no run', () => {
  it('is looked at all the same', () => {
    const given = withReadings(reading('a', 'top', 48), reading('b', 'bottom', 49))
    expect(codes({ ...given, runs: [] })).toEqual(['post-out-of-plumb'])
  })
})

describe('the gauge', () => {
  const stair = (gauge: number) => ({
    posts: [post('P1'), post('P2')],
    bays: [bay('B1', ['P1', 'P2'], [60], { kind: 'stair', rise: 30, going: 40, gauge })],
  })

  it('may differ from rise and going by 1°, and no more', () => {
    // atan(0.75) = 36.8699°
    expect(codes(stair(37.86))).not.toContain('angle-differs')
    expect(calculate(stair(37.88)).findings[0]).toMatchObject({
      level: 'check',
      code: 'angle-differs',
      where: { bay: 'B1' },
    })
    expect(calculate(stair(35.8)).findings[0]?.text).toContain('36.87°, the gauge reads 35.8°')
  })
})

describe('overall readings', () => {
  it('are judged as a bay’s are', () => {
    const readings = [reading('a', 'top', 48), reading('b', 'top', 48.2), reading('c', 'bottom', 48.4)]
    const given = { ...withReadings(), run: { readings } }
    expect(calculate(given).findings).toMatchObject([
      { code: 'readings-differ', where: { run: 'R1' } },
      { code: 'post-out-of-plumb', where: { run: 'R1' } },
    ])
  })
})
