import type { Bay } from '../schemas/bay'

/** A level bay between two posts with nothing read yet: what the bay schema makes of the bare ids. */
export const newBay = ({ id, from, to }: { id: string; from: string; to: string }): Bay => ({
  id,
  from,
  to,
  kind: 'level',
  spacers: 0,
  skewFrom: 0,
  skewTo: 0,
  taped: 'slope',
  readings: [],
})
