import { panned, zoomed, type TimeWindow } from '@/lib/figure/time-window'

import { Button } from '../ui/button'

export type DragPurpose = 'zoom' | 'cursors'

type CaptureToolbarProps = {
  readonly window: TimeWindow
  readonly whole: TimeWindow
  readonly cursors: TimeWindow
  readonly purpose: DragPurpose
  readonly onWindow: (window: TimeWindow) => void
  readonly onPurpose: (purpose: DragPurpose) => void
}

const purposes: readonly (readonly [DragPurpose, string])[] = [
  ['zoom', 'zooms'],
  ['cursors', 'sets the cursors'],
]

const PurposeChoice = ({ purpose, onPurpose }: Pick<CaptureToolbarProps, 'purpose' | 'onPurpose'>) => (
  <fieldset className="flex flex-wrap items-center gap-x-3">
    <legend className="float-left pr-3 text-sm text-ink-soft">Dragging</legend>
    {purposes.map(([value, label]) => (
      <label key={value} className="flex min-h-8 items-center gap-1.5 text-sm">
        <input
          type="radio"
          checked={purpose === value}
          onChange={() => onPurpose(value)}
          className="size-4 accent-copper"
        />
        {label}
      </label>
    ))}
  </fieldset>
)

/** Everything that the pointer does on the plot, as buttons. */
export const CaptureToolbar = ({
  window,
  whole,
  cursors,
  purpose,
  onWindow,
  onPurpose,
}: CaptureToolbarProps) => {
  const isWhole = window.from === whole.from && window.to === whole.to
  const between = { from: Math.min(cursors.from, cursors.to), to: Math.max(cursors.from, cursors.to) }
  return (
    <div className="no-print flex flex-wrap items-center gap-x-5 gap-y-2">
      <div role="group" aria-label="View of the capture" className="flex flex-wrap gap-1.5">
        <Button size="small" onClick={() => onWindow(zoomed(window, 0.5, whole))}>
          Zoom in
        </Button>
        <Button size="small" disabled={isWhole} onClick={() => onWindow(zoomed(window, 2, whole))}>
          Zoom out
        </Button>
        <Button
          size="small"
          disabled={window.from <= whole.from}
          onClick={() => onWindow(panned(window, -0.25, whole))}
        >
          Earlier
        </Button>
        <Button
          size="small"
          disabled={window.to >= whole.to}
          onClick={() => onWindow(panned(window, 0.25, whole))}
        >
          Later
        </Button>
        <Button
          size="small"
          disabled={between.from === between.to}
          onClick={() => onWindow(zoomed(between, 1.2, whole))}
        >
          A to B
        </Button>
        <Button size="small" disabled={isWhole} onClick={() => onWindow(whole)}>
          Whole record
        </Button>
      </div>
      <PurposeChoice purpose={purpose} onPurpose={onPurpose} />
    </div>
  )
}
