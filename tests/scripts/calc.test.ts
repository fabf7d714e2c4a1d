import { execFile } from 'node:child_process'
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { afterAll, describe, expect, it } from 'vitest'

const script = fileURLToPath(new URL('../../scripts/calc.mjs', import.meta.url))
const example = fileURLToPath(new URL('../worked-examples/in/two-bays.json', import.meta.url))
const folder = mkdtempSync(join(tmpdir(), 'calc-'))
afterAll(() => rmSync(folder, { recursive: true }))

/** Runs the command as a person would, and gives what it printed and how it ended. */
const calc = (...args: string[]) =>
  new Promise<{ code: number; out: string; err: string }>((resolve) => {
    execFile(process.execPath, [script, ...args], (error, out, err) => {
      resolve({ code: error ? Number(error.code) : 0, out, err })
    })
  })

/** The example with a change made to it, in a file. */
function changed(name: string, change: (document: Document) => void): string {
  const document = JSON.parse(readFileSync(example, 'utf8')) as Document
  change(document)
  const path = join(folder, name)
  writeFileSync(path, JSON.stringify(document))
  return path
}
interface Document {
  survey: { runs: Record<string, unknown>[]; posts: Record<string, unknown>[]; [key: string]: unknown }
  hardware?: unknown
  rules?: unknown
}

describe('calc cutlist', { timeout: 30_000 }, () => {
  it('prints one JSON document and nothing else', async () => {
    const { code, out, err } = await calc('cutlist', example)
    expect({ code, err }).toEqual({ code: 0, err: '' })
    const answer = JSON.parse(out) as { cables: Record<string, unknown>[]; findings: unknown[] }
    expect(answer.cables).toHaveLength(11)
    expect(answer.cables[9]).toMatchObject({ run: 'R1', cable: 10, mode: 'shop', cut: 95.75 })
    expect(Object.keys(answer)).toEqual(['cables', 'findings'])
  })

  it('takes the starter hardware and rules where the file has none', async () => {
    const file = changed('bare.json', (document) => {
      delete document.hardware
      delete document.rules
    })
    const { code, out } = await calc('cutlist', file)
    expect(code).toBe(0)
    expect(out).toContain('"from":"sleeve-short"')
  })

  it('answers bad input with a line per error and 2', async () => {
    const file = changed('bad.json', ({ survey }) => {
      survey.runs[0]!['tension'] = 'tight'
      survey['colour'] = 'green'
    })
    const { code, out, err } = await calc('cutlist', file)
    expect({ code, out }).toEqual({ code: 2, out: '' })
    const lines = err.trimEnd().split('\n')
    expect(lines).toHaveLength(2)
    expect(err).toContain('survey.runs[0].tension')
    expect(err).toContain('survey.colour')
  })

  it('names a cable that the starter hardware lacks', async () => {
    const file = changed('cable.json', (document) => {
      delete document.hardware
      document.survey.runs[0]!['cable'] = 'c14'
    })
    expect(await calc('cutlist', file)).toMatchObject({
      code: 2,
      err: 'survey.runs[0].cable: found "c14", expected the id of a cable of the hardware: c18, c532, c316\n',
    })
  })

  it.each([
    [
      'a file that is not there',
      ['cutlist', join(folder, 'none.json')],
      /none\.json: cannot be read \(ENOENT\)/,
    ],
    ['a file that is not JSON', ['cutlist', script], /calc\.mjs: is not JSON/],
    [
      'an unknown calculation',
      ['cutlists', example],
      /^cutlists: unknown calculation, expected one of .*cutlist/,
    ],
    ['no file', ['cutlist'], /^expected: npm run --silent calc -- WHAT FILE\.json/],
  ])('refuses %s', async (_, args, expected) => {
    const { code, out, err } = await calc(...args)
    expect({ code, out, lines: err.trimEnd().split('\n').length }).toEqual({ code: 2, out: '', lines: 1 })
    expect(err).toMatch(expected)
  })
})
