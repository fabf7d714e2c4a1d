import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { calculateSurvey } from '@shared/calculation/calculate-survey'
import { cutDepth } from '@shared/calculation/cut-point'
import { explainCable } from '@shared/calculation/explain-cable'
import type { CableResult } from '@shared/calculation/result'
import type { CalculationInput } from '@shared/calculation/survey-index'
import { findingSchema } from '@shared/schemas/finding'
import { readSurveyFile, writeSurveyFile } from '@shared/schemas/survey-file'
import type { Survey } from '@shared/schemas/survey'
import { generatedInput } from './support/generated'

/** Noise allowed on sums of nanometres. */
const NOISE = 0.001
const check = (property: (input: CalculationInput) => void) =>
  fc.assert(fc.property(generatedInput, property), { numRuns: 200 })

const depthOf = ({ hardware }: CalculationInput, id: string) => {
  const fitting = hardware.fittings.find((one) => one.id === id)
  if (!fitting) throw new Error(`no fitting ${id}`)
  return cutDepth(fitting)
}
const baseOf = (input: CalculationInput, cable: Exclude<CableResult, { mode: 'none' }>) =>
  cable.path + depthOf(input, cable.from) + depthOf(input, cable.to)

describe('whatever the survey', { timeout: 60_000 }, () => {
  it('reaches every mode, so that what follows is about something', () => {
    const seen = new Set<string>()
    for (const input of fc.sample(generatedInput, { numRuns: 300, seed: 7 })) {
      for (const { mode, why } of calculateSurvey(input).cables) seen.add(why ?? mode)
    }
    expect([...seen].sort()).toEqual(['missing-reading', 'no-fitting', 'shop', 'site', 'too-long'])
  })

  it('a cut is never shorter than base + U and never a whole cutStep longer', () => {
    check((input) => {
      const single: CalculationInput = { ...input, rules: { ...input.rules, grouping: 'cable' } }
      for (const cable of calculateSurvey(single).cables) {
        if (cable.mode !== 'shop') continue
        const needed = baseOf(single, cable) + cable.u
        expect(cable.cut).toBeGreaterThanOrEqual(needed - NOISE)
        expect(cable.cut).toBeLessThan(needed + input.rules.cutStep)
        expect(cable.cut % input.rules.cutStep).toBe(0)
      }
    })
  })

  it('a cable that can be cut stays within its limit and its longest, and is finished at base', () => {
    check((input) => {
      for (const cable of calculateSurvey(input).cables) {
        if (cable.mode === 'none') continue
        expect(cable.worst).toBeLessThanOrEqual(cable.limit + NOISE)
        expect(cable.path).toBeLessThanOrEqual(cable.longest + NOISE)
        if (cable.mode === 'site') expect(Math.abs(cable.finish - baseOf(input, cable))).toBeLessThan(NOISE)
      }
    })
  })

  it('no figure is NaN, infinite or, being a length, negative', () => {
    check((input) => {
      const { cables, findings } = calculateSurvey(input)
      for (const cable of cables) {
        for (const value of Object.values(cable)) {
          if (typeof value !== 'number') continue
          expect(Number.isFinite(value)).toBe(true)
          expect(value).toBeGreaterThanOrEqual(-NOISE)
        }
        if (cable.mode !== 'none') expect(cable.cut).toBeGreaterThan(0)
      }
      for (const finding of findings) {
        expect(findingSchema.safeParse(finding).success).toBe(true)
        expect(finding.text).not.toMatch(/NaN|undefined|Infinity/)
      }
    })
  })

  it('a cable without a length has a finding that stops its run', () => {
    check((input) => {
      const { cables, findings } = calculateSurvey(input)
      for (const { run } of cables.filter(({ mode }) => mode === 'none')) {
        expect(findings.some(({ level, where }) => level === 'stop' && where.run === run)).toBe(true)
      }
    })
  })

  it('says nothing twice', () => {
    check((input) => {
      const texts = calculateSurvey(input).findings.map(({ text }) => text)
      expect(new Set(texts).size).toBe(texts.length)
    })
  })

  it('explains each cable with the same result', () => {
    check((input) => {
      for (const cable of calculateSurvey(input).cables) {
        expect(explainCable(input, { run: cable.run, cable: cable.cable })?.result).toEqual(cable)
      }
    })
  })
})

describe('mirrored runs', { timeout: 60_000 }, () => {
  /** Every run the other way round, every bay written from its other end. */
  const mirrored = (survey: Survey): Survey => ({
    ...survey,
    bays: survey.bays.map((bay) => ({
      ...bay,
      from: bay.to,
      to: bay.from,
      skewFrom: bay.skewTo,
      skewTo: bay.skewFrom,
    })),
    runs: survey.runs.map((run) => ({ ...run, bays: [...run.bays].reverse() })),
  })

  const close = (a: number | undefined, b: number | undefined) =>
    a === b || (a !== undefined && b !== undefined && Math.abs(a - b) < NOISE)

  it('give mirrored results', () => {
    check((input) => {
      const there = calculateSurvey(input)
      const back = calculateSurvey({ ...input, survey: mirrored(input.survey) })
      expect(back.cables).toHaveLength(there.cables.length)
      for (const [i, cable] of there.cables.entries()) {
        const other = back.cables[i]
        expect([other?.mode, other?.why, other?.cut, other?.height]).toEqual([
          cable.mode,
          cable.why,
          cable.cut,
          cable.height,
        ])
        expect([other?.from, other?.to]).toEqual([cable.to, cable.from])
        for (const key of ['path', 'u', 'planned', 'worst', 'limit', 'longest', 'finish', 'slack'] as const) {
          expect(close(other?.[key], cable[key]), key).toBe(true)
        }
      }
    })
  })

  it('and a run of several bays does not mind which way each is written', () => {
    check((input) => {
      const turned: Survey = {
        ...input.survey,
        bays: input.survey.bays.map((bay, i) =>
          i % 2 === 0
            ? bay
            : { ...bay, from: bay.to, to: bay.from, skewFrom: bay.skewTo, skewTo: bay.skewFrom },
        ),
      }
      const long = new Set(input.survey.runs.filter(({ bays }) => bays.length > 1).map(({ id }) => id))
      const only = (survey: Survey) =>
        calculateSurvey({ ...input, survey }).cables.filter(({ run }) => long.has(run))
      expect(only(turned)).toEqual(only(input.survey))
    })
  })
})

describe('units', { timeout: 60_000 }, () => {
  it('in millimetres or inches give the same cut to 1 nm', () => {
    check((input) => {
      const inches = readSurveyFile(writeSurveyFile(input))
      const units = { length: 'mm', force: 'N' } as const
      const written = writeSurveyFile({ ...input, survey: { ...input.survey, units } })
      const millimetres = readSurveyFile(written)
      const there = calculateSurvey({ ...input, ...inches })
      const back = calculateSurvey({ ...input, ...millimetres })
      for (const [i, cable] of there.cables.entries()) {
        expect(Math.abs((back.cables[i]?.cut ?? 0) - (cable.cut ?? 0))).toBeLessThanOrEqual(1)
        expect(back.cables[i]?.mode).toBe(cable.mode)
      }
    })
  })
})
