import { formatQuantity, quantityText } from '@/lib/core/units/format-quantity'
import type { RunDto, RunValueDto } from '@/lib/domain/findings/run-dto'

import { OpenNumber } from '../ui/open-number'
import { FormulaList } from './formula-list'
import { formulasOf } from './formulas-of'
import { MathText, SymbolText } from './math-text'
import { RunEvidence } from './run-evidence'
import { RunOrigins } from './run-origins'
import { SourceList } from './source-list'

type RunNumberProps = { readonly run: RunDto; readonly result: RunValueDto }

/** One result of a run that opens to formula, source, inputs with their origins, and the bytes of evidence. */
export const RunNumber = ({ run, result }: RunNumberProps) => {
  const { number, unit } = formatQuantity(result.value, result.unit)
  return (
    <OpenNumber
      label={
        <>
          <MathText>{result.label}</MathText> <SymbolText symbol={result.symbol} />
        </>
      }
      value={number}
      unit={unit}
      interval={intervalText(result, unit)}
      formula={<FormulaList formulas={formulasOf(result.symbol, run.definition.formulas)} />}
      source={<SourceList sources={run.definition.sources} />}
      inputs={<RunOrigins run={run} />}
      evidence={<RunEvidence run={run} />}
      remarks={remarkOn(run, result)}
    />
  )
}

/** "287 to 313", in the unit of the value where both ends are; nothing for a value that does not spread. */
function intervalText({ interval, unit }: RunValueDto, shownUnit: string): string | undefined {
  if (!interval || interval.low === interval.high) return undefined
  const ends = [formatQuantity(interval.low, unit, 3), formatQuantity(interval.high, unit, 3)]
  return ends.every((end) => end.unit === shownUnit)
    ? ends.map((end) => end.number).join(' to ')
    : `${quantityText(interval.low, unit, 3)} to ${quantityText(interval.high, unit, 3)}`
}

function remarkOn(run: RunDto, { value, unit, interval }: RunValueDto): string {
  const stored = `Run ${run.number}, ${run.definition.id} version ${run.methodVersion}. Stored as ${value}${unit === '' ? '' : ` ${unit}`}.`
  const cause = interval?.dominant
  const label = run.inputs.find(({ key }) => key === cause?.input)?.label
  if (!cause || !label || !interval || interval.low === interval.high) return stored
  return `${stored} ${label} explains ${Math.round(100 * cause.share)} % of the variance.`
}
