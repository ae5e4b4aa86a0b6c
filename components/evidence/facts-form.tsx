import type { FormAction } from '@/lib/core/action-state'
import { exactQuantityText } from '@/lib/core/units/exact-quantity-text'
import type { Unit } from '@/lib/core/units/unit'
import type { CaptureFacts } from '@/lib/domain/evidence/capture-facts'

import { ActionForm } from '../forms/action-form'
import { FormArea, FormQuantity, FormSelect, FormText } from '../forms/form-fields'

const groundMethods: readonly {
  readonly value: NonNullable<CaptureFacts['groundMethod']>
  readonly label: string
}[] = [
  { value: 'spring', label: 'Spring or tip adapter at the probe' },
  { value: 'lead', label: 'Ground lead with a clip' },
  { value: 'coaxial', label: 'Coaxial cable soldered or on a connector' },
  { value: 'differential', label: 'Differential probe' },
]

const entryText = (value: number | null, unit: Unit): string =>
  value === null ? '' : exactQuantityText(value, unit)

type FactsFormProps = {
  readonly evidenceId: string
  readonly facts: CaptureFacts
  readonly action: FormAction
}

export const FactsForm = ({ evidenceId, facts, action }: FactsFormProps) => (
  <ActionForm
    action={action}
    hidden={{ evidenceId }}
    submitLabel="Save the facts"
    pendingLabel="Saving…"
    doneMessage="Saved. What the capture can support was worked out again."
    label="How it was measured"
  >
    <div className="grid items-end gap-x-6 gap-y-4 sm:grid-cols-2">
      <FormQuantity
        name="bandwidthHertz"
        label="Bandwidth"
        unit="Hz"
        hint="Oscilloscope and probe together, with any limit switched on."
        defaultValue={entryText(facts.bandwidthHertz, 'Hz')}
      />
      <FormQuantity
        name="probeAttenuation"
        label="Probe attenuation"
        unit=""
        hint="10 for a 10:1 probe; as set in the instrument."
        defaultValue={entryText(facts.probeAttenuation, '')}
      />
      <FormQuantity
        name="probeCapacitanceFarads"
        label="Probe capacitance"
        unit="F"
        hint="At the tip, such as 9.5 pF."
        defaultValue={entryText(facts.probeCapacitanceFarads, 'F')}
      />
      <FormSelect
        name="groundMethod"
        label="Ground of the probe"
        placeholder="Not stated"
        options={groundMethods}
        defaultValue={facts.groundMethod ?? ''}
      />
      <FormQuantity
        name="groundLeadMetres"
        label="Length of the ground lead"
        unit="m"
        hint="If there was one, such as 150 mm."
        defaultValue={entryText(facts.groundLeadMetres, 'm')}
      />
      <FormText
        name="probedAt"
        label="Where it was probed"
        hint="Tip and ground, such as: SW pin to source of Q2."
        defaultValue={facts.probedAt ?? ''}
      />
    </div>
    <FormArea
      name="operatingCondition"
      label="Operating condition"
      hint="Input, load, temperature, what else ran. The same words before and after a change make a pair."
      rows={2}
      defaultValue={facts.operatingCondition ?? ''}
    />
  </ActionForm>
)
