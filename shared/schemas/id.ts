import { z } from 'zod'

/** A short name inside a survey or a catalogue: P1, B12, c532. */
export const idSchema = z
  .string()
  .regex(
    /^[A-Za-z0-9][A-Za-z0-9._-]{0,39}$/,
    'expected 1 to 40 letters, digits, dots, dashes or underscores, beginning with a letter or digit',
  )

/** A database key that leaves the server. */
export const keySchema = z.uuid()
