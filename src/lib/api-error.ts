/** A refusal of the server, or, with status 0, no answer of the server at all (`offline`, `unreadable`). */
export class ApiError extends Error {
  constructor(
    readonly code: string,
    readonly status: number,
    message: string,
    readonly fields: readonly { path: string; message: string }[] = [],
  ) {
    super(message)
    this.name = 'ApiError'
  }
}

export const offline = () =>
  new ApiError(
    'offline',
    0,
    'There is no connection to the server. What is on the screen stays. Check the signal and try again.',
  )

/** Something answered, but not the server: a public network's own page, or a proxy's. */
export const unreadable = () =>
  new ApiError(
    'unreadable',
    0,
    'Something other than the server answered. What is on the screen stays. Check the connection, then try again.',
  )

/** One sentence for people, whatever went wrong. */
export const messageOf = (error: unknown): string =>
  error instanceof ApiError ? error.message : 'Something went wrong on this page. Reload it and try again.'

/** The server's sentence for a field of a form, if it has one. */
export const fieldError = (error: unknown, path: string): string | undefined =>
  error instanceof ApiError ? error.fields.find((field) => field.path === path)?.message : undefined
