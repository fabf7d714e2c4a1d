import { isDeepStrictEqual } from 'node:util'
import { findRules } from '@shared/calculation/guard-rules/published-rules'
import type { GuardRules } from '@shared/schemas/guard-rules'
import type { Hardware } from '@shared/schemas/hardware'
import type { HouseRules } from '@shared/schemas/house-rules'
import type { SurveyFile } from '@shared/schemas/survey-file'

/** What the company has, retired entries too. */
export interface CompanySide {
  hardware: Hardware
  rules: HouseRules
  /** Its own, retired ones too. */
  guardRules?: GuardRules[]
}

/** What of a survey file was not taken over, one sentence each: the company's hardware, rules and pictures stay its own. */
export function importNotes(file: SurveyFile, company: CompanySide): string[] {
  return [
    ...hardwareNotes(file, company.hardware),
    ...rulesNotes(file, company.rules),
    ...guardRulesNotes(file, company.guardRules ?? []),
    ...overruledNotes(file),
    ...photoNotes(file),
  ]
}

function hardwareNotes({ hardware }: SurveyFile, own: Hardware): string[] {
  if (!hardware) return []
  const cables = compare(hardware.cables, own.cables)
  const fittings = compare(hardware.fittings, own.fittings)
  const lacking = [...cables.lacking, ...fittings.lacking]
  const other = [...cables.other, ...fittings.other]
  return [
    ...(lacking.length > 0
      ? [`The file also lists hardware that your catalogue lacks: ${names(lacking)}. It was not added.`]
      : []),
    ...(other.length > 0
      ? [`The file describes ${names(other)} otherwise than your catalogue. Yours is used.`]
      : []),
  ]
}

/** Ids the catalogue lacks, and ids it describes otherwise; names and prices aside, which change no length. */
function compare<Item extends { id: string; name: string; price?: number }>(
  items: readonly Item[],
  own: readonly Item[],
): { lacking: string[]; other: string[] } {
  const known = new Map(own.map((item) => [item.id, figures(item)]))
  const ids = items.map(({ id }) => id)
  return {
    lacking: ids.filter((id) => !known.has(id)),
    other: items
      .filter((item) => known.has(item.id) && !isDeepStrictEqual(known.get(item.id), figures(item)))
      .map(({ id }) => id),
  }
}

const figures = (item: { name: string; price?: number }): unknown =>
  // Through JSON, so that a key left out and a key that is undefined are the same.
  JSON.parse(JSON.stringify({ ...item, name: undefined, price: undefined }))

const rulesNotes = ({ rules }: SurveyFile, own: HouseRules): string[] =>
  rules && !sameFigures(rules, own) ? ['The file’s house rules differ from yours. Yours are used.'] : []

/** The survey keeps the name of its rules; whose figures those are is the company’s matter. */
function guardRulesNotes({ survey, guardRules = [] }: SurveyFile, own: readonly GuardRules[]): string[] {
  const { rules: id } = survey.guard
  const [theirs, ours] = [guardRules.find((each) => each.id === id), findRules(id, own)]
  if (!ours) {
    return [
      `The survey follows the guard rules “${id}”, which you do not have. They were not added: choose others on the guard, or make your own.`,
    ]
  }
  return theirs && !sameFigures(theirs, ours)
    ? [`The file describes the guard rules “${id}” otherwise than yours. Yours are used.`]
    : []
}

const sameFigures = (a: unknown, b: unknown): boolean =>
  isDeepStrictEqual(JSON.parse(JSON.stringify(a)), JSON.parse(JSON.stringify(b)))

/** Whoever answers for it lets a stop pass here anew. */
const overruledNotes = ({ survey: { overruled } }: SurveyFile): string[] =>
  overruled.length > 0
    ? [
        `${overruled.length === 1 ? 'One stop was' : `${overruled.length} stops were`} overruled where the file comes from. Here ${overruled.length === 1 ? 'it stands' : 'they stand'} again until an owner or estimator overrules ${overruled.length === 1 ? 'it' : 'them'}.`,
      ]
    : []

const photoNotes = ({ survey }: SurveyFile): string[] =>
  survey.photos.length > 0
    ? [
        `The pictures ${names(survey.photos.map(({ file }) => file))} are not in the file. They and the marks on them were left out: add the photos and mark the posts again.`,
      ]
    : []

const names = (list: readonly string[]): string =>
  list.length < 2 ? list.join('') : `${list.slice(0, -1).join(', ')} and ${list.at(-1)}`
