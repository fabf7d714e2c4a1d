const OURS = 'https://tautbook.invalid'
const HOME = '/jobs'

/** Where to go after signing in: what was asked for, so far as it is a page of ours that wants a session. */
export function safeNext(next: string | null): string {
  if (!next?.startsWith('/') || !URL.canParse(next, OURS)) return HOME
  // Read as a browser reads it: backslashes, tabs and dots can make another machine's address of an innocent one.
  const { origin, pathname, search, hash } = new URL(next, OURS)
  const elsewhere = origin !== OURS || pathname.startsWith('//')
  return elsewhere || /^\/(sign-in|register|invite)(\/|$)/.test(pathname) ? HOME : pathname + search + hash
}
