import { inches, type Length } from '@shared/units/length'

/** Dressed sizes by nominal size: PS 20-20, American Softwood Lumber Standard, as listed in the check values. */
export const dressedSizes: readonly { nominal: string; size: Length }[] = [
  { nominal: '4x4', size: inches(3.5) },
  { nominal: '6x6', size: inches(5.5) },
]
