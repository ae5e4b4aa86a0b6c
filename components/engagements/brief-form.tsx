import type { FormAction } from '@/lib/core/action-state'

import { ActionForm } from '../forms/action-form'
import { FormArea, FormQuantity, FormSelect, FormText } from '../forms/form-fields'
import { FieldGroup } from '../ui/field-group'
import { OscillatorRows } from './oscillator-rows'

type BriefFormProps = {
  readonly action: FormAction
  /** The companies for which this person can ask. */
  readonly companies: readonly { readonly companyId: string; readonly name: string }[]
}

export const BriefForm = ({ action, companies }: BriefFormProps) => {
  const [only] = companies.length === 1 ? companies : []
  return (
    <ActionForm
      action={action}
      hidden={only ? { companyId: only.companyId } : {}}
      submitLabel="Open the engagement"
      pendingLabel="Opening…"
      label="Brief"
    >
      <div className="flex flex-col gap-8 pb-2">
        <FieldGroup legend="What it is about">
          {only ? null : (
            <FormSelect
              name="companyId"
              label="Company"
              placeholder="Choose a company"
              options={companies.map(({ companyId, name }) => ({ value: companyId, label: name }))}
            />
          )}
          <FormText
            name="title"
            label="Title"
            hint="A few words, such as: Buck converter rings at 180 MHz."
          />
          <FormText name="product" label="Product" hint="What it is, and which revision." />
          <FormArea
            name="symptom"
            label="Symptom"
            hint="What you see, where, and by how much it is over the limit."
            rows={4}
          />
          <FormArea
            name="alreadyTried"
            label="What was tried"
            hint="What was changed between one plot and the next, and what it did."
            rows={3}
            optional
          />
        </FieldGroup>
        <Goal />
        <OperatingPoint />
        <FieldGroup
          legend="Known oscillators"
          hint="Clocks and other converters with frequency and tolerance: a peak is attributed to a source only where the tolerance allows no second one."
        >
          <OscillatorRows />
        </FieldGroup>
      </div>
    </ActionForm>
  )
}

const Goal = () => (
  <FieldGroup legend="Goal" columns={3}>
    <FormText name="goalStandard" label="Standard" hint="With its edition, if known." optional />
    <FormText name="goalClass" label="Class" hint="Such as A or B." optional />
    <FormText name="goalTestDate" label="Next test" hint="Your chamber slot." type="date" optional />
  </FieldGroup>
)

const OperatingPoint = () => (
  <FieldGroup
    legend="Operating point"
    hint="Engineering notation is understood: 420k, 2.2 MHz, 250 mA."
    columns={2}
  >
    <FormQuantity name="vin" label="Input voltage" unit="V" hint={null} optional />
    <FormQuantity name="vout" label="Output voltage" unit="V" hint={null} optional />
    <FormQuantity name="iout" label="Output current" unit="A" hint={null} optional />
    <FormQuantity name="switchingFrequency" label="Switching frequency" unit="Hz" hint={null} optional />
    <FormText
      name="spreadSpectrum"
      label="Spread spectrum"
      hint="Off, or its deviation and rate: ±6 % at 9 kHz."
      optional
    />
  </FieldGroup>
)
