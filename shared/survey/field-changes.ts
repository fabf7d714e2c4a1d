import { z } from 'zod'

type Bare<Field> =
  Field extends z.ZodDefault<infer Inner>
    ? Bare<Inner>
    : Field extends z.ZodOptional<infer Inner>
      ? Bare<Inner>
      : Field
type Changes<Shape extends z.ZodRawShape> = z.ZodObject<
  { [Key in keyof Shape]: z.ZodOptional<Bare<Shape[Key]>> },
  z.core.$strict
>

/** A field without its default or optionality: in a change, an absent key means "as it is", never the default. */
function bare(field: z.core.$ZodType): z.core.$ZodType {
  if (field instanceof z.ZodDefault || field instanceof z.ZodOptional) return bare(field.unwrap())
  return field
}

/**
 * What a `set` operation carries for an object of this shape: keys to set, and optional keys to take away. A key in
 * neither stays as it is.
 */
export function fieldChanges<Shape extends z.ZodRawShape>(shape: Shape) {
  const entries = Object.entries(shape)
  const fields = Object.fromEntries(entries.map(([key, field]) => [key, z.optional(bare(field))]))
  const optional = entries.flatMap(([key, field]) => (field instanceof z.ZodOptional ? [key] : []))
  return {
    set: z.strictObject(fields) as unknown as Changes<Shape>,
    unset: z.array(z.enum(optional as (keyof Shape & string)[])).default([]),
  }
}
