'use client'

import { useState } from 'react'

import type { FindingActionDto } from '@/lib/domain/findings/finding-dto'

import { FormArea, FormText } from '../forms/form-fields'
import { Button } from '../ui/button'

const mostRows = 20

type Row = { readonly id: number; readonly initial?: FindingActionDto | undefined }

/** What the client should do, each with its parts and what it costs; a row left empty is dropped. */
export const ActionRows = ({ initial }: { readonly initial: readonly FindingActionDto[] }) => {
  const start = initial.map((action, id): Row => ({ id, initial: action }))
  const [rows, setRows] = useState<readonly Row[]>(start.length > 0 ? start : [{ id: 0 }])
  const add = () => setRows((known) => [...known, { id: (known.at(-1)?.id ?? -1) + 1 }])
  const remove = (id: number) => setRows((known) => known.filter((row) => row.id !== id))
  return (
    <div className="flex flex-col gap-5">
      {rows.map((row, position) => (
        <div
          key={row.id}
          role="group"
          aria-label={`Action ${position + 1}`}
          className="flex flex-col gap-3 border-b border-rule pb-4"
        >
          <FormArea
            name={`actions.${position}.instruction`}
            label={`${position + 1}. What to do`}
            rows={2}
            defaultValue={row.initial?.instruction}
          />
          <div className="grid gap-x-6 gap-y-3 sm:grid-cols-2">
            <FormText
              name={`actions.${position}.partValues`}
              label="Parts and values"
              optional
              defaultValue={row.initial?.partValues}
            />
            <FormText
              name={`actions.${position}.sideEffects`}
              label="Side effects"
              optional
              defaultValue={row.initial?.sideEffects}
            />
          </div>
          <div>
            <Button
              tone="quiet"
              size="small"
              onClick={() => remove(row.id)}
              aria-label={`Remove action ${position + 1}`}
            >
              Remove
            </Button>
          </div>
        </div>
      ))}
      {rows.length < mostRows ? (
        <div>
          <Button tone="plain" size="small" onClick={add}>
            Add an action
          </Button>
        </div>
      ) : null}
    </div>
  )
}
