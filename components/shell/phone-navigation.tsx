'use client'

import { usePathname } from 'next/navigation'
import { useEffect, useRef } from 'react'

import { buttonClass } from '../ui/button-class'
import type { NavigationItem } from './navigation-item'
import { NavigationLinks } from './navigation-links'

/** The navigation behind one button on narrow screens. The browser's own element, so it opens without script. */
export const PhoneNavigation = ({ items }: { readonly items: readonly NavigationItem[] }) => {
  const details = useRef<HTMLDetailsElement>(null)
  const pathname = usePathname()
  useEffect(() => {
    if (details.current) details.current.open = false
  }, [pathname])

  return (
    <details ref={details} className="group md:hidden">
      <summary className={buttonClass('plain', 'small', 'min-h-11 px-3')}>
        <svg viewBox="0 0 16 12" aria-hidden="true" className="w-4">
          <path d="M0 1H16M0 6H16M0 11H10" stroke="currentColor" strokeWidth="1.75" />
        </svg>
        Menu
      </summary>
      <nav
        aria-label="Main"
        className="absolute inset-x-0 top-full z-30 border-b border-rule-strong bg-sheet shadow-lift"
      >
        <NavigationLinks items={items} direction="column" />
      </nav>
    </details>
  )
}
