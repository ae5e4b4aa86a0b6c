import 'server-only'

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

const samplesPerRead = 32_768

/**
 * The samples from `from` to `to` (seconds; one more at each side, so that a line reaches the edge of the plot) in at
 * most `buckets` columns of equal width. Read in pieces, so that a long record never holds up the request loop.
 */
export async function readPoints(
  files: FileStore,
  wanted: Wanted,
  base: TimeBase,
): Promise<CapturePointsDto> {
  const first = indexAt(wanted.from, 0, base, -1)
  const last = indexAt(wanted.to, base.samples - 1, base, 1)
  const count = Math.max(1, last - first + 1)
  const buckets = Math.min(wanted.buckets, count)
  const min = new Array<number>(buckets).fill(Infinity)
  const max = new Array<number>(buckets).fill(-Infinity)
  for (let done = 0; done < count; done += samplesPerRead) {
    const length = Math.min(samplesPerRead, count - done)
    const samples = await readSamples(files, wanted.evidenceId, wanted.channel, first + done, length)
    samples.forEach((value, index) => {
      const bucket = Math.floor(((done + index) * buckets) / count)
      if (value < (min[bucket] ?? 0)) min[bucket] = value
      if (value > (max[bucket] ?? 0)) max[bucket] = value
    })
  }
  const instant = (sample: number) => base.startSeconds + sample * base.intervalSeconds
  const x = min.map((_, bucket) => instant(first + middleOf(bucket, buckets, count)))
  return { x, min, max }
}

/** The middle of the samples that fall into a column; the sample itself where there is one for each. */
function middleOf(bucket: number, buckets: number, count: number): number {
  const start = Math.ceil((bucket * count) / buckets)
  const end = Math.ceil(((bucket + 1) * count) / buckets) - 1
  return (start + end) / 2
}

function indexAt(instant: number | undefined, otherwise: number, base: TimeBase, margin: -1 | 1): number {
  if (instant === undefined) return otherwise
  const exact = (instant - base.startSeconds) / base.intervalSeconds
  const index = margin < 0 ? Math.floor(exact) - 1 : Math.ceil(exact) + 1
  return Math.min(base.samples - 1, Math.max(0, index))
}
