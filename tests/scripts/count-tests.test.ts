import { describe, expect, it } from 'vitest'
import { countCheck, countPlaywright, countVitest } from '../../scripts/lib/count-tests.mjs'

const file = (...statuses: string[]) => ({
  name: 'a.test.ts',
  status: statuses.includes('failed') ? 'failed' : 'passed',
  assertionResults: statuses.map((status, i) => ({ status, fullName: `test ${i}` })),
})

describe('countVitest', () => {
  it('sums over files', () => {
    const report = { testResults: [file('passed', 'passed'), file('passed', 'failed')] }
    expect(countVitest({ report, status: 1 })).toMatchObject({ passed: 3, failed: 1, faults: [] })
  })

  it('counts a skipped test as failed and names it', () => {
    const counted = countVitest({ report: { testResults: [file('passed', 'skipped')] }, status: 0 })
    expect(counted).toMatchObject({ passed: 1, failed: 1, faults: ['skipped: test 1'] })
  })

  it('counts a file that did not load', () => {
    const report = { testResults: [file('passed'), { ...file(), status: 'failed' }] }
    expect(countVitest({ report, status: 1 })).toMatchObject({ passed: 1, failed: 1 })
  })

  it.each([
    ['nothing ran', { report: { testResults: [] }, status: 0 }],
    ['no report was written', { report: undefined, status: 1 }],
    ['it failed outside of any test', { report: { testResults: [file('passed')] }, status: 1 }],
  ])('counts one failure when %s', (_when, stage) => {
    expect(countVitest(stage).failed).toBe(1)
  })
})

describe('countPlaywright', () => {
  it('adds what passed only at a second try to the passed, and skips to the failed', () => {
    const stats = { expected: 4, flaky: 1, unexpected: 2, skipped: 1 }
    expect(countPlaywright({ report: { stats, errors: [] }, status: 1 })).toMatchObject({
      passed: 5,
      failed: 3,
    })
  })

  it('counts a server that did not start', () => {
    const report = {
      stats: { expected: 0 },
      errors: [{ message: 'Process from config.webServer exited\nlog' }],
    }
    expect(countPlaywright({ report, status: 1 })).toMatchObject({
      passed: 0,
      failed: 1,
      faults: ['Process from config.webServer exited'],
    })
  })

  it('counts a run without tests as failed', () => {
    expect(countPlaywright({ report: { stats: {} }, status: 0 })).toMatchObject({ passed: 0, failed: 1 })
  })
})

describe('countCheck', () => {
  it('is one check, passed or failed', () => {
    expect(
      [countCheck(0), countCheck(2), countCheck(null)].map(({ passed, failed }) => [passed, failed]),
    ).toEqual([
      [1, 0],
      [0, 1],
      [0, 1],
    ])
  })
})
