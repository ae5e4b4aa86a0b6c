import { jobOf } from '@/lib/adapters/capture-worker/capture-job'
import type { CaptureAnalyser } from '@/lib/ports/capture-analyser'
import type { FileStore } from '@/lib/ports/file-store'

/** The very function that the worker thread runs, in the thread of the test, so that no bundle has to be made first. */
export function createInlineCaptureAnalyser(files: FileStore): CaptureAnalyser {
  return {
    analyse: async (evidenceId) => {
      const { analyseCaptureFile } = await import('@/lib/adapters/capture-worker/analyse-capture-file')
      return analyseCaptureFile(jobOf(files, evidenceId))
    },
  }
}
