// One file of our own code that plain node starts at once; packages stay in node_modules.
import { rmSync } from 'node:fs'
import { build } from 'esbuild'
import { inRoot } from './root.mjs'

rmSync(inRoot('dist', 'server'), { recursive: true, force: true })
try {
  await build({
    entryPoints: [inRoot('server', 'main.ts')],
    outfile: inRoot('dist', 'server', 'main.js'),
    bundle: true,
    platform: 'node',
    target: 'node20',
    format: 'esm',
    packages: 'external',
    sourcemap: 'inline',
    sourcesContent: false,
    logLevel: 'warning',
  })
} catch {
  // What is wrong was written already.
  process.exitCode = 1
}
