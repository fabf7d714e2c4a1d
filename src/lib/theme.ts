export type Theme = 'system' | 'light' | 'dark'

const KEY = 'tautbook.theme'

export function readTheme(): Theme {
  const kept = localStorage.getItem(KEY)
  return kept === 'light' || kept === 'dark' ? kept : 'system'
}

/** Light, dark, or as the device says. */
export function applyTheme(theme: Theme): void {
  if (theme === 'system') {
    localStorage.removeItem(KEY)
    delete document.documentElement.dataset['theme']
  } else {
    localStorage.setItem(KEY, theme)
    document.documentElement.dataset['theme'] = theme
  }
}
