import type { Config } from 'tailwindcss'

/** Colours are names for what they say; their values per theme are in src/styles/page.css. */
const named = (names: readonly string[]): Record<string, string> =>
  Object.fromEntries(names.map((name) => [name, `var(--${name})`]))

export default {
  content: ['./index.html', './src/**/*.{ts,tsx}'],
  theme: {
    colors: {
      transparent: 'transparent',
      current: 'currentColor',
      ...named(['paper', 'sheet', 'shade', 'ink', 'soft', 'stroke', 'hair', 'link', 'on-ink']),
      ...named(['pass', 'warn', 'fail', 'info', 'waived', 'pass-wash', 'warn-wash', 'fail-wash', 'info-wash']),
    },
    fontFamily: {
      sans: ['ui-sans-serif', 'system-ui', 'Segoe UI', 'Helvetica Neue', 'Arial', 'sans-serif'],
      mono: ['JetBrains Mono', 'ui-monospace', 'monospace'],
    },
    screens: { sm: '40rem', md: '52rem', lg: '68rem', xl: '84rem' },
  },
} satisfies Config
