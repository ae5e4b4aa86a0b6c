import { traceTones } from '../charts/capture-points'
import { classNames } from '../ui/class-names'
import type { TraceSource } from './viewed-capture'

type ChannelChoiceProps = {
  readonly sources: readonly TraceSource[]
  readonly shown: readonly TraceSource[]
  readonly onToggle: (source: TraceSource) => void
}

const swatches = {
  ink: 'bg-ink',
  copper: 'bg-copper',
  'ink-faint': 'bg-ink-faint',
  'rule-strong': 'bg-rule-strong',
} as const

/** Which lines are seen. Four fit, of two units. */
export const ChannelChoice = ({ sources, shown, onToggle }: ChannelChoiceProps) => (
  <fieldset className="flex flex-wrap items-center gap-x-5 gap-y-1">
    <legend className="float-left pr-3 text-sm text-ink-soft">Shown</legend>
    {sources.map((source) => {
      const place = shown.findIndex(({ key }) => key === source.key)
      const tone = traceTones[place]
      return (
        <label key={source.key} className="flex min-h-8 items-center gap-2 text-sm">
          <input
            type="checkbox"
            checked={place >= 0}
            onChange={() => onToggle(source)}
            className="size-4 accent-copper"
          />
          <span
            aria-hidden="true"
            className={classNames('h-1 w-5', tone === undefined ? 'bg-transparent' : swatches[tone])}
          />
          {source.label}
        </label>
      )
    })}
  </fieldset>
)
