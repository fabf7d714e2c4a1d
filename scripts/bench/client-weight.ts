import { readdirSync, readFileSync } from 'node:fs'
import path from 'node:path'
import { fileURLToPath } from 'node:url'
import { gzipSync } from 'node:zlib'
import { z } from 'zod'

const client = fileURLToPath(new URL('../../dist/client/', import.meta.url))
const KB = 1000

const manifestSchema = z.record(
  z.string(),
  z.object({
    file: z.string(),
    isEntry: z.boolean().optional(),
    imports: z.array(z.string()).default([]),
    css: z.array(z.string()).default([]),
  }),
)
type Manifest = z.infer<typeof manifestSchema>

/** Pages by the route module that shows them, which the router loads when it is needed; the limits in kB after gzip. */
const pages = {
  signIn: { module: /^src\/app\/routes\/sign-in\.tsx$/, aim: { script: 130 } },
  survey: { module: /^src\/app\/routes\/survey(-editor)?\.tsx$/, aim: { all: 330 } },
}

/** The chunks a browser fetches for some modules before the page stands: they and all they import, without what waits. */
export function chunksFor(manifest: Manifest, keys: string[]): string[] {
  const found = new Set<string>()
  const visit = (key: string): void => {
    if (found.has(key)) return
    found.add(key)
    manifest[key]?.imports.forEach(visit)
  }
  keys.forEach(visit)
  return [...found]
}

const gzipped = (file: string): number => gzipSync(readFileSync(path.join(client, file)), { level: 9 }).length

const total = (files: Iterable<string>): number =>
  [...new Set(files)].reduce((sum, file) => sum + gzipped(file), 0) / KB

const rounded = (value: number): number => Math.round(value * 10) / 10

function weigh(manifest: Manifest, page: (typeof pages)[keyof typeof pages]) {
  const entry = Object.keys(manifest).filter((key) => manifest[key]?.isEntry)
  const route = Object.keys(manifest).find((key) => page.module.test(key))
  // Weighing the entry alone would pass any page.
  if (!route)
    return { within: false, aim: page.aim, error: `No chunk of the build is ${page.module.source}.` }
  const chunks = chunksFor(manifest, [...entry, route]).flatMap((key) => manifest[key] ?? [])
  const script = total(chunks.map(({ file }) => file))
  const style = total(chunks.flatMap(({ css }) => css))
  const all = script + style + total(['index.html'])
  const within = 'script' in page.aim ? script <= page.aim.script : all <= page.aim.all
  return {
    route,
    scriptKb: rounded(script),
    styleKb: rounded(style),
    allKb: rounded(all),
    aim: page.aim,
    within,
  }
}

/** Fonts come after the text stands and only for the letters shown; here those of the Latin alphabet, as they are. */
function latinFonts(): number {
  const names = readdirSync(path.join(client, 'assets')).filter((name) => /latin-\d.*\.woff2$/.test(name))
  const sizes = names
    .filter((name) => !name.includes('latin-ext'))
    .map((name) => readFileSync(path.join(client, 'assets', name)).length)
  return rounded(sizes.reduce((sum, size) => sum + size, 0) / KB)
}

/** Gzipped size of what the sign-in page and the survey page need, read from the built client's manifest. */
// eslint-disable-next-line @typescript-eslint/require-await -- benches share one asynchronous shape
export async function benchClientWeight(): Promise<Record<string, unknown>> {
  const text = readFileSync(path.join(client, '.vite', 'manifest.json'), 'utf8')
  const manifest = manifestSchema.parse(JSON.parse(text))
  return {
    signIn: weigh(manifest, pages.signIn),
    survey: weigh(manifest, pages.survey),
    latinFontsKb: latinFonts(),
  }
}
