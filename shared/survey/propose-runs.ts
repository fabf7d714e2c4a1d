import type { Bay } from '../schemas/bay'
import type { CableLayout, Run } from '../schemas/run'
import type { Survey } from '../schemas/survey'
import { inches } from '../units/length'
import { applySteps } from './apply-operation'
import { divideRun } from './divide-run'
import { nextId } from './next-id'
import { goesOn, isReadOverall, resolveRows, type RowRules, type Rows, runParts } from './rows'
import { baysNamed, otherPost, postsOfBays } from './run-posts'
import type { SimpleOperation } from './survey-operation'

export interface ProposalRules extends RowRules {
  /** The cable of new runs while the survey has no run to go by. */
  cable: string
}

const STARTING_LAYOUT: CableLayout = { layout: 'even', spacing: inches(3) }

/**
 * Operations that give every bay a run; none when there is nothing to do. Apply them as one `group`.
 *
 * A run goes straight on through posts where exactly two bays meet. It ends at a corner that was measured, at a change of
 * pitch, and where it would pass the longest run: then it is divided into the fewest parts, as even as its posts allow. A
 * post whose corner angle was not taken counts as straight, unless the bays come back to where they began.
 *
 * A run that still holds stays as it is, with its cable and settings; one that does not is divided, each part keeping them
 * (an overall reading is struck, since it no longer measures the run). A bay without a run joins the run it goes on from where
 * that stays within the longest and was not read overall; otherwise it gets a new run, with the cable and settings of the first.
 */
export function proposeRuns(survey: Survey, rules: ProposalRules): SimpleOperation[] {
  const rows = resolveRows(survey, rules)
  const taken = new Set(survey.runs.map(({ id }) => id))
  const divisions = survey.runs.flatMap((run) => {
    const parts = runParts(rows, baysNamed(rows.bays, run.bays), run.readings)
    return parts.length > 1 ? divideRun(survey, { run, parts: parts.map(idsOf) }, taken) : []
  })
  const runs = applySteps(survey, divisions).runs.map((run) => ({ run, bays: run.bays }))
  const additions = looseRows(rows, runs).flatMap((row) => {
    const grown = growRun(rows, { row, runs })
    if (grown) return [grown]
    return runParts(rows, row).map((part) => newRun(survey, { part, rules, taken }))
  })
  return [...divisions, ...additions]
}

const idsOf = (bays: readonly Bay[]): string[] => bays.map(({ id }) => id)

function newRun(
  { runs: [first] }: Survey,
  { part, rules, taken }: { part: readonly Bay[]; rules: ProposalRules; taken: Set<string> },
): SimpleOperation {
  const id = nextId(taken, 'R')
  taken.add(id)
  const settings = first
    ? {
        cable: first.cable,
        cables: first.cables,
        ...(first.tension === undefined ? {} : { tension: first.tension }),
      }
    : { cable: rules.cable, cables: STARTING_LAYOUT }
  return { type: 'run.add', run: { id, bays: idsOf(part), ...settings, readings: [] } }
}

/** A run and the bays it has so far. */
interface Growing {
  run: Run
  bays: string[]
}

/** The bays that are in no run, in rows: each as far as a cable could go on through posts where just two bays meet. */
function looseRows(rows: Rows, runs: readonly Growing[]): Bay[][] {
  const covered = new Set(runs.flatMap(({ bays }) => bays))
  const placed = new Set<string>()
  const isFree = (bay: Bay | undefined): bay is Bay => !!bay && !covered.has(bay.id) && !placed.has(bay.id)
  const found: Bay[][] = []
  for (const bay of rows.bays.values()) {
    if (!isFree(bay)) continue
    placed.add(bay.id)
    const row = [bay]
    for (const direction of ['to', 'from'] as const) {
      let last = bay
      let post = bay[direction]
      for (let next = onward(rows, last, post); isFree(next); next = onward(rows, last, post)) {
        placed.add(next.id)
        if (direction === 'to') row.push(next)
        else row.unshift(next)
        last = next
        post = otherPost(next, post)
      }
    }
    found.push(row)
  }
  return found
}

/** The bay a cable would go on into at a post; none at a fork, a corner or the end of a row. */
function onward(rows: Rows, bay: Bay, post: string): Bay | undefined {
  const meeting = rows.meeting.get(post) ?? []
  const other = meeting.find(({ id }) => id !== bay.id)
  return other && meeting.length === 2 && goesOn(rows, post, [bay, other]) ? other : undefined
}

/** Adds a row to the run it goes on from, if that leaves one run; remembers the bays the run then has. */
function growRun(rows: Rows, { row, runs }: { row: Bay[]; runs: Growing[] }): SimpleOperation | undefined {
  for (const ordered of [row, row.toReversed()]) {
    const first = ordered[0]
    const post = rowPosts(row, ordered)[0]
    const before = first && post !== undefined && onward(rows, first, post)
    if (!before) continue
    for (const growing of runs) {
      const grown = joined(rows, { growing, post, ordered, before })
      if (!grown || isReadOverall(growing.run) || runParts(rows, grown).length > 1) continue
      growing.bays = idsOf(grown)
      return { type: 'run.set', id: growing.run.id, set: { bays: growing.bays }, unset: [] }
    }
  }
  return undefined
}

/** The posts of a row in the order given; a single bay can be gone along either way. */
const rowPosts = (row: readonly Bay[], ordered: readonly Bay[]): string[] =>
  ordered === row ? postsOfBays(row) : postsOfBays(row).toReversed()

interface Joint {
  growing: Growing
  /** Where the row begins. */
  post: string
  ordered: readonly Bay[]
  /** The bay of the run that meets it there. */
  before: Bay
}

/** The bays of a run with a row joined to its end or its beginning; undefined where they do not meet. */
function joined(rows: Rows, { growing, post, ordered, before }: Joint): Bay[] | undefined {
  const bays = baysNamed(rows.bays, growing.bays)
  const posts = postsOfBays(bays)
  if (bays.at(-1) === before && posts.at(-1) === post) return [...bays, ...ordered]
  if (bays[0] === before && posts[0] === post) return [...ordered.toReversed(), ...bays]
  return undefined
}
