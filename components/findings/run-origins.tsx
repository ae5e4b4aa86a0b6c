import type { RunDto, RunInputDto } from '@/lib/domain/findings/run-dto'

import { TextLink } from '../ui/text-link'
import { MathText, SymbolText } from './math-text'

/** What went into a run: each value with its tolerance and where it was taken from. */
export const RunOrigins = ({ run }: { readonly run: RunDto }) => (
  <ul className="flex flex-col gap-1.5">
    {run.trace ? (
      <li>
        Channel {run.trace.channel} of evidence {run.trace.evidenceNumber}, {run.trace.evidenceName}
        {run.inputs.length === 0 ? ', the whole record' : ''}
      </li>
    ) : null}
    {run.inputs.map((input) => (
      <li key={input.key}>
        {input.label} <SymbolText symbol={input.symbol} />{' '}
        <span className="num">{writtenWithTolerance(input)}</span>
        <span className="block text-sm text-ink-soft">
          {input.fromRunId ? (
            <TextLink href={`/engagements/${run.engagementId}/bench/runs/${input.fromRunId}`}>
              <MathText>{input.origin}</MathText>
            </TextLink>
          ) : (
            input.origin
          )}
        </span>
      </li>
    ))}
  </ul>
)

function writtenWithTolerance({ written, tolerance }: RunInputDto): string {
  const text = written.unit === '' ? written.number : `${written.number}\u00a0${written.unit}`
  return tolerance ? `${text} ± ${tolerance.replace(/^±\s*/u, '')}` : text
}
