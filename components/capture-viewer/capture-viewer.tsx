'use client'

import { useState } from 'react'

import type { TimeWindow } from '@/lib/figure/time-window'

import { CapturePlot } from '../charts/capture-plot'
import { Notice } from '../ui/notice'
import { Skeleton } from '../ui/skeleton'
import { ChannelChoice } from './channel-choice'
import { DifferenceChoice } from './difference-choice'
import { SpectrumInView } from './spectrum-in-view'
import { useTraces } from './use-traces'
import {
  channelSource,
  differenceSource,
  seenTogether,
  type TraceSource,
  type ViewedCapture,
} from './viewed-capture'

type CaptureViewerProps = {
  readonly capture: ViewedCapture
  /** Lines of another capture to lie over it, already aligned. */
  readonly overlay?: readonly TraceSource[] | undefined
  /** Where a measurement between the cursors is made; absent for those who do not measure. */
  readonly measureHref?: string | undefined
}

/** All channels of a capture on one time axis: zoomed, measured by two cursors, subtracted, and seen as a spectrum. */
export const CaptureViewer = ({ capture, overlay = [], measureHref }: CaptureViewerProps) => {
  const [differences, setDifferences] = useState<readonly TraceSource[]>([])
  const sources = [
    ...capture.channels.map((channel) => channelSource(capture, channel)),
    ...overlay,
    ...differences,
  ]
  const [chosen, setChosen] = useState(() => firstShown(sources, overlay).map(({ key }) => key))
  const [view, setView] = useState(capture.extent)
  const [cursors, setCursors] = useState(() => middleOf(capture.extent))
  const shown = seenTogether(sources.filter(({ key }) => chosen.includes(key)))
  const { traces, failure, isLoading } = useTraces(shown, view)
  const show = (key: string) => setChosen((keys) => [...keys.filter((other) => other !== key), key])
  return (
    <div className="flex min-w-0 flex-col gap-4">
      {sources.length > 1 ? (
        <ChannelChoice
          sources={sources}
          shown={shown}
          onToggle={({ key }) =>
            shown.some((source) => source.key === key)
              ? setChosen(shown.map((source) => source.key).filter((other) => other !== key))
              : setChosen([key, ...shown.map((source) => source.key)])
          }
        />
      ) : null}
      {failure === null ? null : (
        <Notice tone="error" title="The capture cannot be shown now" live>
          {failure}
        </Notice>
      )}
      {traces.length === 0 ? (
        isLoading ? (
          <Skeleton label={`Loading ${capture.name}`} lines={8} />
        ) : (
          <p className="text-ink-soft">No channel is shown. Choose one above.</p>
        )
      ) : (
        <CapturePlot
          label={traces.map(({ label }) => label).join(', ')}
          traces={traces}
          extent={capture.extent}
          onRangeChange={setView}
          selection={cursors}
          onSelect={setCursors}
        />
      )}
      {capture.channels.length > 1 ? (
        <DifferenceChoice
          capture={capture}
          onAdd={(plus, minus) => {
            const added = differenceSource(capture, plus, minus)
            setDifferences((before) => [...before.filter(({ key }) => key !== added.key), added])
            show(added.key)
          }}
        />
      ) : null}
      <SpectrumInView sources={shown} view={view} />
      {measureHref === undefined ? null : (
        <a href={measureLink(measureHref, cursors)} className="text-copper underline">
          Measure the ring between A and B on the bench
        </a>
      )}
    </div>
  )
}

/** With an overlay, one line of each; otherwise what fits. */
function firstShown(
  sources: readonly TraceSource[],
  overlay: readonly TraceSource[],
): readonly TraceSource[] {
  const [own] = sources
  const [other] = overlay
  return own !== undefined && other !== undefined ? [own, other] : seenTogether(sources)
}

const middleOf = ({ from, to }: TimeWindow): TimeWindow => ({
  from: from + (to - from) / 4,
  to: to - (to - from) / 4,
})

function measureLink(href: string, { from, to }: TimeWindow): string {
  const window = new URLSearchParams({ from: String(Math.min(from, to)), to: String(Math.max(from, to)) })
  return `${href}&${window.toString()}`
}
