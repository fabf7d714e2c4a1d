import { performance } from 'node:perf_hooks'

/** The median time of a piece of work over so many repeats, ms. */
export function medianMs(repeats: number, work: () => unknown): number {
  const times = Array.from({ length: repeats }, () => {
    const start = performance.now()
    work()
    return performance.now() - start
  }).sort((a, b) => a - b)
  return times[Math.floor(times.length / 2)] ?? NaN
}

export const rounded = (value: number, digits = 3): number => Number(value.toFixed(digits))
