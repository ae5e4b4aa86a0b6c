import { DescriptionList } from '../ui/description-list'
import { Sheet } from '../ui/sheet'

type ReportSummaryProps = { readonly belief: string; readonly certainty: string; readonly nextStep: string }

export const ReportSummary = ({ belief, certainty, nextStep }: ReportSummaryProps) => (
  <Sheet title="Summary">
    <DescriptionList
      items={[
        { term: 'What we believe', detail: belief },
        { term: 'How sure we are', detail: certainty },
        { term: 'What to do next', detail: nextStep },
      ]}
    />
  </Sheet>
)
