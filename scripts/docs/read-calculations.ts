import { readdirSync, readFileSync } from 'node:fs'
import { fileURLToPath } from 'node:url'
import type { SourceFile } from './calculation-pages'

const folder = fileURLToPath(new URL('../../shared/calculation/', import.meta.url))

/** Where the pages are kept. */
export const pagesFolder = fileURLToPath(new URL('../../docs/calculations/', import.meta.url))

/** The files of shared/calculation that the pages are written from. */
export const readCalculations = (): SourceFile[] =>
  ['', 'checks/'].flatMap((place) =>
    readdirSync(`${folder}${place}`)
      .filter((name) => name.endsWith('.ts'))
      .map((name) => ({ name, place, text: readFileSync(`${folder}${place}${name}`, 'utf8') })),
  )
