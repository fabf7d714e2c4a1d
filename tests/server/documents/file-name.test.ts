import { describe, expect, it } from 'vitest'
import { documentFileName } from '../../../server/documents/file-name'

describe('documentFileName', () => {
  it.each([
    [['cut list', 1042, 'Back deck'], 'cut-list-1042-back-deck.xlsx'],
    [['cut list', 7, 'Café “Süd” ½'], 'cut-list-7-cafe-su-d-1-2.xlsx'],
    [['../../etc/passwd', 'a\r\nb"'], 'etc-passwd-a-b.xlsx'],
    [['日本'], 'tautbook.xlsx'],
  ])('%j becomes %s', (parts, name) => {
    expect(documentFileName(parts, 'xlsx')).toBe(name)
  })

  it('stays short', () => {
    expect(documentFileName(['x'.repeat(500)], 'csv').length).toBeLessThanOrEqual(84)
  })
})
