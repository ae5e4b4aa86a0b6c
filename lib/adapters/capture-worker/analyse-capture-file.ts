import { readFile } from 'node:fs/promises'

import { err, ok, type Result } from '@/lib/core/result'
import type { Capture } from '@/lib/core/waveform/capture'
import { extremesOf } from '@/lib/core/waveform/extremes'
import { parseCapture } from '@/lib/core/waveform/parse-capture'
import type { CaptureChannelSummary, CaptureRefusal, CaptureSummary } from '@/lib/ports/capture-analyser'

import type { CaptureJob } from './capture-job'
import { writeChannel } from './write-channel'

/** Parses the text and writes each channel's samples to its file; runs in the worker thread. */
export async function analyseCaptureFile(job: CaptureJob): Promise<Result<CaptureSummary, CaptureRefusal>> {
  const parsed = parseCapture(await readFile(job.source))
  if (!parsed.ok) return err({ code: 'not_readable', message: parsed.error.message })
  const capture = parsed.value
  if (capture.channels.length > job.channelFiles.length) {
    return err(tooManyChannels(capture.channels.length, job.channelFiles.length))
  }
  for (const [position, channel] of capture.channels.entries()) {
    const file = job.channelFiles[position]
    if (file !== undefined) await writeChannel(file, channel.values)
  }
  return ok(summaryOf(capture))
}

const summaryOf = (capture: Capture): CaptureSummary => ({
  samples: capture.samples,
  startSeconds: capture.startSeconds,
  intervalSeconds: capture.intervalSeconds,
  intervalSource: capture.intervalSource,
  warnings: capture.warnings,
  channels: capture.channels.map(({ name, unit, values }) => ({ name, unit, ...rangeOf(values) })),
})

function rangeOf(values: Float64Array): Pick<CaptureChannelSummary, 'minimum' | 'maximum'> {
  const { low, high } = extremesOf(values)
  return { minimum: low, maximum: high }
}

const tooManyChannels = (found: number, most: number): CaptureRefusal => ({
  code: 'not_readable',
  message: `The file has ${found} channels; at most ${most} are read. Export those that matter, then send it again.`,
})
