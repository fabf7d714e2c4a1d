/** A file name that every system takes: plain letters, digits and dashes. @example "cut-list-1042-back-deck.xlsx" */
export function documentFileName(parts: readonly (string | number)[], extension: string): string {
  const name = parts
    .map((part) => String(part).normalize('NFKD').toLowerCase())
    .map((part) => part.replace(/[^a-z0-9]+/g, '-').replace(/^-+|-+$/g, ''))
    .filter((part) => part !== '')
    .join('-')
    .slice(0, 80)
    .replace(/-+$/, '')
  return `${name === '' ? 'tautbook' : name}.${extension}`
}
