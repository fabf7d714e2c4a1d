export type RefusalCode = 'not-there' | 'already-there' | 'still-used' | 'not-fitting'

/** Why an operation does not fit the survey it was meant for. */
export class OperationRefused extends Error {
  constructor(
    readonly code: RefusalCode,
    message: string,
  ) {
    super(message)
    this.name = 'OperationRefused'
  }
}
