import { readdirSync, readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { calculationPages } from '../../scripts/docs/calculation-pages'
import { pagesFolder, readCalculations } from '../../scripts/docs/read-calculations'

describe('docs/calculations', () => {
  const pages = calculationPages(readCalculations())

  it('says what the docstrings say; run npm run docs when it does not', () => {
    for (const { name, text } of pages) expect(readFileSync(`${pagesFolder}${name}`, 'utf8'), name).toBe(text)
  })

  it('holds no page of a calculation that is gone', () => {
    const kept = readdirSync(pagesFolder).filter((name) => name.endsWith('.md'))
    expect(kept.sort()).toEqual(pages.map(({ name }) => name).sort())
  })

  it('gives each calculation its formula, units, source and an example', () => {
    const parts = pages.slice(1).flatMap(({ name, text }) =>
      text
        .split('\n## ')
        .slice(1)
        .map((part) => ({ name, part })),
    )
    expect(parts.length).toBeGreaterThan(20)
    for (const { name, part } of parts) {
      for (const label of ['**Formula**: ', '**Units**: ', '**Source**: ', '**Example**: ']) {
        expect(part, `${name}: ${part.split('\n')[0]}`).toContain(label)
      }
    }
  })
})

describe('calculationPages', () => {
  it('reads a docstring’s parts, wrapped or not', () => {
    const text = [
      '/**',
      ' * Doubles a length.',
      ' *',
      ' * Formula: `2 ·',
      ' * x`.',
      ' * Units: nm.',
      ' * Source: arithmetic.',
      ' *',
      ' * @example 2 in is 4 in',
      ' */',
      'export const double = (x: number): number => 2 * x',
      '/** Not a calculation. */',
      'export const other = 1',
    ].join('\n')
    const [index, page, ...more] = calculationPages([{ name: 'double-length.ts', text }])
    expect(more).toEqual([])
    expect(index?.text).toContain('- [Double length](double-length.md): Doubles a length.')
    expect(page?.text).toContain('## double\n\nDoubles a length.\n\n**Formula**: `2 · x`.\n\n**Units**: nm.')
    expect(page?.text).toContain('**Example**: 2 in is 4 in')
  })
})
