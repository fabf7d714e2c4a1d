/** The next free id with this letter before a number: R4 after R1 and R3. Ids that are otherwise made do not count. */
export function nextId(taken: Iterable<string>, letter: string): string {
  let most = 0
  for (const id of taken) {
    const number = id.startsWith(letter) ? id.slice(letter.length) : ''
    if (/^\d{1,9}$/.test(number)) most = Math.max(most, Number(number))
  }
  return `${letter}${most + 1}`
}
