import type { CableResult, WhyNone } from '@shared/calculation/result'

export const modeWords: Record<CableResult['mode'], string> = {
  shop: 'shop: both ends crimped',
  site: 'site: second end on site',
  none: 'no length',
}

export const whyWords: Record<WhyNone, string> = {
  'missing-reading': 'a reading is missing',
  'no-fitting': 'no fitting suits',
  'too-long': 'too long',
}
