/** A moment as day and time people read, in their own time zone. */
export const momentText = (moment: string | number): string =>
  new Date(moment).toLocaleString(undefined, { dateStyle: 'medium', timeStyle: 'short' })

/** A day or a moment as a date people read. */
export const dateText = (date: string): string =>
  // A day alone belongs to no time zone: noon keeps it the same day everywhere.
  new Date(date.length === 10 ? `${date}T12:00:00` : date).toLocaleDateString(undefined, {
    day: 'numeric',
    month: 'short',
    year: 'numeric',
  })
