import { z } from 'zod'
import { type Force, newtons, poundsForce, toPoundsForce } from '../units/force'
import { inches, type Length, millimetres, nanometres, toInches, toMillimetres } from '../units/length'
import { type Money, moneyFromMain, moneyToMain } from '../units/money'
import { megapascals, psi, type Stress, toPsi } from '../units/stress'

/** Longest length anything may state: 1 km. A larger figure is a slip of the finger. */
const LONGEST = nanometres(1e12)
const LONGEST_BACKWARD = nanometres(-1e12)

/**
 * How lengths, forces and money are written. One schema is built over this, once for the program's own
 * units and once for each unit a survey file may use, so that reading, writing and publishing cannot drift.
 */
export interface Quantities {
  /** Any length, negative too. */
  length: z.ZodType<Length, number>
  /** A length of zero or more. */
  size: z.ZodType<Length, number>
  /** A length above zero. */
  positive: z.ZodType<Length, number>
  /** A force above zero. */
  force: z.ZodType<Force, number>
  /** A stress or modulus above zero. */
  stress: z.ZodType<Stress, number>
  /** An amount of zero or more. */
  price: z.ZodType<Money, number>
}

/** Gives a number schema the brand of its quantity; nothing changes at run time. */
const branded = <Quantity extends number>(schema: z.ZodType<number, number>) =>
  schema as unknown as z.ZodType<Quantity, number>

/** The program's own units: whole nanometres, newtons, newtons per square millimetre, minor units of money. */
export const storedQuantities: Quantities = {
  length: branded<Length>(z.int().min(LONGEST_BACKWARD).max(LONGEST)),
  size: branded<Length>(z.int().min(0).max(LONGEST)),
  positive: branded<Length>(z.int().min(1).max(LONGEST)),
  force: branded<Force>(z.number().positive().max(1e12)),
  stress: branded<Stress>(z.number().positive().max(1e9)),
  price: branded<Money>(z.int().nonnegative()),
}

interface FileUnits {
  length: { name: string; read: (value: number) => Length; write: (length: Length) => number }
  force: { name: string; read: (value: number) => Force; write: (force: Force) => number }
  stress: { name: string; read: (value: number) => Stress; write: (stress: Stress) => number }
}

function fileQuantities({ length, force, stress }: FileUnits): Quantities {
  const longest = length.write(LONGEST)
  const lengthCodec = (written: z.ZodNumber, description: string, stored: z.ZodNumber = z.int()) =>
    z.codec(written.meta({ description }), branded<Length>(stored), {
      decode: (value) => length.read(value),
      encode: (value) => length.write(value as Length),
    })
  return {
    length: lengthCodec(z.number().min(-longest).max(longest), `length in ${length.name}`),
    size: lengthCodec(z.number().min(0).max(longest), `length in ${length.name}, zero or more`),
    // What rounds to no whole nanometre would be stored as nothing.
    positive: lengthCodec(
      z.number().positive().max(longest),
      `length in ${length.name}, above zero`,
      z.int().min(1, 'expected a length above zero'),
    ),
    force: z.codec(
      z
        .number()
        .positive()
        .max(1e11)
        .meta({ description: `force in ${force.name}` }),
      branded<Force>(z.number()),
      { decode: (value) => force.read(value), encode: (value) => force.write(value as Force) },
    ),
    stress: z.codec(
      z
        .number()
        .positive()
        .max(1e10)
        .meta({ description: `stress in ${stress.name}` }),
      branded<Stress>(z.number()),
      { decode: (value) => stress.read(value), encode: (value) => stress.write(value as Stress) },
    ),
    price: z.codec(
      z.number().min(0).max(1e9).meta({ description: 'price in main units of money' }),
      branded<Money>(z.int()),
      {
        decode: (value) => moneyFromMain(value),
        encode: (value) => moneyToMain(value as Money),
      },
    ),
  }
}

const lengthUnits = {
  in: { name: 'inches', read: inches, write: (length: Length) => toInches(length) },
  mm: { name: 'millimetres', read: millimetres, write: (length: Length) => toMillimetres(length) },
}
const forceUnits = {
  // To 15 digits: 1 lbf is no whole number of newtons, and 150 lbf read and written must be 150 again.
  lbf: {
    name: 'pounds-force',
    read: poundsForce,
    write: (force: Force) => Number(toPoundsForce(force).toPrecision(15)),
  },
  N: { name: 'newtons', read: newtons, write: (force: Force) => force as number },
}

/** A stress goes with the unit of length: pounds-force per square inch, or newtons per square millimetre. */
const stressUnits = {
  in: { name: 'psi', read: psi, write: (stress: Stress) => Number(toPsi(stress).toPrecision(15)) },
  mm: {
    name: 'newtons per square millimetre',
    read: megapascals,
    write: (stress: Stress) => stress as number,
  },
}

export const unitsSchema = z.strictObject({ length: z.enum(['in', 'mm']), force: z.enum(['lbf', 'N']) })
/** The units a survey file is written in. */
export type Units = z.infer<typeof unitsSchema>

/** Quantities as a survey file in these units writes them. */
export const quantitiesIn = (units: Units): Quantities =>
  fileQuantities({
    length: lengthUnits[units.length],
    force: forceUnits[units.force],
    stress: stressUnits[units.length],
  })
