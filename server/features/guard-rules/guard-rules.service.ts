import { publishedRules } from '@shared/calculation/guard-rules/published-rules'
import type { OwnGuardRules } from '@shared/schemas/catalogue'
import { type GuardRules, guardRulesSchema } from '@shared/schemas/guard-rules'
import {
  type EntryRow,
  insertEntries,
  selectEntries,
  selectEntry,
  updateEntry,
} from '../../database/catalogue-entries.queries'
import type { Database } from '../../database/client'
import { noSuchRules, rulesIdChanged, rulesIdTaken } from './guard-rules.errors'

/** Whose guard rules. */
export interface GuardRulesScope {
  database: Database
  companyId: string
}

const place = (scope: GuardRulesScope) => ({ ...scope, kind: 'guard rules' as const })

/** The company's own guard rules, retired ones too. */
export async function listGuardRules(scope: GuardRulesScope): Promise<OwnGuardRules[]> {
  return (await selectEntries(place(scope))).map(toOwn)
}

/** What surveys are checked with besides the published rules: retired ones as well, since a survey may name them still. */
export async function ownGuardRules(scope: GuardRulesScope): Promise<GuardRules[]> {
  return (await listGuardRules(scope)).map(({ rules }) => rules)
}

/** Adds own guard rules under an id that neither the company nor published rules use. */
export async function addGuardRules(scope: GuardRulesScope, rules: GuardRules): Promise<OwnGuardRules> {
  if (publishedRules.some(({ id }) => id === rules.id)) throw rulesIdTaken(rules.id, true)
  const [row] = await insertEntries(place(scope), [rules])
  if (!row) throw rulesIdTaken(rules.id, false)
  return toOwn(row)
}

/** Changes own guard rules; their id stays, since surveys name it. */
export async function changeGuardRules(
  scope: GuardRulesScope,
  key: string,
  rules: GuardRules,
): Promise<OwnGuardRules> {
  const present = await selectEntry(place(scope), key)
  if (!present) throw noSuchRules()
  if (present.id !== rules.id) throw rulesIdChanged(present.id)
  return toOwn((await updateEntry(place(scope), key, { document: rules })) ?? present)
}

/** Retires own guard rules or offers them again; surveys that name them go on. */
export async function retireGuardRules(
  scope: GuardRulesScope,
  key: string,
  retired: boolean,
): Promise<OwnGuardRules> {
  const row = await updateEntry(place(scope), key, { retired })
  if (!row) throw noSuchRules()
  return toOwn(row)
}

const toOwn = ({ key, retired, updatedAt, document }: EntryRow): OwnGuardRules => ({
  key,
  retired,
  updatedAt: updatedAt.toISOString(),
  rules: guardRulesSchema.parse(document),
})
