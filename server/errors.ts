/** A field of a form and what is wrong with it. */
export interface FieldFault {
  path: string
  message: string
}

/**
 * The one error the server throws on purpose. `code` is stable, for programs; `message` is one sentence for people;
 * `log` is for us and never leaves the server.
 */
export class AppError extends Error {
  readonly status: number
  readonly code: string
  readonly fields: FieldFault[] | undefined
  readonly log: string | undefined

  constructor(
    status: number,
    code: string,
    message: string,
    { fields, log, cause }: { fields?: FieldFault[]; log?: string; cause?: unknown } = {},
  ) {
    super(message, { cause })
    this.name = 'AppError'
    this.status = status
    this.code = code
    this.fields = fields
    this.log = log
  }
}

export const notSignedIn = () => new AppError(401, 'not-signed-in', 'Sign in to go on.')
export const notAllowed = (log: string) =>
  new AppError(403, 'not-allowed', 'Your roles do not allow this. Ask an owner of your company.', { log })
/** Also what another company's things look like: whether they exist is not told. */
export const notFound = (what: string) =>
  new AppError(404, 'not-found', `There is no such ${what}. It may have been removed, or the link is wrong.`)

/** Whatever was thrown, as an error. */
export const asError = (thrown: unknown): Error =>
  thrown instanceof Error ? thrown : new Error('Something was thrown that is no error.', { cause: thrown })
