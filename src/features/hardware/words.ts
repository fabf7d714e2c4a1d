import type { Fitting } from '@shared/schemas/hardware'
import { writeForce } from '@shared/units/format-force'

export const mountWords: Record<Fitting['mount'], { short: string; long: string }> = {
  drilled: { short: 'drilled', long: 'Drilled into the post' },
  surface: { short: 'on the face', long: 'Fixed on its face' },
}

/** A force with its thousands set apart by a narrow space: `151 000 lbf`. @param force newtons */
export const forceText = (force: number, unit: 'lbf' | 'N'): string =>
  writeForce(force, unit).replace(/\B(?=(\d{3})+(?!\d))/g, '\u202f')
