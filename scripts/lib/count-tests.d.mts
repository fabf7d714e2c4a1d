export interface Tally {
  passed: number
  failed: number
  /** What counts as failed beyond the tests that did. */
  faults: string[]
}

interface Stage {
  /** The parsed JSON report; undefined when none was written. */
  report: unknown
  /** Exit status of the program; null when it was killed. */
  status: number | null
}

export function countCheck(status: number | null): Tally
export function countVitest(stage: Stage): Tally
export function countPlaywright(stage: Stage): Tally
