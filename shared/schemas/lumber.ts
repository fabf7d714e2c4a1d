import { z } from 'zod'
import { psi } from '../units/stress'
import { idSchema } from './id'
import type { Quantities } from './quantities'

/**
 * A species and grade of lumber for posts: reference bending design value Fb, size factor C_F and modulus E. Starting
 * values are those of the NDS Supplement, read in a copy; the grade stamp and the engineer decide.
 */
export const makeLumberSchema = (q: Quantities) =>
  z.strictObject({
    id: idSchema,
    name: z.string().min(1).max(120),
    /** Fb */
    bending: q.stress,
    /** C_F */
    sizeFactor: z.number().positive().max(5).default(1),
    /** E */
    modulus: q.stress,
  })

export type Lumber = z.infer<ReturnType<typeof makeLumberSchema>>

/** Southern Pine No. 2, Douglas Fir-Larch No. 2 and Hem-Fir No. 2, 2 to 4 in wide (NDS Supplement, read in a copy). */
export const startingLumber = (): Lumber[] => [
  {
    id: 'southern-pine-2',
    name: 'Southern Pine No. 2',
    bending: psi(1100),
    sizeFactor: 1,
    modulus: psi(1.4e6),
  },
  {
    id: 'douglas-fir-larch-2',
    name: 'Douglas Fir-Larch No. 2',
    bending: psi(900),
    sizeFactor: 1.5,
    modulus: psi(1.6e6),
  },
  { id: 'hem-fir-2', name: 'Hem-Fir No. 2', bending: psi(850), sizeFactor: 1.5, modulus: psi(1.3e6) },
]
