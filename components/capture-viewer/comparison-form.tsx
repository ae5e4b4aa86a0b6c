import { Button } from '../ui/button'
import type { ViewedCapture } from './viewed-capture'

type Choice = { readonly evidenceId: string; readonly channel: number }

type ComparisonFormProps = {
  readonly captures: readonly (ViewedCapture & { readonly number: number })[]
  readonly first?: Choice | undefined
  readonly second?: Choice | undefined
}

/** Two channels to lie over each other; the address of the page names them, so that it can be sent on. */
export const ComparisonForm = ({ captures, first, second }: ComparisonFormProps) => (
  <form method="get" className="flex flex-wrap items-end gap-x-5 gap-y-3">
    <TraceSelect name="first" label="First" captures={captures} chosen={first} />
    <TraceSelect name="second" label="Laid over it" captures={captures} chosen={second} />
    <Button type="submit" tone="primary">
      Compare
    </Button>
  </form>
)

type TraceSelectProps = {
  readonly name: string
  readonly label: string
  readonly captures: ComparisonFormProps['captures']
  readonly chosen: Choice | undefined
}

const TraceSelect = ({ name, label, captures, chosen }: TraceSelectProps) => (
  <label className="flex min-w-0 flex-col gap-1">
    <span className="font-semibold">{label}</span>
    <select
      name={name}
      defaultValue={chosen ? `${chosen.evidenceId}:${chosen.channel}` : ''}
      required
      className="entry max-w-full"
    >
      <option value="">Choose a channel</option>
      {captures.map((capture) => (
        <optgroup key={capture.evidenceId} label={`${capture.number}. ${capture.name}`}>
          {capture.channels.map((channel) => (
            <option key={channel.position} value={`${capture.evidenceId}:${channel.position}`}>
              {channel.name}
              {channel.unit === '' ? '' : ` (${channel.unit})`}
            </option>
          ))}
        </optgroup>
      ))}
    </select>
  </label>
)
