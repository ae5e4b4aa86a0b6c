import { formatQuantity } from '@/lib/core/units/format-quantity'
import type { FactConsequences } from '@/lib/domain/evidence/fact-consequences'

import { OpenNumber } from '../ui/open-number'
import { Sheet } from '../ui/sheet'

/** What the capture can carry: its highest usable frequency, and what each missing fact rules out. */
export const SupportSheet = ({ consequences }: { readonly consequences: FactConsequences }) => {
  const highest = formatQuantity(consequences.highestUsableHertz, 'Hz', 3)
  return (
    <Sheet title="What it can support">
      <OpenNumber
        label="Highest usable frequency"
        value={highest.number}
        unit={highest.unit}
        formula="min(bandwidth, sample rate / 5)"
        source="Common practice, no source"
        inputs="The stated bandwidth, or 20 MHz while none is stated; the sample interval of the record"
      />
      {consequences.missing.length > 0 ? (
        <>
          <h3 className="mt-4 text-base">Missing facts</h3>
          <ul className="mt-1 flex max-w-measure list-disc flex-col gap-1 pl-5">
            {consequences.missing.map(({ fact, rulesOut }) => (
              <li key={fact}>{rulesOut}</li>
            ))}
          </ul>
        </>
      ) : null}
      {consequences.remarks.length > 0 ? (
        <>
          <h3 className="mt-4 text-base">What follows from the facts</h3>
          <ul className="mt-1 flex max-w-measure list-disc flex-col gap-1 pl-5">
            {consequences.remarks.map((remark) => (
              <li key={remark}>{remark}</li>
            ))}
          </ul>
        </>
      ) : null}
    </Sheet>
  )
}
