'use client'

import { useState } from 'react'

import type { FormAction } from '@/lib/core/action-state'
import type { OfferedCapture } from '@/lib/domain/evidence/capture-channel'

import { ActionForm } from '../forms/action-form'
import { FormQuantity, FormSelect } from '../forms/form-fields'

type MeasureFormProps = {
  readonly captures: readonly OfferedCapture[]
  readonly chosenId?: string | undefined
  /** The ends of the part to look at, in seconds, where the cursors of a plot stood. */
  readonly window?: { readonly from: string; readonly to: string } | undefined
  readonly action: FormAction
}

/** A capture, one of its channels, and the part of the record that holds the edge. */
export const MeasureForm = ({ captures, chosenId, window, action }: MeasureFormProps) => {
  const first = captures.find((capture) => capture.evidenceId === chosenId) ?? captures[0]
  const [evidenceId, choose] = useState(first?.evidenceId ?? '')
  const capture = captures.find((candidate) => candidate.evidenceId === evidenceId)
  return (
    <ActionForm
      action={action}
      submitLabel="Measure"
      pendingLabel="Measuring…"
      label="Measure the ring of a capture"
    >
      <div className="grid items-end gap-x-6 gap-y-4 sm:grid-cols-2 lg:grid-cols-4">
        <FormSelect
          name="evidenceId"
          label="Capture"
          value={evidenceId}
          onChange={(event) => choose(event.currentTarget.value)}
          options={captures.map(({ evidenceId: value, number, name }) => ({
            value,
            label: `${number}. ${name}`,
          }))}
        />
        <FormSelect
          key={evidenceId}
          name="channel"
          label="Channel"
          options={(capture?.channels ?? []).map(({ position, name, unit }) => ({
            value: position.toString(),
            label: unit === '' ? name : `${name} (${unit})`,
          }))}
        />
        <FormQuantity
          name="from"
          label="From"
          defaultValue={window?.from}
          unit="s"
          optional
          hint="Just before the edge, such as −50n; the start of the record if empty."
        />
        <FormQuantity
          name="to"
          label="To"
          defaultValue={window?.to}
          unit="s"
          optional
          hint="Just before the next edge; the end of the record if empty."
        />
      </div>
    </ActionForm>
  )
}
