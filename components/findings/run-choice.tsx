'use client'

import { useState } from 'react'

import { useFieldError } from '../forms/form-state'
import { Button } from '../ui/button'
import { FieldError } from '../ui/field-error'
import { FieldGroup } from '../ui/field-group'
import { SelectField } from '../ui/select-field'

export type OfferedRun = { readonly runId: string; readonly label: string }

type RunChoiceProps = {
  readonly runs: readonly OfferedRun[]
  readonly chosen: readonly string[]
}

/** The runs that a finding rests on, in the order of its argument. */
export const RunChoice = ({ runs, chosen: initial }: RunChoiceProps) => {
  const [chosen, choose] = useState<readonly string[]>(initial)
  const error = useFieldError('runIds')
  const rest = runs.filter((run) => !chosen.includes(run.runId))
  const labelOf = (runId: string) => runs.find((run) => run.runId === runId)?.label ?? runId
  const remove = (runId: string) => choose(chosen.filter((other) => other !== runId))
  const moveUp = (position: number) => choose(swapped(chosen, position))
  return (
    <FieldGroup
      legend="Runs it rests on"
      hint="In the order of the argument: every number of the finding opens to one of these."
    >
      <div id="runIds" tabIndex={-1} className="flex flex-col gap-3">
        {chosen.length > 0 ? (
          <ol className="divide-y divide-rule border-y border-rule">
            {chosen.map((runId, position) => (
              <li key={runId} className="flex flex-wrap items-center justify-between gap-x-4 gap-y-1 py-1">
                <input type="hidden" name="runIds[]" value={runId} />
                <span className="min-w-0 [overflow-wrap:anywhere]">
                  {position + 1}. {labelOf(runId)}
                </span>
                <span className="flex gap-1">
                  {position > 0 ? (
                    <Button
                      tone="quiet"
                      size="small"
                      onClick={() => moveUp(position)}
                      aria-label={`Move ${labelOf(runId)} up`}
                    >
                      Up
                    </Button>
                  ) : null}
                  <Button
                    tone="quiet"
                    size="small"
                    onClick={() => remove(runId)}
                    aria-label={`Remove ${labelOf(runId)}`}
                  >
                    Remove
                  </Button>
                </span>
              </li>
            ))}
          </ol>
        ) : null}
        {rest.length > 0 ? (
          <SelectField
            key={chosen.join()}
            name=""
            id="add-run"
            label={chosen.length === 0 ? 'Choose a run' : 'Add a run'}
            placeholder="Choose a run"
            options={rest.map(({ runId, label }) => ({ value: runId, label }))}
            onChange={(event) => choose([...chosen, event.currentTarget.value])}
          />
        ) : null}
        {error ? <FieldError id="runIds-error">{error}</FieldError> : null}
      </div>
    </FieldGroup>
  )
}

function swapped(list: readonly string[], position: number): readonly string[] {
  const [item] = list.slice(position, position + 1)
  const others = list.filter((_, index) => index !== position)
  return item === undefined ? list : others.toSpliced(position - 1, 0, item)
}
