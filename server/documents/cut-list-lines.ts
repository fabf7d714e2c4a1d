import type { CutListRow } from '@shared/cut-list/cut-list-rows'
import type { WhyNone } from '@shared/calculation/result'
import { formatLength, lengthText } from '@shared/units/format-length'
import { toInches, toMillimetres } from '@shared/units/length'
import type { CutListDocument } from './cut-list-document'

/** One cable as a line of a table. Lengths are numbers in the survey's units; what is not known is left out. */
export interface CutListLine {
  run: string
  cable: number
  cableName: string
  height: number
  mode: 'shop' | 'site' | 'none'
  /** Cut length of a *shop* cable, shop length of a *site* cable. */
  length?: number
  /** The same in feet and inches, as a long tape reads; for inch surveys. */
  feet?: string
  /** Bare length once the second end of a *site* cable is finished. */
  finish?: number
  from: string
  to: string
  planned?: number
  worst?: number
  limit?: number
  note: string
}

export const inUnits = (nm: number, units: CutListDocument['units']): number =>
  units === 'in' ? toInches(nm) : toMillimetres(nm)

const whyNone: Record<WhyNone, string> = {
  'missing-reading': 'No length: a reading or size is missing.',
  'no-fitting': 'No length: no fitting suits an end post.',
  'too-long': 'No length: the run is too long for its fittings.',
}

const SITE_NOTE = 'Crimp one end; cut the second on site at the mark.'

/** The cut list as lines, run by run, the lowest cable first. */
export function cutListLines({ cutList, units }: CutListDocument): CutListLine[] {
  return cutList.groups.flatMap((group) => group.rows.map((row) => toLine(row, units)))
}

function toLine(row: CutListRow, units: CutListDocument['units']): CutListLine {
  const { cable } = row
  const written = (nm: number | undefined) => (nm === undefined ? undefined : inUnits(nm, units))
  return {
    run: cable.run,
    cable: cable.cable,
    cableName: row.cableName,
    height: inUnits(cable.height, units),
    mode: cable.mode,
    length: written(cable.cut),
    feet: units === 'in' ? feetText(cable.cut) : undefined,
    finish: written(cable.finish),
    from: end(row.fromPost, row.fromFitting),
    to: end(row.toPost, row.toFitting),
    planned: written(cable.planned),
    worst: written(cable.worst),
    limit: written(cable.limit),
    note: note(row),
  }
}

const feetText = (nm: number | undefined): string | undefined =>
  nm === undefined ? undefined : lengthText(formatLength(nm, { style: 'feet', finest: 64 }))

const end = (post: string, fitting: string | undefined): string => (fitting ? `${post}: ${fitting}` : post)

/** What the bench must know of this one cable; findings have their own sheet. */
function note({ cable }: CutListRow): string {
  if (cable.mode === 'none') return whyNone[cable.why]
  return cable.mode === 'site' ? SITE_NOTE : ''
}
