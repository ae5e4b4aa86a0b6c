import type { TimeWindow } from '@/lib/figure/time-window'

import { CaptureCursorSlider } from './capture-cursor-slider'

type CaptureCursorsProps = {
  readonly cursors: TimeWindow
  readonly window: TimeWindow
  readonly valueText: (instant: number) => string
  readonly onMove: (cursors: TimeWindow) => void
}

/** The sliders of the two cursors, under the plot and as wide as it. */
export const CaptureCursors = ({ cursors, window, valueText, onMove }: CaptureCursorsProps) => (
  <div>
    <CaptureCursorSlider
      name="A"
      instant={cursors.from}
      window={window}
      valueText={valueText(cursors.from)}
      onMove={(from) => onMove({ ...cursors, from })}
    />
    <CaptureCursorSlider
      name="B"
      instant={cursors.to}
      window={window}
      valueText={valueText(cursors.to)}
      onMove={(to) => onMove({ ...cursors, to })}
    />
  </div>
)
