import type { Response } from 'express'

interface FileAnswer {
  /** Of plain letters, digits, dots and dashes, as `documentFileName` makes it. */
  name: string
  type: string
  bytes: Buffer | string
}

/** Answers with a file to keep. It is one company's and may be out of date tomorrow: nobody stores it on the way. */
export function sendFile(response: Response, { name, type, bytes }: FileAnswer): void {
  response
    .status(200)
    .type(type)
    .set({
      'Content-Disposition': `attachment; filename="${name}"`,
      'Cache-Control': 'private, no-store',
      'X-Content-Type-Options': 'nosniff',
    })
    .send(bytes)
}
