import { expect, it } from 'vitest'
import { chunksFor } from '../../scripts/bench/client-weight'

const chunk = (...imports: string[]) => ({ file: 'x.js', imports, css: [], dynamicImports: ['later'] })

it('weighs what a page imports, however far, once, and nothing that waits until it is asked for', () => {
  const manifest = {
    entry: chunk('react', 'router'),
    router: chunk('react'),
    react: chunk(),
    page: chunk('entry', 'forms'),
    forms: chunk('react', 'page'),
    later: chunk('heavy'),
    heavy: chunk(),
  }
  expect(chunksFor(manifest, ['entry', 'page']).sort()).toEqual(['entry', 'forms', 'page', 'react', 'router'])
})
