import { FormSelect, FormText } from '../forms/form-fields'
import { workKinds } from './work-kinds'

type TimeFieldsProps = {
  /** Keeps the fields of several forms of one page apart. */
  readonly idPrefix: string
  readonly start?: {
    readonly workKind: string
    readonly text: string
    readonly startedAt: number
    readonly workedSeconds: number
  }
}

const localMinute = (instant: number): string => new Date(instant).toISOString().slice(0, 16)

/** What was done, when and for how long. */
export const TimeFields = ({ idPrefix, start }: TimeFieldsProps) => (
  <div className="field-grid sm:grid-cols-2">
    <FormSelect
      id={`${idPrefix}-kind`}
      name="workKind"
      label="Kind of work"
      options={workKinds}
      placeholder="Choose"
      defaultValue={start?.workKind}
    />
    <FormText
      id={`${idPrefix}-text`}
      name="text"
      label="What was done"
      hint="The client reads this once it is posted"
      defaultValue={start?.text}
    />
    <FormText
      id={`${idPrefix}-start`}
      name="startedAt"
      label="Begun (UTC)"
      type="datetime-local"
      defaultValue={start ? localMinute(start.startedAt) : undefined}
    />
    <FormText
      id={`${idPrefix}-minutes`}
      name="workedMinutes"
      label="Minutes worked"
      inputMode="numeric"
      defaultValue={start ? Math.ceil(start.workedSeconds / 60) : undefined}
    />
  </div>
)
