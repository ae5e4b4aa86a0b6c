'use client'

import { useState } from 'react'

import type { QuantityInput } from '@/lib/core/method/input-definition'

import { FormQuantity, FormSelect, FormText } from '../forms/form-fields'
import { MathText, SymbolText } from './math-text'

export type OfferedResult = {
  /** "run:result", as the form sends it. */
  readonly value: string
  /** "Run 1 · Ring of o01_bare.csv, SW · f_d = 102.7 MHz". */
  readonly label: string
  /** The value alone, to be shown in the entry. */
  readonly written: string
}

type MethodQuantityProps = {
  readonly inputKey: string
  readonly definition: QuantityInput
  readonly offered: readonly OfferedResult[]
  readonly initialPick?: string | undefined
}

/** One value: typed, or taken from a stored run; then the entry shows that value and is not sent. */
export const MethodQuantity = ({ inputKey, definition, offered, initialPick = '' }: MethodQuantityProps) => {
  const [text, type] = useState('')
  const [pick, choose] = useState(initialPick)
  const picked = offered.find((result) => result.value === pick)
  const name = (part: string) => `inputs.${inputKey}.${part}`
  return (
    <div
      role="group"
      aria-label={definition.label}
      className="grid grid-cols-[minmax(0,5fr)_minmax(0,3fr)] items-end gap-x-4 gap-y-3 border-b border-rule pb-4 lg:grid-cols-[minmax(0,5fr)_minmax(0,2fr)_minmax(0,5fr)]"
    >
      <FormQuantity
        name={name('text')}
        label={
          <>
            {definition.label} <SymbolText symbol={definition.symbol} />
          </>
        }
        hint={<MathText>{definition.help}</MathText>}
        unit={picked ? '' : definition.unit}
        optional={!definition.isRequired}
        disabled={picked !== undefined}
        value={picked ? picked.written : text}
        onChange={(event) => type(event.currentTarget.value)}
      />
      <FormText
        name={name('tolerance')}
        label="±"
        aria-label={`Tolerance of ${definition.label}`}
        placeholder={definition.usualTolerance ? `e.g. ${definition.usualTolerance}` : 'none'}
        autoComplete="off"
        className="num text-right"
      />
      <div className="col-span-2 lg:col-span-1">
        {offered.length > 0 ? (
          <FormSelect
            name={name('pick')}
            label="Take from"
            aria-label={`Take ${definition.label} from`}
            placeholder="Nowhere: typed"
            options={offered}
            value={pick}
            onChange={(event) => choose(event.currentTarget.value)}
          />
        ) : (
          <p className="text-sm lg:pb-2 text-ink-faint">No run gives one yet.</p>
        )}
      </div>
    </div>
  )
}
