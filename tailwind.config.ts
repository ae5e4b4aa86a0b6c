import type { Config } from 'tailwindcss'

const token = (name: string) => `var(--${name})`

/** The palette is closed on purpose: a colour that is not a token of the notebook does not compile to a class. */
const colors = Object.fromEntries(
  [
    'ground',
    'sheet',
    'sunk',
    'ink',
    'ink-soft',
    'ink-faint',
    'rule',
    'rule-strong',
    'grid',
    'copper',
    'copper-strong',
    'copper-wash',
    'on-copper',
    'verified',
    'verified-wash',
    'over-limit',
    'over-limit-wash',
    'focus',
    'scrim',
  ].map((name) => [name, token(name)]),
)

const config: Config = {
  content: ['./app/**/*.{ts,tsx}', './components/**/*.{ts,tsx}'],
  theme: {
    colors: { ...colors, transparent: 'transparent', current: 'currentColor', inherit: 'inherit' },
    fontFamily: {
      sans: ['var(--face-sans)', 'system-ui', 'sans-serif'],
      serif: ['var(--face-serif)', 'Georgia', 'serif'],
      mono: ['var(--face-mono)', 'ui-monospace', 'monospace'],
    },
    fontSize: {
      xs: ['0.8125rem', '1.125rem'],
      sm: ['0.9375rem', '1.375rem'],
      base: ['1rem', '1.5rem'],
      lg: ['1.1875rem', '1.625rem'],
      xl: ['1.4375rem', '1.8125rem'],
      '2xl': ['1.8125rem', '2.1875rem'],
      '3xl': ['2.25rem', '2.625rem'],
    },
    borderRadius: { none: '0', sm: '2px', DEFAULT: '2px', md: '3px', lg: '4px', full: '9999px' },
    extend: {
      boxShadow: { lift: '0 0.5rem 1.5rem var(--lift)' },
      maxWidth: { measure: '38rem', page: '76rem' },
    },
  },
}

export default config
