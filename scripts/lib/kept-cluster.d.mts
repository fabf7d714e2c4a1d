interface KeptCluster {
  /** The address of its one database. */
  url: string
  stop: () => Promise<void>
}

/** Finds or makes the cluster of a data folder and starts it. @throws Trouble */
export function openKeptCluster(options: {
  dataFolder: string
  /** Whether somebody chose the folder, so that no other may be taken in its stead. */
  dataChosen: boolean
  say: (text: string) => void
}): Promise<KeptCluster>
