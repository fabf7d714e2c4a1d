import { describe, expect, it } from 'vitest'
import { newBay } from '@shared/survey/new-bay'
import { inches } from '@shared/units/length'
import { captionsOf } from '../../../../src/features/survey-editor/model/captions'
import { withPhoto } from '../../../support/test-editor'

const format = { style: 'inches', finest: 16 } as const
const bay = newBay({ id: 'B1', from: 'P1', to: 'P2' })
const survey = (bays: (typeof bay)[]) => ({ ...withPhoto(), posts: [{ id: 'P1' }, { id: 'P2' }], bays })

describe('captionsOf', () => {
  it('shows the top reading, and a question mark while there is none', () => {
    const readings = [
      { id: 'r1', at: 'bottom' as const, value: inches(46.25) },
      { id: 'r2', at: 'top' as const, value: inches(46.5) },
    ]
    const read = captionsOf(survey([{ ...bay, readings }]), [], format)
    expect(read.bays.get('B1')).toEqual({ text: '46 1/2"', missing: false, level: null })
    expect(captionsOf(survey([bay]), [], format).bays.get('B1')).toMatchObject({ text: '?', missing: true })
  })

  it('gives a place the gravest of its findings, and none for what is only missing yet', () => {
    const findings = [
      { level: 'check', code: 'readings-differ', where: { bay: 'B1' }, text: 'x' },
      { level: 'note', code: 'corner-assumed', where: { bay: 'B1' }, text: 'x' },
      { level: 'stop', code: 'missing-reading', where: { bay: 'B1' }, text: 'x' },
      { level: 'stop', code: 'no-fitting', where: { post: 'P2', run: 'R1' }, text: 'x' },
    ] as const
    const captions = captionsOf(survey([bay]), findings, format)
    expect(captions.bays.get('B1')?.level).toBe('check')
    expect(captions.posts.get('P2')).toBe('stop')
  })

  it('leaves out a stop that was overruled as it is, and keeps one overruled with other numbers', () => {
    const stop = {
      level: 'stop',
      code: 'opening-between',
      where: { bay: 'B1' },
      text: 'It is 5 in.',
    } as const
    const levelWith = (text: string) => {
      const overruled = [{ code: stop.code, where: stop.where, text, reason: 'A panel stands behind it' }]
      return captionsOf({ ...survey([bay]), overruled }, [stop], format).bays.get('B1')?.level
    }
    expect(levelWith('It is 5 in.')).toBeNull()
    expect(levelWith('It is 6 in.')).toBe('stop')
  })
})
