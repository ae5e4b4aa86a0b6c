import type { ReactNode } from 'react'

type CautionProps = {
  readonly title: ReactNode
  /** What can hurt, then what to do about it. */
  readonly children: ReactNode
}

/** A safety caution. The triangle with "!" is the general warning sign of ISO 7010 (W001), here in ink. */
export const Caution = ({ title, children }: CautionProps) => (
  <aside aria-label="Safety caution" className="flex overflow-hidden rounded border border-copper bg-sheet">
    <div aria-hidden="true" className="caution-edge w-3 shrink-0" />
    <div className="flex min-w-0 gap-3 px-4 py-3">
      <svg viewBox="0 0 24 22" aria-hidden="true" className="mt-0.5 size-6 shrink-0 text-ink">
        <path
          d="M12 2L22.5 20.5H1.5Z"
          fill="none"
          stroke="currentColor"
          strokeWidth="2"
          strokeLinejoin="round"
        />
        <path d="M12 8.5V14.5M12 16.2V18.2" stroke="currentColor" strokeWidth="2" />
      </svg>
      <div className="min-w-0 max-w-measure">
        <p className="font-semibold">{title}</p>
        <div className="text-sm [&_ul]:list-disc [&_ul]:pl-5">{children}</div>
      </div>
    </div>
  </aside>
)
