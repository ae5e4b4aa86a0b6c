import { useEffect } from 'react'

/** Calls back when the theme changes, by the system or by the reader's choice, for what is painted and not styled. */
export const useThemeChange = (onChange: () => void): void => {
  useEffect(() => {
    const media = window.matchMedia('(prefers-color-scheme: dark)')
    const observer = new MutationObserver(onChange)
    media.addEventListener('change', onChange)
    observer.observe(document.documentElement, { attributeFilter: ['data-theme'] })
    return () => {
      media.removeEventListener('change', onChange)
      observer.disconnect()
    }
  }, [onChange])
}
