import { useCallback, useEffect, useRef, type RefObject } from 'react'

import type { TimeWindow } from '@/lib/figure/time-window'

import {
  createCaptureCanvas,
  type CaptureCanvas,
  type CaptureHandlers,
  type CaptureView,
} from './capture-canvas'
import type { CaptureTrace } from './capture-points'
import { useThemeChange } from './use-theme-change'

type Shown = {
  readonly traces: readonly CaptureTrace[]
  readonly window: TimeWindow
  readonly view: CaptureView
  readonly handlers: CaptureHandlers
}

/** Keeps the painted plot in step with what the component shows. Returns the ref of the element to paint into. */
export const useCaptureCanvas = ({
  traces,
  window,
  view,
  handlers,
}: Shown): RefObject<HTMLDivElement | null> => {
  const host = useRef<HTMLDivElement>(null)
  const canvas = useRef<CaptureCanvas>(null)
  const latestView = useRef(view)
  const latestWindow = useRef(window)
  // Another set of lines needs another plot; new points of the same lines do not.
  const lines = traces.map(({ key, tone, unit }) => `${key} ${tone} ${unit}`).join('|')
  const latestHandlers = useRef(handlers)

  useEffect(() => {
    latestHandlers.current = handlers
  }, [handlers])

  useEffect(() => {
    latestView.current = view
    canvas.current?.redraw()
  }, [view])

  useEffect(() => {
    const element = host.current
    if (!element) return
    const created = createCaptureCanvas(element, () => latestView.current, {
      onDrag: (dragged) => latestHandlers.current.onDrag(dragged),
      onHover: (instant) => latestHandlers.current.onHover(instant),
      onReset: () => latestHandlers.current.onReset(),
    })
    canvas.current = created
    created.show(latestView.current.traces, latestWindow.current)
    const observer = new ResizeObserver(() => created.resize())
    observer.observe(element)
    return () => {
      observer.disconnect()
      created.destroy()
      canvas.current = null
    }
  }, [lines])

  useEffect(() => {
    latestWindow.current = window
    canvas.current?.show(traces, window)
  }, [traces, window])

  useThemeChange(useCallback(() => canvas.current?.redraw(), []))
  return host
}
