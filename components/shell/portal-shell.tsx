'use client'

import { usePathname } from 'next/navigation'
import type { ReactNode } from 'react'

import { AppShell } from './app-shell'
import type { NavigationItem } from './navigation-item'

type PortalShellProps = Omit<Parameters<typeof AppShell>[0], 'navigation' | 'children'> & {
  readonly navigation: readonly NavigationItem[]
  readonly children: ReactNode
}

/** The shell that knows which of its places the page belongs to. */
export const PortalShell = ({ navigation, ...shell }: PortalShellProps) => {
  const pathname = usePathname()
  const items = navigation.map((item) => ({
    ...item,
    current: pathname === item.href || pathname.startsWith(`${item.href}/`),
  }))
  return <AppShell {...shell} navigation={items} />
}
