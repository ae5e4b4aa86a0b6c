import { formatQuantity, quantityText } from '@/lib/core/units/format-quantity'
import type { RunDto, RunValueDto } from '@/lib/domain/findings/run-dto'

import { OpenNumber } from '../ui/open-number'
import { formulasOf } from './formulas-of'
import { RunEvidence } from './run-evidence'
import { RunOrigins } from './run-origins'
import { SymbolText } from './symbol-text'

type RunNumberProps = { readonly run: RunDto; readonly result: RunValueDto }

/** One result of a run that opens to formula, source, inputs with their origins, and the bytes of evidence. */
export const RunNumber = ({ run, result }: RunNumberProps) => {
  const { number, unit } = formatQuantity(result.value, result.unit)
  const { formulas, sources } = run.definition
  return (
    <OpenNumber
      label={
        <>
          {result.label} <SymbolText symbol={result.symbol} />
        </>
      }
      value={number}
      unit={unit}
      {...(result.interval ? { interval: intervalText(result) } : {})}
      formula={
        <ul className="flex flex-col gap-1">
          {formulasOf(result.symbol, formulas).map((formula) => (
            <li key={formula} className="num text-sm">
              {formula}
            </li>
          ))}
        </ul>
      }
      source={
        <ul className="flex flex-col gap-1">
          {sources.map(({ citation, standing }) => (
            <li key={citation}>
              {citation} <span className="text-ink-faint">({standing})</span>
            </li>
          ))}
        </ul>
      }
      inputs={<RunOrigins run={run} />}
      evidence={<RunEvidence run={run} />}
      remarks={`Run ${run.number}, ${run.definition.id} version ${run.methodVersion}. The stored double is ${result.value}${result.unit === '' ? '' : ` ${result.unit}`}.`}
    />
  )
}

/** "287.1 to 313.4 pF": both ends with the digits that a 95 % interval from 10,000 draws carries. */
function intervalText({ interval, unit }: RunValueDto): string {
  if (!interval) return ''
  return `${quantityText(interval.low, unit, 3)} to ${quantityText(interval.high, unit, 3)}`
}
