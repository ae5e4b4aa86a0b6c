import type { Figure } from '@/lib/core/figure/figure'
import type { TimeWindow } from '@/lib/figure/time-window'

import { fetchJson } from '../shell/fetch-json'
import { z } from '../shell/plain-zod'
import type { TraceSource } from './viewed-capture'

export const spectrumWindows = {
  hann: 'Hann',
  'flat-top-5': 'Flat top, five terms',
  'blackman-harris-4': 'Blackman-Harris, four terms',
  rectangular: 'None',
} as const

export type SpectrumWindow = keyof typeof spectrumWindows

const axis = z.object({
  label: z.string(),
  unit: z.string(),
  scale: z.enum(['linear', 'log']),
  range: z.exactOptional(z.tuple([z.number(), z.number()])),
})

const series = z.object({
  id: z.string(),
  label: z.string(),
  role: z.enum(['measured', 'computed', 'reference', 'limit']),
  x: z.array(z.number()),
  y: z.array(z.number()),
})

const answered = z.object({
  remark: z.string(),
  figure: z.object({
    id: z.string(),
    title: z.string(),
    description: z.string(),
    x: axis,
    y: axis,
    series: z.array(series),
  }),
})

export type FetchedSpectrum = { readonly figure: Figure; readonly remark: string }

/** The spectrum of a channel in view. Throws an `Error` with the portal's sentence where there is none. */
export async function fetchSpectrum(
  { evidenceId, channel, shiftSeconds }: TraceSource,
  view: TimeWindow,
  window: SpectrumWindow,
  signal: AbortSignal,
): Promise<FetchedSpectrum> {
  const wanted = new URLSearchParams({
    channel: String(channel),
    from: String(view.from + shiftSeconds),
    to: String(view.to + shiftSeconds),
    window,
  })
  const address = `/api/evidence/${evidenceId}/spectrum?${wanted.toString()}`
  const otherwise = 'The spectrum did not arrive. Try again.'
  const { figure, remark } = await fetchJson(address, answered, { otherwise, signal })
  return { remark, figure: { ...figure, marks: [] } }
}
