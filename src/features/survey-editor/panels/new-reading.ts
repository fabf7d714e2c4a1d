import type { Reading, ReadingPlace } from '@shared/schemas/bay'
import type { Length } from '@shared/units/length'

const SIGNS = 'abcdefghijklmnopqrstuvwxyz0123456789'

/** An id that two phones without signal will not both make. */
function readingId(): string {
  const bytes = crypto.getRandomValues(new Uint8Array(10))
  return `r${Array.from(bytes, (byte) => SIGNS[byte % SIGNS.length]).join('')}`
}

/** A reading taken here and now. */
export const newReading = (reading: { at: ReadingPlace; value: Length; by: string }): Reading => ({
  id: readingId(),
  ...reading,
  on: new Date().toISOString(),
})
