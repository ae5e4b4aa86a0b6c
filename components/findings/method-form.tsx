import type { FormAction } from '@/lib/core/action-state'
import { isQuantity, type InputDefinitions } from '@/lib/core/method/input-definition'
import { quantityText } from '@/lib/core/units/format-quantity'
import type { Unit } from '@/lib/core/units/unit'
import type { RunHeading } from '@/lib/domain/findings/run-dto'

import { ActionForm } from '../forms/action-form'
import { MethodEntry } from './method-entry'
import { MethodQuantity, type OfferedResult } from './method-quantity'

type MethodFormProps = {
  readonly engagementId: string
  readonly methodId: string
  readonly inputs: InputDefinitions
  /** Runs whose results can be taken over. */
  readonly runs: readonly RunHeading[]
  /** The run whose results are taken over at first where they have the names of inputs. */
  readonly startFrom?: string | undefined
  readonly action: FormAction
}

/** A form made from the definition of a method. */
export const MethodForm = ({ engagementId, methodId, inputs, runs, startFrom, action }: MethodFormProps) => {
  const start = runs.find((run) => run.runId === startFrom)
  return (
    <ActionForm
      action={action}
      hidden={{ engagementId, methodId }}
      submitLabel="Run the method"
      pendingLabel="Computing…"
      label="Inputs of the method"
    >
      <p className="max-w-measure text-sm text-ink-soft">
        With a tolerance, such as 5 % or 0.2 pF, the results get a 95 % interval. Write k=2 behind it where a
        calibration states it.
      </p>
      {Object.entries(inputs).map(([key, definition]) =>
        isQuantity(definition) ? (
          <MethodQuantity
            key={key}
            inputKey={key}
            definition={definition}
            offered={offersOf(runs, definition.unit)}
            initialPick={
              start?.results.some((result) => result.key === key && result.unit === definition.unit)
                ? `${start.runId}:${key}`
                : undefined
            }
          />
        ) : (
          <MethodEntry key={key} inputKey={key} definition={definition} />
        ),
      )}
    </ActionForm>
  )
}

/** Every stored result of the same unit, newest run first. */
const offersOf = (runs: readonly RunHeading[], unit: Unit): readonly OfferedResult[] =>
  runs.flatMap((run) =>
    run.results
      .filter((result) => result.unit === unit)
      .map((result) => {
        const written = quantityText(result.value, result.unit)
        return {
          value: `${run.runId}:${result.key}`,
          label: `Run ${run.number} · ${run.title} · ${result.symbol} = ${written}`,
          written,
        }
      }),
  )
