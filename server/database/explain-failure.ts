/** The database as people may see it: never with its password. */
export function describeDatabase(url: string): string {
  const { hostname, port, pathname, username } = new URL(url)
  const name = decodeURIComponent(pathname.slice(1)) || username || 'postgres'
  return `${hostname || 'localhost'}:${port || '5432'}/${name}`
}

/** What the driver and PostgreSQL call the failure: `ECONNREFUSED`, `28P01`. */
const codeOf = (error: unknown): string =>
  error instanceof Error && 'code' in error && typeof error.code === 'string' ? error.code : ''

/** Drizzle wraps the driver's error; what counts is the innermost. */
function innermost(error: unknown): unknown {
  let inner = error
  while (inner instanceof Error && inner.cause !== undefined) inner = inner.cause
  return inner
}

const sentences: Record<string, (where: string) => string> = {
  ECONNREFUSED: (where) =>
    `Nothing answers at the database ${where}: start PostgreSQL there, or correct DATABASE_URL.`,
  ENOTFOUND: (where) => `The host of the database ${where} is not known: correct DATABASE_URL.`,
  EAI_AGAIN: (where) =>
    `The host of the database ${where} could not be looked up: check the network, or correct DATABASE_URL.`,
  CONNECT_TIMEOUT: (where) =>
    `The database ${where} did not answer within 10 seconds: check the network, or correct DATABASE_URL.`,
  '28P01': (where) =>
    `The database ${where} refused the user name or password: correct them in DATABASE_URL.`,
  '28000': (where) => `The database ${where} does not let this user in: correct the user in DATABASE_URL.`,
  '3D000': (where) =>
    `The server answers, but the database ${where} does not exist: create it (createdb), or correct DATABASE_URL.`,
  '42501': (where) =>
    `The user in DATABASE_URL may not create tables in ${where}: grant it, or give the owner of the database.`,
  '53100': (where) => `The disk of the database ${where} is full: free some space, then start again.`,
  '53300': (where) =>
    `The database ${where} has no connection left: close other programs that use it, then start again.`,
  '57P03': (where) => `The database ${where} is still starting or stopping: try again in a minute.`,
}
const aliases: Record<string, string> = {
  ETIMEDOUT: 'CONNECT_TIMEOUT',
  EHOSTUNREACH: 'CONNECT_TIMEOUT',
  ENETUNREACH: 'CONNECT_TIMEOUT',
  CONNECTION_CLOSED: 'ECONNREFUSED',
  CONNECTION_DESTROYED: 'ECONNREFUSED',
  ECONNRESET: 'ECONNREFUSED',
}

const certificateCodes = /CERT|^UNABLE_TO_|^ERR_TLS/

/** One sentence that says what is wrong, where, and what to do; undefined for what is no failure to reach or use it. */
export function explainDatabaseFailure(error: unknown, url: string): string | undefined {
  const code = codeOf(innermost(error))
  const where = describeDatabase(url)
  if (certificateCodes.test(code)) {
    return `The certificate of the database ${where} is not trusted (${code}): correct sslmode in DATABASE_URL, or give the authority’s certificate with NODE_EXTRA_CA_CERTS.`
  }
  return sentences[aliases[code] ?? code]?.(where)
}
