export type ParsedNumber = { ok: true; value: number | undefined } | { ok: false; message: string }

export interface NumberLimits {
  min?: number
  max?: number
}

/** Digits with a point or a comma before the decimals, a sign before them, no grouping: 1,000 would be read two ways. */
const written = /^[-+−]?(\d+([.,]\d*)?|[.,]\d+)$/

/** Reads a number as people type it; says what was not understood and what would be. Nothing written is no number. */
export function parseNumber(text: string, { min, max }: NumberLimits = {}): ParsedNumber {
  const trimmed = text.trim()
  if (trimmed === '') return { ok: true, value: undefined }
  if (!written.test(trimmed)) {
    return { ok: false, message: `“${trimmed}” is no number. Write digits, such as 2.5.` }
  }
  if (/^[-+−]?[1-9]\d{0,2},\d{3}$/.test(trimmed)) {
    const bare = trimmed.replace(',', '')
    return {
      ok: false,
      message: `“${trimmed}” can be read two ways. Write ${bare} or ${trimmed.replace(',', '.')}.`,
    }
  }
  const value = Number(trimmed.replace(',', '.').replace('−', '-'))
  if (min !== undefined && value < min) return { ok: false, message: `Write ${min} or more.` }
  if (max !== undefined && value > max) return { ok: false, message: `Write ${max} or less.` }
  return { ok: true, value }
}
