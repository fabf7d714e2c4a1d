import { useState } from 'react'
import { writeLength } from '@shared/units/format-length'
import type { Length } from '@shared/units/length'
import { parseLength } from '@shared/units/parse-length'
import { TextArea } from '@/components/field'
import type { EditorView } from '../model/editor-context'
import { formatOf } from './format-of'
import { lengthFault } from './length-bounds'

interface HeightsFieldProps {
  view: EditorView
  heights: readonly Length[]
  onChange: (heights: Length[]) => void
}

/** Heights of the cables one by one, a line each; nothing is taken over while a line is not understood. */
export function HeightsField({ view, heights, onChange }: HeightsFieldProps) {
  const [text, setText] = useState<string | null>(null)
  const format = formatOf(view)
  const lines = (text ?? '').split('\n').filter((line) => line.trim() !== '')
  const parsed = lines.map((line) => parseLength(line, { default: view.units.length }))
  const fault = parsed.flatMap((each, i) => {
    const wrong = each.ok ? lengthFault(each.length) : each.message
    return wrong === undefined ? [] : [`Line ${i + 1}: ${wrong}`]
  })[0]
  const keep = () => {
    if (text === null || fault || parsed.length === 0) return
    onChange(parsed.flatMap((each) => (each.ok ? [each.length] : [])).sort((a, b) => a - b))
    setText(null)
  }
  return (
    <TextArea
      label="Heights above the walking surface, one a line"
      value={text ?? heights.map((height) => writeLength(height, format)).join('\n')}
      error={fault}
      disabled={!view.canEdit}
      rows={6}
      onChange={(event) => setText(event.target.value)}
      onBlur={keep}
    />
  )
}
