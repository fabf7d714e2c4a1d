import { describe, expect, it } from 'vitest'
import { inches, millimetres } from '@shared/units/length'
import {
  emptyEntry,
  entryText,
  type Key,
  press,
  readEntry,
} from '../../../../../src/features/survey-editor/panels/keypad/entry'

const digits = (text: string): Key[] => [...text].map((digit) => ({ key: 'digit', digit }))
const entered = (...keys: Key[]) => keys.reduce(press, emptyEntry)

describe('the keypad', () => {
  it('takes feet, inches and a sixteenth, in whichever order the fraction comes', () => {
    const fraction: Key = { key: 'sixteenths', count: 6 }
    const whole: Key[] = [...digits('12'), { key: 'feet' }, ...digits('4')]
    for (const entry of [entered(...whole, fraction), entered(fraction, ...whole)]) {
      expect(entryText(entry)).toBe("12' 4 3/8")
      expect(readEntry(entry, 'in')).toEqual({ ok: true, length: inches(148.375) })
    }
  })

  it('adds a thirty-second and takes it off again', () => {
    const half: Key = { key: 'half-sixteenth' }
    const entry = entered(...digits('46'), { key: 'sixteenths', count: 3 }, half)
    expect(entryText(entry)).toBe('46 7/32')
    expect(entryText(press(entry, half))).toBe('46 3/16')
    expect(entryText(entered(half))).toBe('1/32')
    expect(entered(half, half)).toEqual(emptyEntry)
    expect(entryText(entered(half, { key: 'sixteenths', count: 6 }))).toBe('13/32')
    expect(entryText(entered({ key: 'written', text: '46 1/2' }, { key: 'digit', digit: '5' }))).toBe('5')
  })

  it('takes back the fraction first, then key by key', () => {
    let entry = entered(...digits('4'), { key: 'feet' }, ...digits('7'), { key: 'sixteenths', count: 8 })
    const texts: string[] = []
    for (let i = 0; i < 4; i += 1) {
      entry = press(entry, { key: 'back' })
      texts.push(entryText(entry))
    }
    expect(texts).toEqual(["4' 7", "4'", '4', ''])
  })

  it('reads millimetres, and what a keyboard wrote, and says what it did not understand', () => {
    expect(readEntry(entered(...digits('1181'), { key: 'point' }, ...digits('5')), 'mm')).toEqual({
      ok: true,
      length: millimetres(1181.5),
    })
    expect(readEntry(entered({ key: 'written', text: '3.77 m' }), 'in')).toEqual({
      ok: true,
      length: millimetres(3770),
    })
    const unknown = readEntry(entered({ key: 'written', text: '46 cubits' }), 'in')
    expect(unknown).toMatchObject({ ok: false })
    expect(unknown && !unknown.ok ? unknown.message : '').toContain('cubits')
    expect(readEntry(emptyEntry, 'in')).toBeUndefined()
  })
})
