import type { Basis, FigureSource, GuardRules } from '../../schemas/guard-rules'
import { approvedDocumentK2013 } from './approved-document-k'
import { ibc2021 } from './ibc'
import { irc2018, irc2021, irc2024 } from './irc'
import { nbc2020 } from './nbc'
import { ncc2022 } from './ncc'

/** The published rules the program knows. */
export const publishedRules: readonly GuardRules[] = [
  irc2021,
  irc2018,
  irc2024,
  ibc2021,
  nbc2020,
  approvedDocumentK2013,
  ncc2022,
]

/** The rules a survey names, own ones first. @returns undefined when there are none of that name */
export const findRules = (id: string, own: readonly GuardRules[] = []): GuardRules | undefined =>
  [...own, ...publishedRules].find((rules) => rules.id === id)

/** What stands beside a figure, by how well it is known. */
export const basisWords: Record<Basis, string> = {
  read: 'read in the text',
  copy: 'read in a copy: check the text',
  memory: 'from memory: check the text',
  own: 'the company’s own',
}

/** Rules and edition. @example "International Residential Code 2021" */
export const rulesName = ({ name, edition }: Pick<GuardRules, 'name' | 'edition'>): string =>
  `${name} ${edition}`

/** A figure's place as it stands behind a finding. @example "International Residential Code 2021, R312.1.3" */
export const ruleBehind = (rules: GuardRules, { section, basis }: FigureSource): string =>
  `${rulesName(rules)}, ${section}${basis === 'memory' || basis === 'copy' ? ` (${basisWords[basis]})` : ''}`
