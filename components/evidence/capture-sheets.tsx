import type { FormAction } from '@/lib/core/action-state'
import type { CaptureDto } from '@/lib/domain/evidence/evidence-resource'
import type { FactConsequences } from '@/lib/domain/evidence/fact-consequences'

import { Sheet } from '../ui/sheet'
import { Timestamp } from '../ui/timestamp'
import { CaptureChannelPlot } from './capture-channel-plot'
import { FactsForm } from './facts-form'
import { ProbingCaution } from './probing-caution'
import { SupportSheet } from './support-sheet'

type CaptureSheetsProps = {
  readonly evidenceId: string
  readonly capture: CaptureDto & {
    readonly consequences: FactConsequences
    readonly lastStated: { readonly by: string; readonly at: number } | null
  }
  readonly stateFacts: FormAction
}

/** A capture that was read: its channels, what it can support, and how it was measured. */
export const CaptureSheets = ({ evidenceId, capture, stateFacts }: CaptureSheetsProps) => {
  const from = capture.startSeconds
  const extent = { from, to: from + (capture.samples - 1) * capture.intervalSeconds }
  return (
    <>
      {capture.channels.map((channel) => (
        <Sheet key={channel.position} title={channel.name}>
          <CaptureChannelPlot
            evidenceId={evidenceId}
            channel={channel.position}
            name={channel.name}
            unit={channel.unit}
            extent={extent}
          />
        </Sheet>
      ))}
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
