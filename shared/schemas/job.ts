import { z } from 'zod'
import { keySchema } from './id'

export const stages = ['measure', 'check', 'price', 'agreed', 'shop', 'fit', 'done', 'lost'] as const
export const stageSchema = z.enum(stages)
/** Where a job stands. */
export type Stage = z.infer<typeof stageSchema>

export const jobFieldsSchema = z.object({
  title: z.string().trim().min(1, 'Write a title, such as the customer’s name and the place.').max(120),
  customer: z.string().trim().max(120).default(''),
  site: z.string().trim().max(300).default(''),
  due: z.iso.date().nullable().default(null),
  /** The person the job is with. */
  personId: keySchema.nullable().default(null),
  notes: z.string().max(4000).default(''),
})

export const jobSchema = jobFieldsSchema.extend({
  id: keySchema,
  number: z.int(),
  stage: stageSchema,
  personName: z.string().nullable(),
  surveyCount: z.int(),
  createdAt: z.iso.datetime(),
  updatedAt: z.iso.datetime(),
})
export type Job = z.infer<typeof jobSchema>

export const jobChangesSchema = z.object({
  title: jobFieldsSchema.shape.title.optional(),
  customer: z.string().trim().max(120).optional(),
  site: z.string().trim().max(300).optional(),
  due: z.iso.date().nullable().optional(),
  personId: keySchema.nullable().optional(),
  notes: z.string().max(4000).optional(),
})

export const jobListQuerySchema = z.object({
  /** Words looked for in number, title, customer and site. */
  search: z.string().max(120).optional(),
  stage: stageSchema.optional(),
  personId: keySchema.optional(),
  sort: z.enum(['updated', 'due', 'number']).default('updated'),
  /** Where the page before ended, as that page said. */
  after: z.string().max(200).optional(),
  limit: z.coerce.number().int().min(1).max(100).default(50),
})
export const jobPageSchema = z.object({ jobs: z.array(jobSchema), next: z.string().nullable() })
