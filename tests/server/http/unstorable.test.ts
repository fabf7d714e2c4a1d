import { describe, expect, it } from 'vitest'
import { findUnstorable } from '../../../server/http/unstorable'

describe('findUnstorable', () => {
  it.each([
    ['plain', undefined],
    ['smile 🙂 and \\u0000 as letters', undefined],
    [{ a: [1, null, true, { b: 'x' }] }, undefined],
    ['\0', ''],
    [{ posts: [{ note: 'a' }, { note: 'b\0' }] }, 'posts.1.note'],
    [{ title: 'half \ud83d' }, 'title'],
    [{ photos: { 'k\0': 1 } }, 'photos'],
  ])('of %j is %j', (value, path) => {
    expect(findUnstorable(value)).toBe(path)
  })

  it('does not follow what is nested without end', () => {
    const deep: unknown = JSON.parse('['.repeat(200_000) + ']'.repeat(200_000))
    expect(findUnstorable(deep)).toBe('0.0.0.0.0')
  })
})
