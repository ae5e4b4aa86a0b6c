'use client'

import { usePathname } from 'next/navigation'

import { TabLinks } from '../ui/tab-links'

export type EngagementTab = { readonly label: string; readonly href: string }

type EngagementTabsProps = { readonly base: string; readonly tabs: readonly EngagementTab[] }

/** The parts of an engagement that are open to the reader; the one in view is marked. */
export const EngagementTabs = ({ base, tabs }: EngagementTabsProps) => {
  const path = usePathname()
  const isCurrent = (href: string) => (href === base ? path === base : path.startsWith(href))
  return (
    <TabLinks
      label="Parts of the engagement"
      tabs={tabs.map((tab) => ({ ...tab, current: isCurrent(tab.href) }))}
    />
  )
}
