import { readFileSync } from 'node:fs'

/** What a stage came to. `faults` says what counts as failed beyond the tests that did: a skip, a file that did not load, nothing run. */
const tally = (passed, failed, faults = []) => ({ passed, failed: failed + faults.length, faults })

const readReport = (file) => {
  try {
    return JSON.parse(readFileSync(file, 'utf8'))
  } catch {
    return undefined
  }
}

/** A stage that is one check: lint, types. */
export const countCheck = (status) => tally(status === 0 ? 1 : 0, status === 0 ? 0 : 1)

/** A tally that passes although the program failed, or has nothing in it, is no proof of anything. */
function checked({ passed, failed, faults, status }) {
  if (passed + failed + faults.length === 0) faults.push('no test ran')
  else if (status !== 0 && failed + faults.length === 0) faults.push('failed outside of any test')
  return tally(passed, failed, faults)
}

/** Counts the JSON report of Vitest. */
export function countVitest({ report, status }) {
  if (!report) return tally(0, 0, ['no report was written'])
  const files = report.testResults ?? []
  const tests = files.flatMap(({ assertionResults }) => assertionResults)
  const faults = [
    ...files
      .filter(
        ({ status, assertionResults }) =>
          status === 'failed' && !assertionResults.some((each) => each.status === 'failed'),
      )
      .map(({ name }) => `${name} did not load or not end well`),
    ...tests
      .filter((each) => each.status !== 'passed' && each.status !== 'failed')
      .map(({ fullName }) => `skipped: ${fullName}`),
  ]
  const having = (status) => tests.filter((each) => each.status === status).length
  return checked({ passed: having('passed'), failed: having('failed'), faults, status })
}

/** Counts the JSON report of Playwright. */
export function countPlaywright({ report, status }) {
  if (!report) return tally(0, 0, ['no report was written'])
  const { expected = 0, flaky = 0, unexpected = 0, skipped = 0 } = report.stats ?? {}
  const faults = [
    ...(report.errors ?? []).map(({ message = 'an error outside of any test' }) => message.split('\n')[0]),
    ...Array.from({ length: skipped }, () => 'a browser test was skipped'),
  ]
  return checked({ passed: expected + flaky, failed: unexpected, faults, status })
}

export const readVitest = ({ file, status }) => countVitest({ report: readReport(file), status })
export const readPlaywright = ({ file, status }) => countPlaywright({ report: readReport(file), status })
