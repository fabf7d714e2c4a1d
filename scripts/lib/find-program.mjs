import { accessSync, constants, readdirSync, statSync } from 'node:fs'
import { delimiter, join } from 'node:path'

/** Whether a file may be run by this user. */
export function runs(file) {
  try {
    accessSync(file, constants.X_OK)
    return statSync(file).isFile()
  } catch {
    return false
  }
}

export const pathFolders = () => (process.env.PATH ?? '').split(delimiter).filter(Boolean)

/** The first of some names found on the PATH. */
export function onPath(...names) {
  for (const name of names) {
    for (const folder of pathFolders()) if (runs(join(folder, name))) return join(folder, name)
  }
  return undefined
}

/** Names in a folder; none when it is not there. */
export function namesIn(folder) {
  try {
    return readdirSync(folder)
  } catch {
    return []
  }
}
