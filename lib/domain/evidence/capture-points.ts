import 'server-only'

import { decimateMinMax } from '@/lib/core/waveform/decimate-min-max'
import type { FileStore } from '@/lib/ports/file-store'

import { readSamples } from './channel-samples'

export type CapturePointsDto = {
  readonly x: readonly number[]
  readonly min: readonly number[]
  readonly max: readonly number[]
}

type Wanted = {
  readonly evidenceId: string
  readonly channel: number
  readonly from?: number | undefined
  readonly to?: number | undefined
  readonly buckets: number
}

type TimeBase = {
  readonly samples: number
  readonly startSeconds: number
  readonly intervalSeconds: number
}

const samplesPerRead = 65_536

/**
 * The samples from `from` to `to` (seconds; one more at each side, so that a line reaches the edge of the plot) in at
 * most `buckets` columns. Read in pieces of whole columns, so that a long record never holds up the request loop.
 */
export async function readPoints(
  files: FileStore,
  wanted: Wanted,
  base: TimeBase,
): Promise<CapturePointsDto> {
  const first = indexAt(wanted.from, 0, base, -1)
  const last = indexAt(wanted.to, base.samples - 1, base, 1)
  const count = Math.max(1, last - first + 1)
  const columns = Math.min(wanted.buckets, count)
  const pieces = Math.min(columns, Math.ceil(count / samplesPerRead))
  const startOf = (column: number) => first + Math.ceil((column * count) / columns)
  const points: Record<keyof CapturePointsDto, number[]> = { x: [], min: [], max: [] }
  for (let piece = 0; piece < pieces; piece += 1) {
    const from = Math.floor((piece * columns) / pieces)
    const to = Math.floor(((piece + 1) * columns) / pieces)
    const begin = startOf(from)
    const samples = await readSamples(files, wanted.evidenceId, wanted.channel, begin, startOf(to) - begin)
    const start = base.startSeconds + begin * base.intervalSeconds
    const trace = decimateMinMax(samples, start, base.intervalSeconds, -Infinity, Infinity, to - from)
    points.x.push(...trace.x)
    points.min.push(...trace.min)
    points.max.push(...trace.max)
  }
  return points
}

function indexAt(instant: number | undefined, otherwise: number, base: TimeBase, margin: -1 | 1): number {
  if (instant === undefined) return otherwise
  const exact = (instant - base.startSeconds) / base.intervalSeconds
  const index = margin < 0 ? Math.floor(exact) - 1 : Math.ceil(exact) + 1
  return Math.min(base.samples - 1, Math.max(0, index))
}
