import { basisWords } from '@shared/calculation/guard-rules/published-rules'
import type { BayCheck } from '@shared/calculation/checks/check-bay'
import type { PostCheck } from '@shared/calculation/checks/check-post'
import type { FigureSource } from '@shared/schemas/guard-rules'
import type { GuardSummaryDocument } from '../guard-summary-document'
import { type Pdf, widthOf } from './page'
import type { Printed } from './quantities'
import { table } from './table'

interface Asked {
  what: string
  asked: string
  built: string
  source?: FigureSource
}

const sourceText = (source: FigureSource | undefined): string => {
  if (!source) return ''
  const { section, basis } = source
  return basis === 'read' || basis === 'own' ? section : `${section} (${basisWords[basis]})`
}

/** What the rules ask, what is built, and where that stands. */
export function guardTable(pdf: Pdf, document: GuardSummaryDocument, print: Printed): void {
  table<Asked>(pdf, {
    title: 'Guard',
    width: widthOf(pdf) * 0.67,
    columns: [
      { header: '', share: 3.2, value: ({ what }) => what },
      { header: 'Asked', share: 1.7, align: 'right', value: ({ asked }) => asked },
      { header: 'Built', share: 1.7, align: 'right', value: ({ built }) => built },
      { header: 'Section', share: 3.6, value: ({ source }) => sourceText(source) },
    ],
    lines: askedLines(document, print),
  })
}

function askedLines({ survey, checks }: GuardSummaryDocument, print: Printed): Asked[] {
  const { rules, situation, sphere, stairSphere } = checks.guard
  const { guard } = survey
  const stairs = survey.bays.some(({ kind }) => kind === 'stair')
  const widest = (onStairs: boolean) => {
    const clear = checks.bays.filter(({ isStair }) => isStair === onStairs).flatMap(openingsOf)
    return clear.length > 0 ? print.length(Math.max(...clear)) : '–'
  }
  const triangles = checks.bays.flatMap(({ triangle }) => (triangle ? [triangle.sphere] : []))
  const stairAsked = rules?.stairHeight ?? situation?.height
  const lines: (Asked | undefined)[] = [
    {
      what: `Height${situation ? `, ${situation.name.toLowerCase()}` : ''}`,
      asked: print.length(situation?.height.value),
      built: print.length(guard.height),
      source: situation?.height,
    },
    stairs
      ? {
          what: 'Height on stairs, above the nosing line',
          asked: print.length(stairAsked?.value),
          built: print.length(guard.stair?.height ?? guard.height),
          source: stairAsked,
        }
      : undefined,
    {
      what: 'Fall beside the walking surface',
      asked: rules?.neededOver ? `over ${print.length(rules.neededOver.value)}` : '–',
      built: guard.fall === undefined ? 'not measured' : print.length(guard.fall),
      source: rules?.neededOver,
    },
    {
      what: 'Widest opening at rest, no sphere of',
      asked: print.length(sphere),
      built: widest(false),
      source: rules?.sphere,
    },
    stairs
      ? {
          what: 'Widest opening on stairs, no sphere of',
          asked: print.length(stairSphere),
          built: widest(true),
          source: rules?.stairSphere ?? rules?.sphere,
        }
      : undefined,
    stairs && rules?.stairTriangle
      ? {
          what: 'Stair triangle, no sphere of',
          asked: print.length(rules.stairTriangle.value),
          built: triangles.length > 0 ? print.length(Math.max(...triangles)) : '–',
          source: rules.stairTriangle,
        }
      : undefined,
    rules?.infillLoad
      ? {
          what: `Infill load, on a square of ${print.length(rules.infillLoad.side)}`,
          asked: print.force(rules.infillLoad.value),
          built: 'see runs',
          source: rules.infillLoad,
        }
      : undefined,
    rules?.topLoad
      ? {
          what: 'Load at the top, any point and direction',
          asked: print.force(rules.topLoad.value),
          built: 'see end posts',
          source: rules.topLoad,
        }
      : undefined,
  ]
  return lines.filter((line) => line !== undefined)
}

