interface KeptCluster {
  /** The address of its one database. */
  url: string
  stop: () => Promise<void>
  /** Whether its server has ended, as when it was killed. */
  isGone: () => boolean
  /** Starts it again on the same port. @throws Trouble */
  startAgain: () => Promise<number>
}

/** Finds or makes the cluster of a data folder and starts it. @throws Trouble */
export function openKeptCluster(options: {
  dataFolder: string
  /** Whether somebody chose the folder, so that no other may be taken in its stead. */
  dataChosen: boolean
  say: (text: string) => void
}): Promise<KeptCluster>
