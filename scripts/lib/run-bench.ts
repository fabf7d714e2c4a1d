import { pathToFileURL } from 'node:url'

/**
 * Runs the bench of one module in a process of its own and sends what it found to the process that asked: the function
 * `benchJobsList` of `jobs-list.ts`. A module without any function named `bench…` only helps others and is passed over.
 */
const [file = ''] = process.argv.slice(2)
const module = (await import(pathToFileURL(file).href)) as Record<string, unknown>
const wanted = `bench${file
  .replace(/.*\/|\.ts$/g, '')
  .split('-')
  .map((word) => word.charAt(0).toUpperCase() + word.slice(1))
  .join('')}`
const bench = module[wanted] as (() => Promise<Record<string, unknown>>) | undefined
if (!bench && Object.keys(module).some((name) => name.startsWith('bench'))) {
  throw new Error(`${file} exports no function ${wanted}.`)
}
process.send?.(bench ? await bench() : null)
process.disconnect()
