'use client'

import { useId, useMemo, useState, type KeyboardEvent } from 'react'

import { withinWhole, type TimeWindow } from '@/lib/figure/time-window'

import { CaptureCursors } from './capture-cursors'
import { windowAfterKey } from './capture-keys'
import type { CaptureMarker, CaptureTrace } from './capture-points'
import { CaptureReadout } from './capture-readout'
import { instantText, levelText } from './capture-text'
import { CaptureToolbar, type DragPurpose } from './capture-toolbar'
import { CaptureValues } from './capture-values'
import { useCaptureCanvas } from './use-capture-canvas'

type CapturePlotProps = {
  /** What the plot shows, as its name: "Switch node" or "Capture o05". */
  readonly label: string
  /** The record, or the part of it in view once the page has fetched finer points; of at most two units. */
  readonly traces: readonly CaptureTrace[]
  /** First and last instant of the whole record. */
  readonly extent: TimeWindow
  /** The view has changed: a page may answer with finer points. */
  readonly onRangeChange?: ((window: TimeWindow) => void) | undefined
  /** The two cursors, A at `from` and B at `to`; kept by the plot itself when absent. */
  readonly selection?: TimeWindow | undefined
  readonly onSelect?: ((cursors: TimeWindow) => void) | undefined
  readonly markers?: readonly CaptureMarker[] | undefined
}

const noMarkers: readonly CaptureMarker[] = []

const quarters = ({ from, to }: TimeWindow): TimeWindow => ({
  from: from + (to - from) / 4,
  to: to - (to - from) / 4,
})

const useCaptureState = (props: CapturePlotProps) => {
  const whole = props.extent
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
  const { label, traces, markers = noMarkers } = props
  const state = useCaptureState(props)
  const { whole, window, changeWindow, cursors, changeCursors } = state
  const helpId = useId()
  const view = useMemo(() => ({ cursors, markers, traces }), [cursors, markers, traces])
  const host = useCaptureCanvas({
    traces,
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
  const levelsAt = (instant: number) =>
    traces.map(({ label: name, points, unit }) => {
      const level = levelText(points, instant, unit)
      return traces.length > 1 ? `${name} ${level}` : level
    })
  const valueText = (instant: number) => [instantText(instant), ...levelsAt(instant)].join(', ')
  return (
    <figure aria-label={`Capture of ${label}`} className="flex min-w-0 flex-col gap-2">
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
        aria-label={`Plot of ${label} from ${instantText(window.from)} to ${instantText(window.to)}`}
        aria-describedby={helpId}
        onKeyDown={onKeyDown}
        className="capture-host"
      />
      <CaptureCursors {...{ cursors, window, valueText }} onMove={changeCursors} />
      <CaptureReadout traces={traces} cursors={cursors} />
      <p id={helpId} className="no-print text-sm text-ink-faint">
        With the plot in focus: + and − zoom, the arrow keys move, Home shows the whole record. The sliders A
        and B move the cursors.
      </p>
      {traces.map((trace) => (
        <CaptureValues
          key={trace.key}
          label={trace.label}
          unit={trace.unit}
          points={trace.points}
          window={window}
        />
      ))}
    </figure>
  )
}
