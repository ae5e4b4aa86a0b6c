import { formatQuantity } from '@/lib/core/units/format-quantity'
import type { Unit } from '@/lib/core/units/unit'
import type { CaptureDto } from '@/lib/domain/evidence/evidence-resource'

import { DescriptionList } from '../ui/description-list'
import { Notice } from '../ui/notice'
import { Quantity } from '../ui/quantity'
import { Sheet } from '../ui/sheet'

const written = (value: number, unit: Unit) => {
  const formatted = formatQuantity(value, unit, 4)
  return <Quantity value={formatted.number} unit={formatted.unit} />
}

/** What was recognised in the file: the time base and what looked odd. */
export const CaptureRecord = ({ capture }: { readonly capture: CaptureDto }) => (
  <Sheet title="Record">
    <DescriptionList
      items={[
        { term: 'Samples', detail: <Quantity value={capture.samples.toLocaleString('en')} /> },
        { term: 'Sample rate', detail: <Quantity {...samplesPerSecond(1 / capture.intervalSeconds)} /> },
        { term: 'Sample interval', detail: written(capture.intervalSeconds, 's') },
        { term: 'Interval from', detail: capture.intervalSource },
        { term: 'Begins at', detail: written(capture.startSeconds, 's') },
        { term: 'Length', detail: written((capture.samples - 1) * capture.intervalSeconds, 's') },
      ]}
    />
    {capture.warnings.length > 0 ? (
      <div className="mt-4">
        <Notice tone="caution" title="Noticed while reading">
          <ul className="list-disc pl-5 text-sm">
            {capture.warnings.map((warning) => (
              <li key={warning}>{warning}</li>
            ))}
          </ul>
        </Notice>
      </div>
    ) : null}
  </Sheet>
)

/** Samples a second take the prefix that the frequency of the same number has: "2.5" "GS/s". */
const samplesPerSecond = (rate: number) => {
  const { number, unit } = formatQuantity(rate, 'Hz', 4)
  return { value: number, unit: unit.replace('Hz', 'S/s') }
}
