import type { FormAction } from '@/lib/core/action-state'
import type { CaptureDto } from '@/lib/domain/evidence/evidence-resource'
import type { FactConsequences } from '@/lib/domain/evidence/fact-consequences'

import { CaptureViewer } from '../capture-viewer/capture-viewer'
import { Sheet } from '../ui/sheet'
import { Timestamp } from '../ui/timestamp'
import { FactsForm } from './facts-form'
import { ProbingCaution } from './probing-caution'
import { SupportSheet } from './support-sheet'

type CaptureSheetsProps = {
  readonly evidenceId: string
  readonly name: string
  /** Where a measurement between the cursors is made; absent for those who do not measure. */
  readonly measureHref?: string | undefined
  readonly capture: CaptureDto & {
    readonly consequences: FactConsequences
    readonly lastStated: { readonly by: string; readonly at: number } | null
  }
  readonly stateFacts: FormAction
}

/** A capture that was read: its channels, what it can support, and how it was measured. */
export const CaptureSheets = ({ evidenceId, name, measureHref, capture, stateFacts }: CaptureSheetsProps) => {
  const from = capture.startSeconds
  const extent = { from, to: from + (capture.samples - 1) * capture.intervalSeconds }
  return (
    <>
      <Sheet title="Capture">
        <CaptureViewer
          capture={{ evidenceId, name, extent, channels: capture.channels }}
          measureHref={measureHref}
        />
      </Sheet>
      <SupportSheet consequences={capture.consequences} />
      <Sheet title="How it was measured">
        <div className="flex flex-col gap-5">
          <ProbingCaution />
          <FactsForm evidenceId={evidenceId} facts={capture.facts} action={stateFacts} />
          {capture.lastStated ? (
            <p className="text-sm text-ink-soft">
              Last stated by {capture.lastStated.by}, <Timestamp instant={capture.lastStated.at} />.
            </p>
          ) : null}
        </div>
      </Sheet>
    </>
  )
}
