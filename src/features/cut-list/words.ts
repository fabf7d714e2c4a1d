import type { CableResult, WhyNone } from '@shared/calculation/result'

export const modeWords: Record<CableResult['mode'], string> = {
  shop: 'both ends are crimped in the shop',
  site: 'the second end is cut and crimped on site',
  none: 'no length can be given',
}

export const whyWords: Record<WhyNone, string> = {
  'missing-reading': 'a reading is missing',
  'no-fitting': 'no fitting suits',
  'too-long': 'too long',
}
