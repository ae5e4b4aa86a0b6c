import { exactQuantityText } from '@/lib/core/units/exact-quantity-text'
import { quantityText } from '@/lib/core/units/format-quantity'
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
        {input.label} <SymbolText symbol={input.symbol} /> <span className="num">{written(input)}</span>
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

/** A typed value with the digits that it was typed with; a computed one with enough to be recognised. */
function written({ value, unit, tolerance, fromRunId }: RunInputDto): string {
  const text = fromRunId ? quantityText(value, unit, 5) : exactQuantityText(value, unit)
  return tolerance ? `${text} ± ${tolerance.replace(/^±\s*/u, '')}` : text
}
