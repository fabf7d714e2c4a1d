/** A refusal of the server, or the network's silence (`offline`). */
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
  new ApiError('offline', 0, 'There is no connection to the server. Check the signal and try again.')

/** One sentence for people, whatever went wrong. */
export const messageOf = (error: unknown): string =>
  error instanceof ApiError ? error.message : 'Something went wrong on this page. Reload it and try again.'

/** The server's sentence for a field of a form, if it has one. */
export const fieldError = (error: unknown, path: string): string | undefined =>
  error instanceof ApiError ? error.fields.find((field) => field.path === path)?.message : undefined
