export interface ThrowawayCluster {
  /** The address of any of its databases; `postgres` is there from the start. */
  url: (database?: string) => string
  /** Stops it and removes all it kept. */
  stop: () => Promise<void>
}

/** A PostgreSQL of its own for one run of tests; gone after `stop`. @throws Trouble */
export function startThrowawayCluster(options?: { say?: (text: string) => void }): Promise<ThrowawayCluster>
