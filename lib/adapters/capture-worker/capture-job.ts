import { channelFileOf, mostChannels } from '@/lib/ports/capture-analyser'
import type { FileStore } from '@/lib/ports/file-store'

/** What the worker thread is told: where the text lies and where each channel's samples are to go. */
export type CaptureJob = { readonly source: string; readonly channelFiles: readonly string[] }

export const jobOf = (files: FileStore, evidenceId: string): CaptureJob => ({
  source: files.pathOf(evidenceId),
  channelFiles: Array.from({ length: mostChannels }, (_, channel) =>
    files.pathOf(channelFileOf(evidenceId, channel)),
  ),
})
