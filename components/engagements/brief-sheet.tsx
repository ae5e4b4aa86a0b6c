import { exactQuantityText } from '@/lib/core/units/exact-quantity-text'
import type { Unit } from '@/lib/core/units/unit'
import type { BriefDto } from '@/lib/domain/engagements/engagement-dto'

import { DataTable } from '../ui/data-table'
import { DescriptionList } from '../ui/description-list'
import { Quantity } from '../ui/quantity'
import { Sheet } from '../ui/sheet'

const unknown = <span className="text-ink-faint">not stated</span>

const Prose = ({ text }: { readonly text: string }) =>
  text === '' ? unknown : <p className="max-w-measure whitespace-pre-line">{text}</p>

const value = (known: number | null, unit: Unit) => {
  if (known === null) return unknown
  const [number = '', written = ''] = exactQuantityText(known, unit).split('\u00a0')
  return <Quantity value={number} unit={written} />
}

export const BriefSheet = ({ brief }: { readonly brief: BriefDto }) => {
  const goal = [brief.goalStandard, brief.goalClass && `class ${brief.goalClass}`].filter(Boolean).join(', ')
  return (
    <Sheet title="Brief">
      <DescriptionList
        items={[
          { term: 'Product', detail: <Prose text={brief.product} /> },
          { term: 'Symptom', detail: <Prose text={brief.symptom} /> },
          { term: 'What was tried', detail: <Prose text={brief.alreadyTried} /> },
          { term: 'Goal', detail: <Prose text={goal} /> },
          {
            term: 'Next test',
            detail: brief.goalTestDate ? <span className="num">{brief.goalTestDate}</span> : unknown,
          },
          { term: 'Input voltage', detail: value(brief.vinVolts, 'V') },
          { term: 'Output voltage', detail: value(brief.voutVolts, 'V') },
          { term: 'Output current', detail: value(brief.ioutAmperes, 'A') },
          { term: 'Switching frequency', detail: value(brief.switchingHertz, 'Hz') },
          { term: 'Spread spectrum', detail: <Prose text={brief.spreadSpectrum} /> },
        ]}
      />
      {brief.oscillators.length > 0 ? (
        <div className="-mx-4 mt-4 border-t border-rule sm:-mx-5">
          <Oscillators oscillators={brief.oscillators} />
        </div>
      ) : null}
    </Sheet>
  )
}

const Oscillators = ({ oscillators }: Pick<BriefDto, 'oscillators'>) => (
  <DataTable
    caption="Known oscillators"
    rows={oscillators}
    rowKey={(oscillator) => oscillator.name + String(oscillator.hertz)}
    columns={[
      { key: 'name', header: 'Name', isRowHeader: true, cell: (oscillator) => oscillator.name },
      {
        key: 'frequency',
        header: 'Frequency',
        align: 'end',
        cell: (oscillator) => value(oscillator.hertz, 'Hz'),
      },
      {
        key: 'tolerance',
        header: 'Tolerance',
        align: 'end',
        cell: (oscillator) => <Quantity value={`±${oscillator.tolerancePpm}`} unit="ppm" />,
      },
    ]}
  />
)
