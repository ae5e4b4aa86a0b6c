'use client'

import { keepPreviousData, useQuery } from '@tanstack/react-query'
import { useState } from 'react'

import { CapturePlot } from '../charts/capture-plot'
import { Notice } from '../ui/notice'
import { Skeleton } from '../ui/skeleton'
import { z } from '../shell/plain-zod'

const points = z.object({ x: z.array(z.number()), min: z.array(z.number()), max: z.array(z.number()) })
const problem = z.object({ title: z.string() })

type TimeWindow = { readonly from: number; readonly to: number }

type CaptureChannelPlotProps = {
  readonly evidenceId: string
  readonly channel: number
  readonly name: string
  readonly unit: string
  readonly extent: TimeWindow
}

const buckets = 1200

/** One channel of a capture; zooming fetches the finer points of what is in view. */
export const CaptureChannelPlot = ({ evidenceId, channel, name, unit, extent }: CaptureChannelPlotProps) => {
  const [view, setView] = useState(extent)
  const fetched = useQuery({
    queryKey: ['capture-points', evidenceId, channel, view.from, view.to],
    queryFn: ({ signal }) => fetchPoints(evidenceId, channel, view, signal),
    placeholderData: keepPreviousData,
    staleTime: Infinity,
  })
  if (fetched.data) {
    return (
      <CapturePlot
        seriesLabel={name}
        unit={unit}
        points={fetched.data}
        extent={extent}
        onRangeChange={setView}
      />
    )
  }
  if (fetched.error) {
    return (
      <Notice tone="error" title="The capture cannot be shown now" live>
        {fetched.error.message}
      </Notice>
    )
  }
  return <Skeleton label={`Loading ${name}`} lines={8} />
}

async function fetchPoints(evidenceId: string, channel: number, view: TimeWindow, signal: AbortSignal) {
  const wanted = new URLSearchParams({
    channel: String(channel),
    from: String(view.from),
    to: String(view.to),
    buckets: String(buckets),
  })
  const answer = await fetch(`/api/evidence/${evidenceId}/points?${wanted.toString()}`, { signal })
  const body: unknown = await answer.json()
  if (answer.ok) return points.parse(body)
  const known = problem.safeParse(body)
  throw new Error(known.success ? known.data.title : 'The points did not arrive. Load the page again.')
}
