import { spanOf, type TimeWindow } from '@/lib/figure/time-window'

type CaptureCursorSliderProps = {
  readonly name: 'A' | 'B'
  readonly instant: number
  readonly window: TimeWindow
  /** What the slider says: instant and level. */
  readonly valueText: string
  readonly onMove: (instant: number) => void
}

/** Steps across what is in view: zooming in makes them finer. */
const steps = 1000

/** A cursor as the browser's own slider under the plot: arrow keys step, Page keys leap, Home and End go to the edges. */
export const CaptureCursorSlider = ({
  name,
  instant,
  window,
  valueText,
  onMove,
}: CaptureCursorSliderProps) => {
  const span = spanOf(window)
  const position = Math.round(((instant - window.from) / span) * steps)
  return (
    <label className="flex items-center">
      <span className="capture-cursor-name num font-semibold text-copper">{name}</span>
      <span className="sr-only">cursor</span>
      <input
        type="range"
        min={0}
        max={steps}
        value={Math.min(steps, Math.max(0, position))}
        aria-valuetext={valueText}
        onChange={(event) => onMove(window.from + (event.currentTarget.valueAsNumber / steps) * span)}
        className="capture-cursor"
      />
    </label>
  )
}
