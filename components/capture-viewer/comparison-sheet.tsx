import type { ComparedCapture } from '@/lib/domain/evidence/compare-captures.service'
import { quantityText } from '@/lib/core/units/format-quantity'

import { Sheet } from '../ui/sheet'
import { CaptureViewer } from './capture-viewer'
import { channelSource } from './viewed-capture'

type ComparisonSheetProps = {
  readonly first: ComparedCapture
  readonly second: ComparedCapture
  readonly secondChannel: number
  readonly isAligned: boolean
  readonly shiftSeconds: number
}

/** Two captures over each other, the second moved so that its edge lies on that of the first. */
export const ComparisonSheet = ({
  first,
  second,
  secondChannel,
  isAligned,
  shiftSeconds,
}: ComparisonSheetProps) => {
  const channel = second.channels.find(({ position }) => position === secondChannel)
  return (
    <Sheet title={`${first.name} and ${second.name}`}>
      <p className="mb-4 max-w-measure text-ink-soft">
        {isAligned
          ? `Aligned on the first edges: the second capture is moved by ${quantityText(-shiftSeconds, 's', 4)}.`
          : 'One of them shows no edge to align on, so both stand at the times of their files.'}
      </p>
      <CaptureViewer
        capture={first}
        overlay={channel ? [channelSource(second, channel, shiftSeconds, ` of ${second.name}`)] : []}
      />
    </Sheet>
  )
}
