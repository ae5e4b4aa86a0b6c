import { quantityText } from '@/lib/core/units/format-quantity'
import type { RunHeading } from '@/lib/domain/findings/run-dto'

import { DataTable } from '../ui/data-table'
import { TextLink } from '../ui/text-link'
import { Timestamp } from '../ui/timestamp'
import { SymbolText } from './math-text'

/** The most telling results of a run in one line. */
const mostShown = 3

type RunTableProps = { readonly runs: readonly RunHeading[] }

export const RunTable = ({ runs }: RunTableProps) => (
  <DataTable
    caption="Runs, newest first"
    captionHidden
    rows={runs}
    rowKey={(run) => run.runId}
    columns={[
      {
        key: 'number',
        header: 'No.',
        align: 'end',
        cell: (run) => <span className="num">{run.number}</span>,
      },
      {
        key: 'title',
        header: 'Run',
        isRowHeader: true,
        cell: (run) => (
          <TextLink
            href={`/engagements/${run.engagementId}/bench/runs/${run.runId}`}
            className="inline-block min-w-40 [overflow-wrap:anywhere]"
          >
            {run.title}
          </TextLink>
        ),
      },
      { key: 'results', header: 'Results', cell: (run) => <Answer run={run} /> },
      { key: 'by', header: 'By', cell: (run) => run.createdBy },
      { key: 'when', header: 'At', cell: (run) => <Timestamp instant={run.createdAt} /> },
    ]}
  />
)

const Answer = ({ run }: { readonly run: RunHeading }) => {
  if (run.absence) return <span className="text-ink-soft">No ring was found</span>
  const shown = run.results.filter((result) => result.role === 'main').slice(0, mostShown)
  return (
    <span className="flex min-w-52 flex-wrap gap-x-4">
      {shown.map((result) => (
        <span key={result.key} className="whitespace-nowrap">
          <SymbolText symbol={result.symbol} />{' '}
          <span className="num">{quantityText(result.value, result.unit)}</span>
        </span>
      ))}
    </span>
  )
}