const openingsOf = ({ openings }: BayCheck): number[] =>
  [openings.between, openings.bottom, openings.top].filter((value) => value !== undefined)

/** Every bay with the run it belongs to. */
export function runTable(pdf: Pdf, document: GuardSummaryDocument, print: Printed): void {
  const { checks, hardware, survey } = document
  if (checks.bays.length === 0) return
  const runOf = ({ run }: BayCheck) => checks.runs.find((each) => each.run === run)
  const cableName = (bay: BayCheck) =>
    hardware.cables.find(({ id }) => id === runOf(bay)?.cable)?.name ?? runOf(bay)?.cable ?? ''
  const ends = ({ bay }: BayCheck) => {
    const found = survey.bays.find(({ id }) => id === bay)
    return found ? `${found.from}–${found.to}` : ''
  }
  table<BayCheck>(pdf, {
    title: 'Runs and bays, at each run’s middle cable',
    columns: [
      { header: 'Run', share: 1, value: ({ run }) => run },
      { header: 'Bay', share: 2, value: (bay) => `${bay.bay} ${ends(bay)}${bay.isStair ? ', stair' : ''}` },
      {
        header: 'Cables, tension',
        share: 3.4,
        value: (bay) =>
          `${runOf(bay)?.heights.length ?? 0} × ${cableName(bay)}, ${print.force(runOf(bay)?.tension)}`,
      },
      { header: 'Span', share: 1.5, align: 'right', value: ({ span }) => print.length(span) },
      {
        header: 'Clear',
        share: 1.5,
        align: 'right',
        value: ({ openings }) => print.length(openings.between),
      },
      {
        header: 'Bottom',
        share: 1.5,
        align: 'right',
        value: ({ openings }) => print.length(openings.bottom),
      },
      { header: 'Top', share: 1.5, align: 'right', value: ({ openings }) => print.length(openings.top) },
      { header: 'Push', share: 1.4, align: 'right', value: ({ push }) => print.push(push) },
      {
        header: 'Infill: moves',
        share: 1.5,
        align: 'right',
        value: ({ infill }) => print.length(infill?.deflection),
      },
      {
        header: 'pulls, of breaking',
        share: 2.2,
        align: 'right',
        value: (bay) =>
          `${print.force(bay.infill?.tension)}, ${print.share(bay.infill?.tension, runOf(bay)?.breakingLoad)}`,
      },
    ],
    lines: checks.bays,
  })
}

/** The posts that carry the runs' ends. */
export function postTable(pdf: Pdf, { checks }: GuardSummaryDocument, print: Printed): void {
  if (checks.posts.length === 0) return
  const counts = (post: PostCheck) => post[post.support ?? 'cantilever']
  const size = ({ section }: PostCheck) =>
    section ? `${print.length(section.along)} × ${print.length(section.across)}` : '–'
  table<PostCheck>(pdf, {
    title: 'End posts',
    columns: [
      { header: 'Post', share: 1, value: ({ post }) => post },
      { header: 'Run', share: 1, value: ({ run }) => run },
      { header: 'Core', share: 3, value: (post) => `${post.core ?? 'not noted'}, ${size(post)}` },
      {
        header: 'Fitting',
        share: 3,
        value: ({ fitting }) => fitting?.name ?? 'none suits',
      },
      { header: 'Pull', share: 1.4, align: 'right', value: ({ pull }) => print.force(pull) },
      {
        header: 'Reckoned',
        share: 2,
        value: ({ support }) =>
          support === 'propped'
            ? 'held by the rail'
            : support === 'cantilever'
              ? 'standing free'
              : 'free (not said)',
      },
      { header: 'Moment', share: 2, align: 'right', value: (post) => print.moment(counts(post).moment) },
      { header: 'Stress', share: 1.7, align: 'right', value: (post) => print.stress(counts(post).stress) },
      {
        header: 'Allowed',
        share: 1.7,
        align: 'right',
        value: ({ allowable }) => (allowable ? print.stress(allowable.stress) : 'ask the engineer'),
      },
    ],
    lines: checks.posts,
  })
}
