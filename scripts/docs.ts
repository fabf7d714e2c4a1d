import { mkdirSync, readdirSync, rmSync, writeFileSync } from 'node:fs'
import { calculationPages } from './docs/calculation-pages'
import { pagesFolder, readCalculations } from './docs/read-calculations'

const pages = calculationPages(readCalculations())
const names = new Set(pages.map(({ name }) => name))

mkdirSync(pagesFolder, { recursive: true })
for (const old of readdirSync(pagesFolder))
  if (old.endsWith('.md') && !names.has(old)) rmSync(`${pagesFolder}${old}`)
for (const { name, text } of pages) writeFileSync(`${pagesFolder}${name}`, text)
process.stdout.write(`${pages.length} pages written.\n`)
