import 'server-only'

import { decimateMinMax } from '@/lib/core/waveform/decimate-min-max'
import { columnsOfOverview, samplesPerEntry } from '@/lib/core/waveform/overview'
import { channelFileOf, overviewBeside } from '@/lib/ports/capture-analyser'
import type { FileStore } from '@/lib/ports/file-store'

import { readDoubles, readSamples } from './channel-samples'

export type CapturePointsDto = {
  readonly x: readonly number[]
  readonly min: readonly number[]
  readonly max: readonly number[]
}

type Wanted = {
  readonly evidenceId: string
  readonly channel: number
  /** Taken off sample by sample. */
  readonly minus?: number | undefined
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
 * most `buckets` columns. Where a column holds many samples they are read from the overview that was made at ingest;
 * otherwise in pieces of whole columns, so that a long record never holds up the request loop.
 */
export async function readPoints(
  files: FileStore,
  wanted: Wanted,
  base: TimeBase,
): Promise<CapturePointsDto> {
  const first = indexAt(wanted.from, 0, base, -1)
  const last = indexAt(wanted.to, base.samples - 1, base, 1)
  const count = Math.max(1, last - first + 1)
  return wanted.minus === undefined && count / wanted.buckets >= 2 * samplesPerEntry
    ? readOverview(files, wanted, base, first, last)
    : readWhole(files, wanted, base, first, count)
}

/** Whole entries of the overview: the columns begin and end up to 255 samples beside the wanted ones. */
async function readOverview(
  files: FileStore,
  { evidenceId, channel, buckets }: Wanted,
  { startSeconds, intervalSeconds }: TimeBase,
  first: number,
  last: number,
): Promise<CapturePointsDto> {
  const firstEntry = Math.floor(first / samplesPerEntry)
  const entries = Math.floor(last / samplesPerEntry) - firstEntry + 1
  const id = overviewBeside(channelFileOf(evidenceId, channel))
  const overview = await readDoubles(files, id, 2 * firstEntry, 2 * entries)
  const { x, min, max } = columnsOfOverview(overview, buckets)
  const begin = startSeconds + firstEntry * samplesPerEntry * intervalSeconds
  return { x: x.map((sample) => begin + sample * intervalSeconds), min, max }
}

async function readWhole(
  files: FileStore,
  wanted: Wanted,
  base: TimeBase,
  first: number,
  count: number,
): Promise<CapturePointsDto> {
  const columns = Math.min(wanted.buckets, count)
  const pieces = Math.min(columns, Math.ceil(count / samplesPerRead))
  const startOf = (column: number) => first + Math.ceil((column * count) / columns)
  const points: Record<keyof CapturePointsDto, number[]> = { x: [], min: [], max: [] }
  for (let piece = 0; piece < pieces; piece += 1) {
    const from = Math.floor((piece * columns) / pieces)
    const to = Math.floor(((piece + 1) * columns) / pieces)
    const begin = startOf(from)
    const samples = await readTrace(files, wanted, begin, startOf(to) - begin)
    const start = base.startSeconds + begin * base.intervalSeconds
    const trace = decimateMinMax(samples, start, base.intervalSeconds, -Infinity, Infinity, to - from)
    points.x.push(...trace.x)
    points.min.push(...trace.min)
    points.max.push(...trace.max)
  }
  return points
}

/** The samples of a channel, less those of another where one is to be taken off. */
async function readTrace(
  files: FileStore,
  { evidenceId, channel, minus }: Wanted,
  first: number,
  count: number,
): Promise<Float64Array> {
  const samples = await readSamples(files, evidenceId, channel, first, count)
  if (minus === undefined) return samples
  const other = await readSamples(files, evidenceId, minus, first, count)
  return samples.map((value, index) => value - (other[index] ?? 0))
}

function indexAt(instant: number | undefined, otherwise: number, base: TimeBase, margin: -1 | 1): number {
  if (instant === undefined) return otherwise
  const exact = (instant - base.startSeconds) / base.intervalSeconds
  const index = margin < 0 ? Math.floor(exact) - 1 : Math.ceil(exact) + 1
  return Math.min(base.samples - 1, Math.max(0, index))
}
