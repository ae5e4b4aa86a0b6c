import type { Metadata } from 'next'

import { FormulaList } from '@/components/findings/formula-list'
import { MethodCaution } from '@/components/findings/method-caution'
import { MethodForm } from '@/components/findings/method-form'
import { NoteList } from '@/components/findings/note-list'
import { SourceList } from '@/components/findings/source-list'
import { PageBody } from '@/components/shell/page-body'
import { Sheet } from '@/components/ui/sheet'
import { TextLink } from '@/components/ui/text-link'
import { runs } from '@/lib/server/operations'
import { query } from '@/lib/server/query'

import { runMethod } from '../actions'

type Props = PageProps<'/engagements/[engagementId]/bench/[methodId]'>

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { title } = await query(runs.getMethod, await params)
  return { title }
}

export default async function MethodPage({ params, searchParams }: Props) {
  const { engagementId, methodId } = await params
  const { from } = await searchParams
  const [method, stored] = await Promise.all([
    query(runs.getMethod, { engagementId, methodId }),
    query(runs.listRuns, { engagementId }),
  ])
  const aside = (
    <>
      <Sheet title="Formulas">
        <FormulaList formulas={method.formulas} />
      </Sheet>
      <Sheet title="Sources">
        <SourceList sources={method.sources} />
      </Sheet>
    </>
  )
  return (
    <PageBody aside={aside}>
      <div>
        <p className="text-sm">
          <TextLink href={`/engagements/${engagementId}/bench`}>Bench</TextLink>
        </p>
        <h2 className="mt-1 text-xl">{method.title}</h2>
        <p className="max-w-measure text-ink-soft">{method.purpose}</p>
      </div>
      <Sheet title="Inputs">
        <MethodForm
          engagementId={engagementId}
          methodId={methodId}
          inputs={method.inputs}
          runs={stored}
          startFrom={typeof from === 'string' ? from : undefined}
          action={runMethod}
        />
      </Sheet>
      <Sheet title="To know besides">
        <NoteList notes={method.notes} />
      </Sheet>
      <MethodCaution cautions={method.cautions} />
    </PageBody>
  )
}
