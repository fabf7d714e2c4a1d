import { describe, expect, it } from 'vitest'
import { chooseFitting } from '@shared/calculation/choose-fitting'
import { starterHardware } from '@shared/calculation/starter-hardware'
import { starterRules } from '@shared/calculation/starter-rules'
import type { Post } from '@shared/schemas/post'
import { toPoundsForce } from '@shared/units/force'
import { inches } from '@shared/units/length'

const choose = (post: Omit<Post, 'id'>, size: number, angle = 0) =>
  chooseFitting(
    { post: { id: 'P1', ...post }, size: inches(size), angle },
    { cable: 'c532', fittings: starterHardware.fittings, backWall: starterRules.backWall },
  ).chosen?.id

describe('the starter catalogue', () => {
  it.each([
    ['a bare softwood 4x4', { material: 'softwood' }, 3.5, 0, 'sleeve-short'],
    ['a bare hardwood 4x4', { material: 'hardwood' }, 3.5, 0, 'sleeve-short'],
    [
      '3/4 in boards on softwood',
      { material: 'veneered', core: 'softwood', cover: inches(0.75) },
      5,
      0,
      'sleeve-middle',
    ],
    [
      '1 1/2 in of boards on softwood',
      { material: 'veneered', core: 'softwood', cover: inches(1.5) },
      6.5,
      0,
      'sleeve-long',
    ],
    ['a stair from a 4x4', { material: 'softwood' }, 3.5, 37, 'sleeve-stair'],
    ['a brick pier', { material: 'masonry' }, 12, 0, 'plate-masonry'],
    ['a steel post on a stair', { material: 'metal' }, 2, 37, 'lug-metal'],
  ] as const)('has a fitting for %s', (_, post, size, angle, expected) => {
    expect(choose(post, size, angle)).toBe(expected)
  })

  it('has three cables, stiffness as derived: 431, 673.5 and 970 kN', () => {
    // 7x7 areas 4.789, 7.484, 10.78 mm² · 90 kN/mm², in lbf: 96 900, 151 400, 218 100
    const stiffness = starterHardware.cables.map(({ axialStiffness }) => toPoundsForce(axialStiffness))
    expect(starterHardware.cables.map(({ id }) => id)).toEqual(['c18', 'c532', 'c316'])
    for (const [i, expected] of [96_900, 151_400, 218_100].entries()) {
      expect(Math.abs((stiffness[i] ?? NaN) / expected - 1)).toBeLessThan(1e-3)
    }
  })

  it('gives every fitting every cable and an id of its own', () => {
    expect(new Set(starterHardware.fittings.map(({ id }) => id)).size).toBe(6)
    for (const { cables } of starterHardware.fittings) expect(cables).toEqual(['c18', 'c532', 'c316'])
  })
})

describe('the starter rules', () => {
  it('are those of the survey file’s description', () => {
    expect(starterRules).toMatchObject({
      cutStep: inches(1 / 16),
      stacking: 'rss',
      grouping: 'cable',
      tapeClass: 'II',
      reserve: 0.15,
      trim: inches(4),
      backWall: inches(0.5),
      maxBend: 0,
    })
    expect(toPoundsForce(starterRules.tension)).toBeCloseTo(150, 9)
  })
})
