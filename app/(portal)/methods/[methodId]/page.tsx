import type { Metadata } from 'next'

import { MethodDocument } from '@/components/methods/method-document'
import { PageBody } from '@/components/shell/page-body'
import { PageHeader } from '@/components/shell/page-header'
import { methodPages } from '@/lib/server/operations'
import { query } from '@/lib/server/query'

type Props = PageProps<'/methods/[methodId]'>

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { definition } = await query(methodPages.getMethodPage, await params)
  return { title: definition.title }
}

export default async function MethodPage({ params }: Props) {
  const { definition, example, given } = await query(methodPages.getMethodPage, await params)
  return (
    <>
      <PageHeader
        crumbs={[{ label: 'Methods', href: '/methods' }, { label: definition.id }]}
        title={definition.title}
        lead={definition.purpose}
        meta={<span>Version {definition.version}</span>}
      />
      <PageBody>
        <MethodDocument definition={definition} example={example} given={given} />
      </PageBody>
    </>
  )
}
