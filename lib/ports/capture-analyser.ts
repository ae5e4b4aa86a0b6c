import type { Result } from '@/lib/core/result'

export type CaptureChannelSummary = {
  readonly name: string
  readonly unit: string
  readonly minimum: number
  readonly maximum: number
}

/** What was recognised in a capture; the samples themselves lie beside it in the file store. */
export type CaptureSummary = {
  readonly samples: number
  readonly startSeconds: number
  readonly intervalSeconds: number
  /** Where the interval comes from, in words. */
  readonly intervalSource: string
  readonly warnings: readonly string[]
  readonly channels: readonly CaptureChannelSummary[]
}

/** Why a file is not a capture that can be read: what, where, what to do. */
export type CaptureRefusal = { readonly code: 'not_readable' | 'took_too_long'; readonly message: string }

/** Reads a stored capture away from the request loop, with limits on time and memory. */
export type CaptureAnalyser = {
  /** Parses the file and stores each channel as 64-bit floating-point samples beside it. */
  readonly analyse: (evidenceId: string) => Promise<Result<CaptureSummary, CaptureRefusal>>
}

/** The identifier in the file store of one channel's samples: IEEE 754 binary64, little-endian, one after another. */
export const channelFileOf = (evidenceId: string, channel: number): string => `${evidenceId}.ch${channel}.f64`

/** The identifier, or path, of the overview of one channel: pairs of the lowest and highest of every 256 samples. */
export const overviewBeside = (channelFile: string): string => `${channelFile}.overview`

/** How many channels of one capture are kept. */
export const mostChannels = 32
