/** The next free short id for a photo inside a survey: `F1`, `F2`; none is used again. */
export function nextPhotoId(taken: Iterable<string>): string {
  const used = new Set(taken)
  let number = 1
  while (used.has(`F${number}`)) number += 1
  return `F${number}`
}
