import type { LengthFormat } from '@shared/units/format-length'
import type { EditorView } from '../model/editor-context'

/** How the editor shows lengths: inches to the house's fraction, or millimetres. */
export const formatOf = ({ units, fraction }: Pick<EditorView, 'units' | 'fraction'>): LengthFormat =>
  units.length === 'mm' ? { style: 'millimetres' } : { style: 'inches', finest: fraction }
