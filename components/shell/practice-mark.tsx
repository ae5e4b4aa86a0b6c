import Link from 'next/link'

type PracticeMarkProps = { readonly practiceName: string; readonly href: string }

/** The practice's name beside a ring that dies out: the thing this bench is about. */
export const PracticeMark = ({ practiceName, href }: PracticeMarkProps) => (
  <Link href={href} className="flex min-h-11 min-w-0 items-center gap-2 text-ink sm:gap-3 no-underline">
    <svg viewBox="0 0 44 24" aria-hidden="true" className="w-9 shrink-0 sm:w-11">
      <path d="M0 22H44" stroke="var(--copper)" strokeWidth="2" />
      <path
        d="M1 17H8L11 6C12.4 0.5 13.6 0.5 15 6S17.8 14 19.3 9.5S22 5 23.4 8.4S26.2 11.2 27.6 9.2S30.4 7.4 31.8 8.6S34.6 9.4 36 8.9H43"
        fill="none"
        stroke="currentColor"
        strokeWidth="1.75"
        strokeLinejoin="round"
      />
    </svg>
    <span className="truncate font-serif text-base font-semibold sm:text-lg">{practiceName}</span>
  </Link>
)
