import type { Metadata } from 'next'

import { MethodForm } from '@/components/findings/method-form'
import { PageBody } from '@/components/shell/page-body'
import { Caution } from '@/components/ui/caution'
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
        <ul className="flex flex-col gap-1.5">
          {method.formulas.map((formula) => (
            <li key={formula} className="num text-sm [overflow-wrap:anywhere]">
              {formula}
            </li>
          ))}
        </ul>
      </Sheet>
      <Sheet title="Sources">
        <ul className="flex flex-col gap-1.5 text-sm">
          {method.sources.map(({ citation, standing }) => (
            <li key={citation}>
              {citation} <span className="text-ink-faint">({standing})</span>
            </li>
          ))}
        </ul>
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
        <ul className="flex max-w-measure list-disc flex-col gap-1 pl-5">
          {method.notes.map((note) => (
            <li key={note}>{note}</li>
          ))}
        </ul>
      </Sheet>
      <Caution title="Before you touch the board">
        <ul>
          {method.cautions.map((caution) => (
            <li key={caution}>{caution}</li>
          ))}
        </ul>
      </Caution>
    </PageBody>
  )
}
