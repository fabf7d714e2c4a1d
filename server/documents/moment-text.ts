/** A moment as it stands on documents, the same for every reader. @example `2026-05-14 10:12 UTC` */
export const momentText = (moment: Date): string =>
  `${moment.toISOString().slice(0, 16).replace('T', ' ')} UTC`
