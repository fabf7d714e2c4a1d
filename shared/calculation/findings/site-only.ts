import type { RunFigures } from '../figure-run'
import { type ReadingThatMatters, readingThatMatters, type TakenReading } from '../reading-that-matters'
import type { SurveyIndex } from '../survey-index'
import { cableNumbers, type Notice } from './notice'

/** The reading that matters for a run, judged by its *site* cable that is furthest from *shop*. */
export function runReadingThatMatters(
  { rules }: SurveyIndex,
  { cables }: RunFigures,
): ReadingThatMatters | undefined {
  let worst: { excess: number; found: ReadingThatMatters } | undefined
  for (const { number, path, problem, own } of cables) {
    if (!path || !problem || own?.mode !== 'site') continue
    const found = readingThatMatters(path, problem, rules)
    if (!found) return undefined
    const excess = 2 * problem.u + own.stretch - own.limit
    if (!worst || excess > worst.excess) worst = { excess, found: { ...found, cable: number } }
  }
  return worst?.found
}

/** Says which reading to take again. */
export function siteOnlyNotice({ course: { run }, cables }: RunFigures, matters: ReadingThatMatters): Notice {
  const site = cables.flatMap(({ number, cut }) => (cut?.mode === 'site' ? [number] : []))
  const { reading, before, after, makesShop } = matters
  return {
    level: 'note',
    code: 'reading-that-matters',
    where: { run: run.id, ...placeOf(reading) },
    phrase: [
      `Run ${run.id}: ${cableNumbers(site)} must be finished on site only because the readings may be off by `,
      { length: before },
      ` in all. Take ${readingName(reading)} again: with its limit halved that becomes `,
      { length: after },
      makesShop ? ', and both ends can be crimped in the shop.' : ', which helps most but is not yet enough.',
    ],
  }
}

function placeOf(reading: TakenReading) {
  if (reading.what === 'overall') return {}
  return reading.what === 'post' ? { post: reading.post } : { bay: reading.bay }
}

const readingNames: Record<TakenReading['what'], string> = {
  bay: 'the reading',
  overall: 'the overall reading',
  post: 'the size',
  'rise-and-going': 'rise and going',
  gauge: 'the gauge',
}

/** A reading by name. @example "the reading of bay B1 at the top" */
export function readingName(reading: TakenReading): string {
  const name = readingNames[reading.what]
  if (reading.what === 'overall') return name
  if (reading.what === 'post') return `${name} of post ${reading.post} ${reading.side}`
  if (reading.what !== 'bay') return `${name} of stair ${reading.bay}`
  return `${name} of bay ${reading.bay} at the ${reading.place === 'both' ? 'top and the bottom' : reading.place}`
}
