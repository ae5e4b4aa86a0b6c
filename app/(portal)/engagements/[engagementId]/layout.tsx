import type { Metadata } from 'next'

import { EngagementStatus } from '@/components/engagements/engagement-status'
import { EngagementTabs, type EngagementTab } from '@/components/engagements/engagement-tabs'
import { PageHeader } from '@/components/shell/page-header'
import { engagements } from '@/lib/server/operations'
import { query } from '@/lib/server/query'

export async function generateMetadata({
  params,
}: Pick<LayoutProps<'/engagements/[engagementId]'>, 'params'>): Promise<Metadata> {
  const { title } = await query(engagements.getHeading, await params)
  return { title: { default: title, template: `%s · ${title} · Quellbench` } }
}

export default async function EngagementLayout({
  children,
  params,
}: LayoutProps<'/engagements/[engagementId]'>) {
  const { engagementId } = await params
  const heading = await query(engagements.getHeading, { engagementId })
  const base = `/engagements/${engagementId}`
  return (
    <>
      <PageHeader
        title={heading.title}
        crumbs={[{ label: 'Engagements', href: '/engagements' }, { label: `No. ${heading.number}` }]}
        meta={
          <>
            <EngagementStatus status={heading.status} />
            <span>{heading.companyName}</span>
          </>
        }
        tabs={<EngagementTabs base={base} tabs={tabsFor(base, heading.may)} />}
      />
      {children}
    </>
  )
}

type Steps = { readonly read: boolean; readonly compute: boolean; readonly readTime: boolean }

function tabsFor(base: string, may: Steps): EngagementTab[] {
  const tabs = [
    { label: 'Overview', href: base, isOpen: true },
    { label: 'Evidence', href: `${base}/evidence`, isOpen: may.read },
    { label: 'Bench', href: `${base}/bench`, isOpen: may.compute },
    { label: 'Findings', href: `${base}/findings`, isOpen: may.read },
    { label: 'Reports', href: `${base}/reports`, isOpen: may.read },
    { label: 'Time', href: `${base}/time`, isOpen: may.readTime },
  ]
  return tabs.filter((tab) => tab.isOpen).map(({ label, href }) => ({ label, href }))
}
