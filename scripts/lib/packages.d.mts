/** Whether what is installed in a folder is what its lock file names. */
export function packagesAreCurrent(folder?: string): boolean
