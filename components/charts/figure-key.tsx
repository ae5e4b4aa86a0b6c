import type { KeyEntry } from '@/lib/figure/layout'
import { lineStyle } from '@/lib/figure/line-style'

const Sample = ({ entry }: { readonly entry: KeyEntry }) => {
  if (entry.role === 'mark') return <path d="M0 5H28" strokeDasharray="1.5 3" className="figure-mark" />
  if (entry.role === 'point') return <circle cx={14} cy={5} r={3.5} className="figure-point" />
  const style = lineStyle(entry.role, entry.rank)
  return (
    <path
      d="M0 5H28"
      strokeWidth={style.width}
      strokeDasharray={style.dash.join(' ') || undefined}
      className={`figure-line figure-${entry.role}`}
    />
  )
}

/** The few names that found no free place on the plot. */
export const FigureKey = ({
  entries,
  className,
}: {
  readonly entries: readonly KeyEntry[]
  readonly className: string
}) =>
  entries.length > 0 ? (
    <ul className={`flex-wrap gap-x-5 gap-y-1 text-sm ${className}`}>
      {entries.map((entry) => (
        <li key={`${entry.role} ${entry.text}`} className="flex items-center gap-2">
          <svg viewBox="0 0 28 10" aria-hidden="true" className="w-7">
            <Sample entry={entry} />
          </svg>
          {entry.text}
        </li>
      ))}
    </ul>
  ) : null
