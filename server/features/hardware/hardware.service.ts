import { starterHardware } from '@shared/calculation/starter-hardware'
import { starterRules } from '@shared/calculation/starter-rules'
import {
  cableSchema,
  type Catalogue,
  type CatalogueCable,
  type CatalogueFitting,
  fittingSchema,
} from '@shared/schemas/catalogue'
import type { Cable, Fitting, Hardware } from '@shared/schemas/hardware'
import type { Database } from '../../database/client'
import { changeHouseRules } from '../house-rules/house-rules.service'
import { idChanged, idTaken, noSuchEntry, unknownCables } from './hardware.errors'
import {
  type EntryKind,
  type EntryRow,
  insertEntries,
  selectEntries,
  selectEntry,
  updateEntry,
} from '../../database/catalogue-entries.queries'

/** Whose hardware. */
export interface HardwareScope {
  database: Database
  companyId: string
}

/** Gives a new company the starter catalogue and rules, inside the transaction that makes it. */
export async function stockCompany(companyId: string, transaction: Database): Promise<void> {
  const scope = { database: transaction, companyId }
  await insertEntries({ ...scope, kind: 'cable' }, starterHardware.cables)
  await insertEntries({ ...scope, kind: 'fitting' }, starterHardware.fittings)
  await changeHouseRules(transaction, companyId, starterRules)
}

/** Everything in the catalogue, retired entries too. */
export async function listHardware(scope: HardwareScope): Promise<Catalogue> {
  const [cables, fittings] = await Promise.all([
    selectEntries({ ...scope, kind: 'cable' }),
    selectEntries({ ...scope, kind: 'fitting' }),
  ])
  return { cables: cables.map(toCable), fittings: fittings.map(toFitting) }
}

/** What a survey is calculated with: all that is offered, and retired cables that its runs still name. */
export async function hardwareFor(scope: HardwareScope, usedCables: ReadonlySet<string>): Promise<Hardware> {
  const { cables, fittings } = await listHardware(scope)
  return {
    cables: cables
      .filter(({ retired, cable }) => !retired || usedCables.has(cable.id))
      .map(({ cable }) => cable),
    fittings: fittings.filter(({ retired }) => !retired).map(({ fitting }) => fitting),
  }
}

/** Adds a cable under an id that the company does not use yet. */
export async function addCable(scope: HardwareScope, cable: Cable): Promise<CatalogueCable> {
  return toCable(await add({ ...scope, kind: 'cable' }, cable))
}

/** Changes what a cable is; its id stays, since surveys name it. */
export async function changeCable(scope: HardwareScope, key: string, cable: Cable): Promise<CatalogueCable> {
  return toCable(await change({ ...scope, kind: 'cable' }, key, cable))
}

/** Retires a cable or offers it again; surveys that name it go on. */
export async function retireCable(
  scope: HardwareScope,
  key: string,
  retired: boolean,
): Promise<CatalogueCable> {
  return toCable(await retire({ ...scope, kind: 'cable' }, key, retired))
}

/** Adds a fitting for cables that the company has. */
export async function addFitting(scope: HardwareScope, fitting: Fitting): Promise<CatalogueFitting> {
  await checkCables(scope, fitting)
  return toFitting(await add({ ...scope, kind: 'fitting' }, fitting))
}

/** Changes what a fitting is; its id stays. */
export async function changeFitting(
  scope: HardwareScope,
  key: string,
  fitting: Fitting,
): Promise<CatalogueFitting> {
  await checkCables(scope, fitting)
  return toFitting(await change({ ...scope, kind: 'fitting' }, key, fitting))
}

/** Retires a fitting or offers it again. */
export async function retireFitting(
  scope: HardwareScope,
  key: string,
  retired: boolean,
): Promise<CatalogueFitting> {
  return toFitting(await retire({ ...scope, kind: 'fitting' }, key, retired))
}

interface Place extends HardwareScope {
  kind: EntryKind
}

async function add(place: Place, document: Cable | Fitting): Promise<EntryRow> {
  const [row] = await insertEntries(place, [document])
  if (!row) throw idTaken(place.kind, document.id)
  return row
}

async function change(place: Place, key: string, document: Cable | Fitting): Promise<EntryRow> {
  const present = await selectEntry(place, key)
  if (!present) throw noSuchEntry(place.kind)
  if (present.id !== document.id) throw idChanged(place.kind, present.id)
  return (await updateEntry(place, key, { document })) ?? present
}

async function retire(place: Place, key: string, retired: boolean): Promise<EntryRow> {
  const row = await updateEntry(place, key, { retired })
  if (!row) throw noSuchEntry(place.kind)
  return row
}

async function checkCables(scope: HardwareScope, fitting: Fitting): Promise<void> {
  const known = new Set((await selectEntries({ ...scope, kind: 'cable' })).map(({ id }) => id))
  const unknown = fitting.cables.filter((id) => !known.has(id))
  if (unknown.length > 0) throw unknownCables(unknown)
}

const entry = ({ key, retired, updatedAt }: EntryRow) => ({
  key,
  retired,
  updatedAt: updatedAt.toISOString(),
})
const toCable = (row: EntryRow): CatalogueCable => ({ ...entry(row), cable: cableSchema.parse(row.document) })
const toFitting = (row: EntryRow): CatalogueFitting => ({
  ...entry(row),
  fitting: fittingSchema.parse(row.document),
})
