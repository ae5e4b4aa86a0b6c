import { Sheet } from '../ui/sheet'
import { Timestamp } from '../ui/timestamp'

type Remark = {
  readonly section: string
  readonly text: string
  readonly authorName: string
  readonly createdAt: number
}

export const RemarkList = ({ remarks }: { readonly remarks: readonly Remark[] }) => (
  <Sheet title="Remarks of the reviewer">
    <ol className="flex flex-col gap-4">
      {remarks.map((remark) => (
        <li key={`${remark.createdAt}${remark.text}`}>
          <p className="text-sm text-ink-soft">
            {remark.authorName} on the {remark.section}, <Timestamp instant={remark.createdAt} />
          </p>
          <p className="max-w-measure whitespace-pre-line">{remark.text}</p>
        </li>
      ))}
    </ol>
  </Sheet>
)
