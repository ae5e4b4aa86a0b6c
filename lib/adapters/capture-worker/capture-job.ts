import { channelFileOf, mostChannels } from '@/lib/ports/capture-analyser'
import type { FileStore } from '@/lib/ports/file-store'

export const jobOf = (files: FileStore, evidenceId: string): CaptureJob => ({
  source: files.pathOf(evidenceId),
  channelFiles: Array.from({ length: mostChannels }, (_, channel) =>
    files.pathOf(channelFileOf(evidenceId, channel)),
  ),
})
