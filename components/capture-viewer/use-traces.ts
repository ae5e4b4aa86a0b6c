'use client'

import { keepPreviousData, useQueries } from '@tanstack/react-query'

import type { TimeWindow } from '@/lib/figure/time-window'

import { traceTones, type CapturePoints, type CaptureTrace } from '../charts/capture-points'
import { fetchJson } from '../shell/fetch-json'
import { z } from '../shell/plain-zod'
import type { TraceSource } from './viewed-capture'

const points = z.object({ x: z.array(z.number()), min: z.array(z.number()), max: z.array(z.number()) })

const buckets = 1200

type Fetched = {
  readonly traces: readonly CaptureTrace[]
  /** Why a trace could not be fetched, as a sentence. */
  readonly failure: string | null
  readonly isLoading: boolean
}

/** The points of what is in view, fetched anew when the view changes; the old ones stay until the finer ones are there. */
export function useTraces(sources: readonly TraceSource[], view: TimeWindow): Fetched {
  return useQueries({
    queries: sources.map((source) => ({
      queryKey: ['capture-points', source.key, source.shiftSeconds, view.from, view.to],
      queryFn: ({ signal }: { signal: AbortSignal }) => fetchPoints(source, view, signal),
      placeholderData: keepPreviousData,
      staleTime: Infinity,
    })),
    combine: (results) => ({
      traces: results.flatMap(({ data }, index) => {
        const source = sources[index]
        const tone = traceTones[index]
        if (data === undefined || source === undefined || tone === undefined) return []
        return [{ key: source.key, label: source.label, unit: source.unit, tone, points: data }]
      }),
      failure: results.find(({ error }) => error !== null)?.error?.message ?? null,
      isLoading: results.some(({ isPending }) => isPending),
    }),
  })
}

async function fetchPoints(
  source: TraceSource,
  view: TimeWindow,
  signal: AbortSignal,
): Promise<CapturePoints> {
  const { evidenceId, channel, minus, shiftSeconds } = source
  const wanted = new URLSearchParams({
    channel: String(channel),
    from: String(view.from + shiftSeconds),
    to: String(view.to + shiftSeconds),
    buckets: String(buckets),
    ...(minus === null ? {} : { minus: String(minus) }),
  })
  const fetched = await fetchJson(`/api/evidence/${evidenceId}/points?${wanted.toString()}`, points, {
    otherwise: 'The points did not arrive. Load the page again.',
    signal,
  })
  return shiftSeconds === 0 ? fetched : { ...fetched, x: fetched.x.map((instant) => instant - shiftSeconds) }
}
