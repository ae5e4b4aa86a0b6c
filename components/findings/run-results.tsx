import type { RunDto } from '@/lib/domain/findings/run-dto'

import { Disclosure } from '../ui/disclosure'
import { Notice } from '../ui/notice'
import { RunNumber } from './run-number'

type RunResultsProps = { readonly run: RunDto }

/** The numbers that answer the question first; the steps on the way to them behind one press. */
export const RunResults = ({ run }: RunResultsProps) => {
  const withRole = (role: 'main' | 'intermediate') => run.results.filter((result) => result.role === role)
  const [answers, steps] = [withRole('main'), withRole('intermediate')]
  return (
    <div className="flex flex-col gap-3">
      {run.absence ? <Notice title="No ring was found">{run.absence}</Notice> : null}
      <div className="divide-y divide-rule">
        {answers.map((result) => (
          <RunNumber key={result.key} run={run} result={result} />
        ))}
      </div>
      {steps.length > 0 ? (
        <Disclosure summary={<span className="text-sm">{steps.length} values on the way</span>}>
          <div className="divide-y divide-rule">
            {steps.map((result) => (
              <RunNumber key={result.key} run={run} result={result} />
            ))}
          </div>
        </Disclosure>
      ) : null}
    </div>
  )
}
