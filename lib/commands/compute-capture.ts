import { readFileSync } from 'node:fs'
import path from 'node:path'

import { analyseCapture } from '@/lib/core/capture/analyse-capture'
import { parseCapture } from '@/lib/core/waveform/parse-capture'

import { ComputeProblem } from './compute-problem'

/** What was recognised in a capture file, and what each of its channels (or the named one) shows. */
export function computeCapture(file: string, channelName: string | undefined): unknown {
  const capture = parseCapture(bytesOf(file))
  const name = path.basename(file)
  if (!capture.ok) throw new ComputeProblem(capture.error.code, `${name}: ${capture.error.message}`)
  const { channels, startSeconds, intervalSeconds, intervalSource, samples, warnings } = capture.value
  const wanted = channels.filter((channel) => channelName === undefined || channel.name === channelName)
  if (wanted.length === 0) {
    const names = channels.map((channel) => channel.name).join(', ')
    throw new ComputeProblem(
      'unknown_channel',
      `${name} has no channel “${channelName}”; there are: ${names}.`,
    )
  }
  return {
    file: name,
    samples,
    startSeconds,
    intervalSeconds,
    intervalSource,
    warnings,
    channels: wanted.map((channel) => {
      const analysis = analyseCapture(channel.values, startSeconds, intervalSeconds)
      return {
        name: channel.name,
        unit: channel.unit,
        ...(analysis.ok ? { analysis: analysis.value } : { refusal: analysis.error }),
      }
    }),
  }
}

function bytesOf(file: string): Uint8Array {
  try {
    return new Uint8Array(readFileSync(file))
  } catch (error) {
    const reason = error instanceof Error ? error.message : String(error)
    throw new ComputeProblem('unreadable_file', `${file} cannot be opened: ${reason}`)
  }
}
