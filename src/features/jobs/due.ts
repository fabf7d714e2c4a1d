const DAY = 86_400_000

/** Days from today until a date; negative when it has passed. */
export function daysUntil(due: string, today: Date): number {
  const start = Date.UTC(today.getFullYear(), today.getMonth(), today.getDate())
  return Math.round((Date.parse(`${due}T00:00:00Z`) - start) / DAY)
}

/** A due date in words: `due today`, `2 days late`. */
export function dueWords(due: string, today: Date): string {
  const days = daysUntil(due, today)
  const count = (number: number) => (number === 1 ? '1 day' : `${number} days`)
  if (days === 0) return 'due today'
  return days < 0 ? `${count(-days)} late` : `due in ${count(days)}`
}
