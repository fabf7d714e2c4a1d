import postgres from 'postgres'
import type { TestProject } from 'vitest/node'
import { startThrowawayCluster } from '../../scripts/lib/throwaway-cluster.mjs'
import { migrateDatabase } from '../../server/database/migrate'

declare module 'vitest' {
  export interface ProvidedContext {
    /** A database of the cluster from which others are made and dropped. */
    adminUrl: string
  }
}

const TEMPLATE = 'tautbook_template'

/** Once per run: a cluster of its own and in it one migrated database, of which every worker gets copies. */
export default async function setup(project: TestProject): Promise<() => Promise<void>> {
  const cluster = await startThrowawayCluster()
  try {
    const admin = postgres(cluster.url(), { max: 1 })
    await admin.unsafe(`create database ${TEMPLATE}`)
    await migrateDatabase({ url: cluster.url(TEMPLATE), folder: 'drizzle' })
    await admin.unsafe(`alter database ${TEMPLATE} with is_template true`)
    await admin.end()
  } catch (error) {
    await cluster.stop()
    throw error
  }
  project.provide('adminUrl', cluster.url())
  return () => cluster.stop()
}
