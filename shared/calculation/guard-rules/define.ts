import type { z } from 'zod'
import { type GuardRules, makeGuardRulesSchema } from '../../schemas/guard-rules'
import { quantitiesIn, type Units } from '../../schemas/quantities'

type Written = z.input<ReturnType<typeof makeGuardRulesSchema>>

export const INCH_POUND: Units = { length: 'in', force: 'lbf' }
export const METRIC: Units = { length: 'mm', force: 'N' }

/** Reads rules written in their own units. */
export const defineRules = (written: Written): GuardRules =>
  makeGuardRulesSchema(quantitiesIn(written.units)).parse(written)
