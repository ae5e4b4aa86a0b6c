'use client'

import { useState } from 'react'

import { themeCookie } from './theme-cookie'

export type Theme = 'system' | 'light' | 'dark'

const labels: readonly (readonly [Theme, string])[] = [
  ['system', 'As the system'],
  ['light', 'Paper'],
  ['dark', 'Night'],
]

const apply = (theme: Theme) => {
  if (theme === 'system') delete document.documentElement.dataset['theme']
  else document.documentElement.dataset['theme'] = theme
  const age = theme === 'system' ? 0 : 31_536_000
  document.cookie = `${themeCookie}=${theme}; path=/; max-age=${age}; samesite=lax`
}

/** Light or dark, kept in a cookie of this browser. */
export const ThemeChoice = ({ initial }: { readonly initial: Theme }) => {
  const [theme, setTheme] = useState(initial)
  return (
    <fieldset>
      <legend className="text-sm text-ink-soft">Appearance</legend>
      <div className="mt-1 flex flex-wrap gap-x-4 gap-y-1">
        {labels.map(([value, label]) => (
          <label key={value} className="flex min-h-6 items-center gap-1.5 text-sm">
            <input
              type="radio"
              name="theme"
              value={value}
              checked={theme === value}
              onChange={() => {
                setTheme(value)
                apply(value)
              }}
              className="size-4 accent-copper"
            />
            {label}
          </label>
        ))}
      </div>
    </fieldset>
  )
}
