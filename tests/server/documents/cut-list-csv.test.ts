import { parse } from 'csv-parse/sync'
import { describe, expect, it } from 'vitest'
import { cutListCsv } from '../../../server/documents/csv/cut-list-csv'
import { cutListDocument } from '../../factories/cut-list-document'
import { workedExample } from '../../factories/worked-example'

const readBack = (csv: string): Record<string, string>[] =>
  parse(csv, { bom: true, columns: true, record_delimiter: '\r\n' })

describe('cutListCsv', () => {
  it('reads back with another reader as the lengths the issue states', () => {
    const rows = readBack(cutListCsv(cutListDocument(workedExample())))
    expect(rows).toHaveLength(11)
    expect(rows[9]).toMatchObject({
      job: '1042',
      run: 'R1',
      cable: '10',
      mode: 'shop',
      cut_or_shop_length_in: '95.75',
      limit_in: '1.275',
    })
    expect(rows[10]?.cut_or_shop_length_in).toBe('95.8125')
    expect(Number(rows[9]?.worst_take_up_in)).toBeCloseTo(0.5150783, 6)
  })

  it('begins with a byte order mark and ends every line with CRLF', () => {
    const csv = cutListCsv(cutListDocument(workedExample()))
    expect(csv.startsWith('\ufeffjob,survey,')).toBe(true)
    expect(csv.endsWith('\r\n')).toBe(true)
    expect(csv.split('\r\n')).toHaveLength(13)
    expect(csv.replaceAll('\r\n', '')).not.toMatch(/[\r\n]/)
  })

  it('quotes what RFC 4180 wants quoted', () => {
    const input = workedExample()
    input.hardware.cables[0]!.name = 'Soft, "bright"\r\nline'
    const csv = cutListCsv(cutListDocument(input))
    expect(csv).toContain('"Soft, ""bright""\r\nline"')
    expect(readBack(csv)[0]?.cable_type).toBe('Soft, "bright"\r\nline')
  })

  it.each(['=1+1', '+1', '-1', '@A1', '\tx', '\rx', '\nx', '\0=1', '＝1'])('makes %j harmless', (title) => {
    const [row] = readBack(cutListCsv(cutListDocument(workedExample(), { surveyTitle: title })))
    expect(row?.survey?.startsWith("'")).toBe(true)
    expect(row?.survey).not.toContain('\0')
  })
})
