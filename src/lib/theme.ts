export type Theme = 'system' | 'light' | 'dark'

const KEY = 'tautbook.theme'

/** A browser that may keep nothing shows the device's colours, or the chosen ones until the page is left. */
function keep<Value>(work: () => Value): Value | undefined {
  try {
    return work()
  } catch {
    return undefined
  }
}

export function readTheme(): Theme {
  const kept = keep(() => localStorage.getItem(KEY))
  return kept === 'light' || kept === 'dark' ? kept : 'system'
}

/** Light, dark, or as the device says. */
export function applyTheme(theme: Theme): void {
  if (theme === 'system') {
    keep(() => localStorage.removeItem(KEY))
    delete document.documentElement.dataset['theme']
  } else {
    keep(() => localStorage.setItem(KEY, theme))
    document.documentElement.dataset['theme'] = theme
  }
}
