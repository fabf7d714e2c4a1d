import { z } from 'zod'

/** What a person does in the company; one person may have several. */
export const roles = ['owner', 'surveyor', 'estimator', 'shop', 'fitter'] as const
export const roleSchema = z.enum(roles)
export type Role = z.infer<typeof roleSchema>
