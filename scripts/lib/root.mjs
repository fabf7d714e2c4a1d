import { dirname, join } from 'node:path'
import { fileURLToPath } from 'node:url'

/** The folder of the program. */
export const root = dirname(dirname(dirname(fileURLToPath(import.meta.url))))

/** A file or folder of the program. */
export const inRoot = (...names) => join(root, ...names)
