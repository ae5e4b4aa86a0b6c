'use client'

import { useState } from 'react'

import { FormQuantity, FormText } from '../forms/form-fields'
import { Button } from '../ui/button'

const mostRows = 20

/** Clocks and converters that may meet the trouble; each row has an index of its own in the form. */
export const OscillatorRows = () => {
  const [rows, setRows] = useState<readonly number[]>([0])
  const add = () => setRows((known) => [...known, (known.at(-1) ?? -1) + 1])
  const remove = (row: number) => setRows((known) => known.filter((other) => other !== row))
  return (
    <div className="flex flex-col gap-4">
      {rows.map((row, position) => (
        <div
          key={row}
          role="group"
          aria-label={`Oscillator ${position + 1}`}
          className="grid items-start gap-x-4 gap-y-3 border-b border-rule pb-4 sm:grid-cols-[minmax(0,2fr)_minmax(0,1fr)_minmax(0,1fr)_auto]"
        >
          <FormText name={`oscillators.${position}.name`} label="Name" />
          <FormQuantity name={`oscillators.${position}.frequency`} label="Frequency" unit="Hz" hint={null} />
          <FormQuantity
            name={`oscillators.${position}.tolerancePpm`}
            label="Tolerance"
            unit="ppm"
            hint={null}
          />
          <Button
            tone="quiet"
            className="sm:mt-6"
            onClick={() => remove(row)}
            aria-label={`Remove oscillator ${position + 1}`}
          >
            Remove
          </Button>
        </div>
      ))}
      {rows.length < mostRows ? (
        <div>
          <Button tone="plain" size="small" onClick={add}>
            Add an oscillator
          </Button>
        </div>
      ) : null}
    </div>
  )
}
