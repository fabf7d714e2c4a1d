import { describe, expect, it } from 'vitest'
import type { SurveyFile } from '@shared/schemas/survey-file'
import { inches } from '@shared/units/length'
import { importNotes } from '../../../../server/features/surveys/import-notes'
import { workedExample } from '../../../factories/worked-example'

const file = (): SurveyFile => workedExample()
const own = () => workedExample()

describe('importNotes', () => {
  it('has nothing to say of a file that agrees with the company', () => {
    expect(importNotes(file(), own())).toEqual([])
    expect(importNotes({ survey: file().survey }, own())).toEqual([])
  })

  it('names hardware that the company lacks', () => {
    const company = own()
    company.hardware = { cables: company.hardware.cables, fittings: [] }
    expect(importNotes(file(), company)).toEqual([
      'The file also lists hardware that your catalogue lacks: F1. It was not added.',
    ])
  })

  it('names hardware with other figures; a name or a price changes no length', () => {
    const company = own()
    company.hardware.fittings[0]!.body = inches(2.25)
    company.hardware.cables[0]!.name = 'Ours'
    expect(importNotes(file(), company)).toEqual([
      'The file describes F1 otherwise than your catalogue. Yours is used.',
    ])
  })

  it('says that other rules are not taken', () => {
    const company = own()
    company.rules = { ...company.rules, reserve: 0.25 }
    expect(importNotes(file(), company)[0]).toMatch(/house rules differ from yours/)
  })

  it('names every picture that is left out', () => {
    const sent = file()
    const mark = { P1: { base: [1, 2] as const } }
    sent.survey.photos = ['a.jpg', 'b.jpg', 'c.jpg'].map((name, i) => ({
      id: `F${i}`,
      file: name,
      posts: mark,
    }))
    expect(importNotes(sent, own())[0]).toMatch(/^The pictures a\.jpg, b\.jpg and c\.jpg are not in the file/)
  })
})
