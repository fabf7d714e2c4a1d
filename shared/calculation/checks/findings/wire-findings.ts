import type { Notice } from '../../findings/notice'
import { ruleBehind } from '../../guard-rules/published-rules'
import type { Phrase } from '../../phrase'
import { NM_PER_MILLIMETRE } from '../../../units/length'
import type { BayCheck } from '../check-bay'
import type { LookedUp } from '../wire-tables'
import type { BayContext } from './bay-check-findings'

const outside: Record<Extract<LookedUp, { found: 'not-tabulated' }>['because'], string> = {
  wire: 'this diameter and lay is not in the tables',
  spacing: 'the cables stand wider apart than any in the tables',
  distance: 'the span is wider than any in the tables',
}

/**
 * A bay against the wire tables of NCC 2022: too little tension, not allowed, or not in the tables.
 *
 * Source: ABCB Housing Provisions 2022, 11.3.6; a look-up, never a fit.
 */
export function wireFindings(bay: BayCheck, { guard, run }: BayContext): Notice[] {
  const { wire } = bay
  if (!wire || !guard.rules?.wireTables) return []
  const rule = ruleBehind(guard.rules, guard.rules.wireTables)
  const say = (level: Notice['level'], code: string, phrase: Phrase): Notice => ({
    level,
    code,
    where: { run: bay.run, bay: bay.bay },
    phrase: [`Bay ${bay.bay}: `, ...phrase],
    rule,
  })
  const { leastTension: least, mostDeflection } = wire
  if (least.found === 'not-tabulated') {
    return [
      say('check', 'wire-not-tabulated', [
        `${outside[least.because]}. Ask the engineer, or use a tested wire.`,
      ]),
    ]
  }
  const at: Phrase = [
    'spacing ',
    { length: least.spacing * NM_PER_MILLIMETRE },
    ' over ',
    { length: least.distance * NM_PER_MILLIMETRE },
  ]
  if (least.found === 'not-allowed') {
    return [
      say('stop', 'wire-not-allowed', [
        'the tables do not allow this wire at a ',
        ...at,
        '. Use closer cables or spans.',
      ]),
    ]
  }
  const { tension } = run
  const notices: Notice[] = []
  if (tension < least.value * (1 - 1e-12)) {
    const phrase = [
      'the tables ask for ',
      { force: least.value },
      ' at a ',
      ...at,
      ', the run has ',
      { force: tension },
      '.',
    ]
    notices.push(say('stop', 'wire-tension-low', phrase))
  }
  if (mostDeflection.found === 'value') {
    const phrase = [
      'to prove the tension, 2 kg hung at mid-span may deflect a continuous wire by at most ',
      { length: mostDeflection.value * NM_PER_MILLIMETRE },
      '.',
    ]
    notices.push(say('note', 'wire-deflection', phrase))
  }
  return notices
}
