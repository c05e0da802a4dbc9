import { readStored, store, useStored } from './stored.ts'

const key = 'foldgauge-theme'
export const themes = ['system', 'light', 'dark'] as const
export type Theme = (typeof themes)[number]

const themeOf = (stored: string | null): Theme => (stored === 'light' || stored === 'dark' ? stored : 'system')

export const useTheme = (): Theme => themeOf(useStored(key))

export function applyTheme(): void {
  const theme = themeOf(readStored(key))
  if (theme === 'system') document.documentElement.removeAttribute('data-theme')
  else document.documentElement.dataset['theme'] = theme
}

export function chooseTheme(theme: Theme): void {
  store(key, theme === 'system' ? null : theme)
  applyTheme()
}
