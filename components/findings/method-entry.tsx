import type { ChoiceInput, TableInput } from '@/lib/core/method/input-definition'

import { FormArea, FormSelect } from '../forms/form-fields'
import { MathText, SymbolText } from './math-text'

type MethodEntryProps = {
  readonly inputKey: string
  readonly definition: ChoiceInput | TableInput
}

/** An input that is no single value: one of a few alternatives, or rows, a line each. */
export const MethodEntry = ({ inputKey, definition }: MethodEntryProps) => {
  const field = {
    name: `inputs.${inputKey}.text`,
    label: (
      <>
        {definition.label} <SymbolText symbol={definition.symbol} />
      </>
    ),
    optional: !definition.isRequired,
  }
  return (
    <div className="border-b border-rule pb-4">
      {definition.kind === 'choice' ? (
        <FormSelect
          {...field}
          hint={<MathText>{definition.help}</MathText>}
          placeholder="Choose"
          options={Object.entries(definition.options).map(([value, label]) => ({ value, label }))}
        />
      ) : (
        <FormArea
          {...field}
          hint={
            <>
              <MathText>{definition.help}</MathText> A line a row: {columnsText(definition)}.
            </>
          }
          rows={6}
          spellCheck={false}
          className="num"
        />
      )}
    </div>
  )
}

/** "x in m, y in m", with what separates them. */
function columnsText({ columns }: TableInput): string {
  const names = Object.values(columns).map(({ label, unit }) =>
    unit === 'text' || unit === '' ? label : `${label} in ${unit}`,
  )
  return names.length === 1 ? (names[0] ?? '') : `${names.join(', ')}; separate with commas or semicolons`
}
