'use client'

import { useId, useMemo, useState, type KeyboardEvent } from 'react'

import { withinWhole, type TimeWindow } from '@/lib/figure/time-window'

import { CaptureCursorSlider } from './capture-cursor-slider'
import { windowAfterKey } from './capture-keys'
import type { CaptureMarker, CapturePoints } from './capture-points'
import { CaptureReadout } from './capture-readout'
import { instantText, levelText } from './capture-text'
import { CaptureToolbar, type DragPurpose } from './capture-toolbar'
import { CaptureValues } from './capture-values'
import { useCaptureCanvas } from './use-capture-canvas'

type CapturePlotProps = {
  /** What was measured, on the vertical axis: "Switch node". */
  readonly seriesLabel: string
  readonly unit: string
  /** The record, or the part of it in view once the page has fetched finer points. */
  readonly points: CapturePoints
  /** First and last instant of the whole record, when `points` holds only a part of it. */
  readonly extent?: TimeWindow | undefined
  /** The view has changed: a page may answer with finer points. */
  readonly onRangeChange?: ((window: TimeWindow) => void) | undefined
  /** The two cursors, A at `from` and B at `to`; kept by the plot itself when absent. */
  readonly selection?: TimeWindow | undefined
  readonly onSelect?: ((cursors: TimeWindow) => void) | undefined
  readonly markers?: readonly CaptureMarker[] | undefined
}

const noMarkers: readonly CaptureMarker[] = []

const extentOf = (points: CapturePoints): TimeWindow => ({
  from: points.x[0] ?? 0,
  to: points.x.at(-1) ?? 1,
})

const quarters = ({ from, to }: TimeWindow): TimeWindow => ({
  from: from + (to - from) / 4,
  to: to - (to - from) / 4,
})

const useCaptureState = (props: CapturePlotProps) => {
  const [firstExtent] = useState(() => extentOf(props.points))
  const whole = props.extent ?? firstExtent
  const [window, setWindow] = useState(whole)
  const [ownCursors, setOwnCursors] = useState(() => quarters(whole))
  const [purpose, setPurpose] = useState<DragPurpose>('zoom')
  const [hovered, setHovered] = useState<number | null>(null)
  const changeWindow = (next: TimeWindow) => {
    setWindow(next)
    props.onRangeChange?.(next)
  }
  const changeCursors = (next: TimeWindow) => {
    setOwnCursors(next)
    props.onSelect?.(next)
  }
  const cursors = props.selection ?? ownCursors
  return { whole, window, changeWindow, cursors, changeCursors, purpose, setPurpose, hovered, setHovered }
}

/**
 * An oscilloscope capture as the band between its lowest and highest samples. Drag, or the buttons and keys, change the
 * view; two sliders move the cursors.
 */
export const CapturePlot = (props: CapturePlotProps) => {
  const { seriesLabel, unit, points, markers = noMarkers } = props
  const state = useCaptureState(props)
  const { whole, window, changeWindow, cursors, changeCursors } = state
  const helpId = useId()
  const view = useMemo(() => ({ cursors, markers, seriesLabel, unit }), [cursors, markers, seriesLabel, unit])
  const host = useCaptureCanvas({
    points,
    window,
    view,
    handlers: {
      onDrag: (dragged) =>
        state.purpose === 'zoom' ? changeWindow(withinWhole(dragged, whole)) : changeCursors(dragged),
      onHover: state.setHovered,
      onReset: () => changeWindow(whole),
    },
  })
  const onKeyDown = (event: KeyboardEvent) => {
    const next =
      event.ctrlKey || event.metaKey || event.altKey ? null : windowAfterKey(event.key, window, whole)
    if (!next) return
    event.preventDefault()
    changeWindow(next)
  }
  const valueText = (instant: number) => `${instantText(instant)}, ${levelText(points, instant, unit)}`
  return (
    <figure aria-label={`Capture of ${seriesLabel}`} className="flex min-w-0 flex-col gap-2">
      <CaptureToolbar
        {...{ window, whole, cursors }}
        purpose={state.purpose}
        onWindow={changeWindow}
        onPurpose={state.setPurpose}
      />
      <p aria-hidden="true" className="min-h-6 text-sm text-ink-soft">
        {state.hovered === null ? (
          'Drag across the plot; a double press shows the whole record.'
        ) : (
          <span className="num">{valueText(state.hovered)}</span>
        )}
      </p>
      <div
        ref={host}
        role="group"
        tabIndex={0}
        aria-label={`Plot of ${seriesLabel} from ${instantText(window.from)} to ${instantText(window.to)}`}
        aria-describedby={helpId}
        onKeyDown={onKeyDown}
        className="capture-host"
      />
      <div>
        <CaptureCursorSlider
          name="A"
          instant={cursors.from}
          window={window}
          valueText={valueText(cursors.from)}
          onMove={(from) => changeCursors({ ...cursors, from })}
        />
        <CaptureCursorSlider
          name="B"
          instant={cursors.to}
          window={window}
          valueText={valueText(cursors.to)}
          onMove={(to) => changeCursors({ ...cursors, to })}
        />
      </div>
      <CaptureReadout points={points} cursors={cursors} unit={unit} />
      <p id={helpId} className="no-print text-sm text-ink-faint">
        With the plot in focus: + and − zoom, the arrow keys move, Home shows the whole record. The sliders A
        and B move the cursors.
      </p>
      <CaptureValues label={seriesLabel} unit={unit} points={points} window={window} />
    </figure>
  )
}
