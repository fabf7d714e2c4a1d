import { z } from 'zod'
import { keySchema } from '@shared/schemas/id'
import type { Job } from '@shared/schemas/job'
import { pageUnknown } from './jobs.errors'

const cursorSchema = z.discriminatedUnion('sort', [
  z.object({ sort: z.literal('updated'), at: z.iso.datetime(), id: keySchema }),
  z.object({ sort: z.literal('due'), due: z.union([z.iso.date(), z.literal('infinity')]), id: keySchema }),
  z.object({ sort: z.literal('number'), number: z.int() }),
])
/** Where a page ended: the place of its last job in the order it was sorted by. */
export type JobCursor = z.infer<typeof cursorSchema>
export type JobSort = JobCursor['sort']

const cursorOf: Record<JobSort, (row: Job) => JobCursor> = {
  updated: ({ updatedAt, id }) => ({ sort: 'updated', at: updatedAt, id }),
  due: ({ due, id }) => ({ sort: 'due', due: due ?? 'infinity', id }),
  number: ({ number }) => ({ sort: 'number', number }),
}

export const writeCursor = (sort: JobSort, row: Job): string =>
  Buffer.from(JSON.stringify(cursorOf[sort](row))).toString('base64url')

/** @throws AppError 400 for what no page of this order has said. */
export function readCursor(sort: JobSort, text: string): JobCursor {
  const read = cursorSchema.safeParse(parsed(Buffer.from(text, 'base64url').toString('utf8')))
  if (!read.success || read.data.sort !== sort) throw pageUnknown()
  return read.data
}

function parsed(text: string): unknown {
  try {
    return JSON.parse(text)
  } catch {
    return undefined
  }
}
