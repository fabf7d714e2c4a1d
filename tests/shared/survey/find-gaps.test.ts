import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { calculateSurvey } from '@shared/calculation/calculate-survey'
import { applyOperation } from '@shared/survey/apply-operation'
import { findGaps, nextGap } from '@shared/survey/find-gaps'
import { inches } from '@shared/units/length'
import { aBay, aPost, aRow, aRun, surveyOf } from '../../factories/survey'
import { generatedInput } from '../calculation/support/generated'

const short = (survey: Parameters<typeof findGaps>[0]) =>
  findGaps(survey).map(({ code, where }) => `${where.post ?? where.bay ?? ''} ${code}`)

const overall = { id: 'r1', at: 'top' as const, value: inches(100) }
const bare = { material: undefined, along: undefined, across: undefined }

describe('what a survey misses', () => {
  it('asks for the first post of an empty survey', () => {
    expect(findGaps(surveyOf())).toEqual([
      {
        code: 'no-posts',
        where: {},
        text: 'There is no post yet. Put the first one on a photo or in the table.',
      },
    ])
  })

  it('finds nothing in a complete row', () => {
    expect(short(aRow([48, 48], { runs: [aRun('R1', ['B1', 'B2'])] }))).toEqual([])
  })

  it('names everything in walking order, ends before what lies between', () => {
    const survey = surveyOf({
      posts: [aPost('P9', bare), aPost('P1', bare), aPost('P2', bare), aPost('P3', { ...bare })],
      bays: [
        aBay('B1', ['P1', 'P2'], { read: null }),
        aBay('B2', ['P3', 'P2'], { read: null, kind: 'stair' }),
      ],
      runs: [aRun('R1', ['B1', 'B2'])],
    })
    expect(short(survey)).toEqual([
      'P1 material',
      'P1 size-along',
      'B1 reading',
      'P2 size-along',
      'B2 angle',
      'B2 reading',
      'P3 material',
      'P3 size-along',
      'P9 post-alone',
    ])
  })

  it('does not count a struck reading', () => {
    const bay = aBay('B1', ['P1', 'P2'], {
      readings: [{ id: 'r1', value: inches(63), struck: 'digits swapped' }],
    })
    const survey = surveyOf({ posts: [aPost('P1'), aPost('P2')], bays: [bay], runs: [aRun('R1', ['B1'])] })
    expect(short(survey)).toEqual(['B1 reading'])
  })

  it('needs neither bays nor passed posts measured where the run was read overall', () => {
    const posts = [aPost('P1'), aPost('P2', bare), aPost('P3')]
    const bays = [aBay('B1', ['P1', 'P2'], { read: null }), aBay('B2', ['P2', 'P3'], { read: null })]
    const runs = [aRun('R1', ['B1', 'B2'], { readings: [overall] })]
    expect(short(surveyOf({ posts, bays, runs }))).toEqual([])
    const struck = [aRun('R1', ['B1', 'B2'], { readings: [{ ...overall, struck: 'tape bent' }] })]
    expect(short(surveyOf({ posts, bays, runs: struck }))).toEqual([
      'B1 reading',
      'P2 size-along',
      'B2 reading',
    ])
  })

  it.each([
    [{ rise: inches(7), going: inches(10) }, []],
    [{ gauge: 35 }, []],
    [{ rise: inches(7) }, ['B1 angle']],
    [{}, ['B1 angle']],
  ])('a stair with %j misses %j', (angle, gaps) => {
    const bays = [aBay('B1', ['P1', 'P2'], { kind: 'stair', ...angle })]
    expect(short(surveyOf({ posts: [aPost('P1'), aPost('P2')], bays, runs: [aRun('R1', ['B1'])] }))).toEqual(
      gaps,
    )
  })

  it('asks for the core and cover of a veneered end, not for the size of a wall', () => {
    const posts = [aPost('P1', { material: 'veneered' }), aPost('P2', { ...bare, material: 'masonry' })]
    const survey = surveyOf({ posts, bays: [aBay('B1', ['P1', 'P2'])], runs: [aRun('R1', ['B1'])] })
    expect(short(survey)).toEqual(['P1 core', 'P1 cover'])
  })

  it('asks for the size across where a run leaves a corner the other way', () => {
    const posts = [aPost('P1'), aPost('P2', { across: undefined }), aPost('P3')]
    const bays = [aBay('B1', ['P1', 'P2']), aBay('B2', ['P2', 'P3'])]
    const runs = [aRun('R1', ['B1']), aRun('R2', ['B2'])]
    expect(short(surveyOf({ posts, bays, runs }))).toEqual(['P2 size-across'])
    expect(short(surveyOf({ posts, bays, runs, corners: [{ post: 'P2', angle: 180 }] }))).toEqual([])
  })

  it('before there are runs, asks for the ends of a row and for the runs', () => {
    const survey = surveyOf({
      posts: [aPost('P1', { material: undefined }), aPost('P2', bare), aPost('P3')],
      bays: [aBay('B1', ['P1', 'P2']), aBay('B2', ['P2', 'P3'])],
    })
    expect(short(survey)).toEqual(['P1 material', 'B1 no-run', 'B2 no-run'])
  })
})

