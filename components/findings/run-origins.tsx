import { formatQuantity } from '@/lib/core/units/format-quantity'
import type { RunDto } from '@/lib/domain/findings/run-dto'

import { Quantity } from '../ui/quantity'
import { TextLink } from '../ui/text-link'
import { SymbolText } from './symbol-text'

/** What went into a run: each value with its tolerance and where it was taken from. */
export const RunOrigins = ({ run }: { readonly run: RunDto }) => (
  <ul className="flex flex-col gap-1.5">
    {run.trace ? (
      <li>
        The stored samples of channel {run.trace.channel} of evidence {run.trace.evidenceNumber},{' '}
        {run.trace.evidenceName}
        {run.inputs.length === 0 ? '; the whole record' : ''}
      </li>
    ) : null}
    {run.inputs.map(({ key, label, symbol, unit, value, tolerance, origin, fromRunId }) => {
      const written = formatQuantity(value, unit, 5)
      return (
        <li key={key}>
          {label} <SymbolText symbol={symbol} />{' '}
          <Quantity
            value={written.number}
            unit={written.unit}
            {...(tolerance ? { interval: `± ${tolerance.replace(/^±\s*/u, '')}` } : {})}
          />
          <span className="block text-sm text-ink-soft">
            {fromRunId ? (
              <TextLink href={`/engagements/${run.engagementId}/bench/runs/${fromRunId}`}>{origin}</TextLink>
            ) : (
              origin
            )}
          </span>
        </li>
      )
    })}
  </ul>
)