describe('the next gap', () => {
  const survey = aRow([48, 48], {
    posts: [aPost('P1', bare), aPost('P2', bare), aPost('P3', bare)],
    runs: [aRun('R1', ['B1', 'B2'])],
  })
  const gaps = findGaps(survey)

  it('walks through all and begins again', () => {
    const walked = [nextGap(survey)]
    for (let i = 1; i <= gaps.length; i += 1) walked.push(nextGap(survey, walked.at(-1)))
    expect(walked).toEqual([...gaps, gaps[0]])
  })

  it('goes on from one that was filled', () => {
    const [first, second] = gaps
    expect(first?.code).toBe('material')
    const filled = applyOperation(survey, {
      type: 'post.set',
      id: 'P1',
      set: { material: 'hardwood' },
      unset: [],
    })
    expect(nextGap(filled, first)).toEqual(second)
  })

  it('is nothing when nothing is missing', () => {
    expect(nextGap(aRow([48], { runs: [aRun('R1', ['B1'])] }))).toBeUndefined()
  })
})

describe('gaps and the calculation', { timeout: 60_000 }, () => {
  const needed = {
    'missing-reading': 'reading',
    'missing-angle': 'angle',
    'missing-material': 'material',
  } as const

  it('whatever the calculation misses is a gap at the same place', () => {
    fc.assert(
      fc.property(generatedInput, (input) => {
        const gaps = findGaps(input.survey)
        const { findings } = calculateSurvey(input)
        for (const { code, where } of findings) {
          if (code === 'missing-size') {
            const sized = gaps.some((gap) => gap.code.startsWith('size-') && gap.where.post === where.post)
            expect(sized, `size of ${where.post}`).toBe(true)
          }
          const gapCode = needed[code as keyof typeof needed]
          if (!gapCode) continue
          const found = gaps.some(
            (gap) => gap.code === gapCode && gap.where.post === where.post && gap.where.bay === where.bay,
          )
          expect(found, `${code} at ${where.post ?? where.bay}`).toBe(true)
        }
      }),
      { numRuns: 200 },
    )
  })

  it('a reading or an angle that is a gap of a bay in a run stops the calculation', () => {
    fc.assert(
      fc.property(generatedInput, (input) => {
        const { findings } = calculateSurvey(input)
        for (const { code, where } of findGaps(input.survey)) {
          if (code !== 'reading' && code !== 'angle') continue
          expect(
            findings.some((finding) => finding.code === `missing-${code}` && finding.where.bay === where.bay),
          ).toBe(true)
        }
      }),
      { numRuns: 200 },
    )
  })
})
