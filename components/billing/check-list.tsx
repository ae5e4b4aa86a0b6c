import { StatusMark, type StatusKind } from '../ui/status-mark'

export type Check = {
  readonly name: string
  readonly state: 'agrees' | 'pending' | 'differs'
  readonly sentence: string
}

const marks: Record<Check['state'], StatusKind> = {
  agrees: 'verified',
  pending: 'waiting',
  differs: 'over-limit',
}

/** What must hold between two books: a mark for each, and the reason where one does not agree (yet). */
export const CheckList = ({ checks }: { readonly checks: readonly Check[] }) => (
  <ul className="flex flex-wrap gap-x-4 gap-y-0.5">
    {checks.map((check) => (
      <li key={check.name} className={check.state === 'agrees' ? undefined : 'basis-full'}>
        <StatusMark kind={marks[check.state]}>{check.name}</StatusMark>
        {check.state === 'agrees' ? (
          <span className="sr-only">: {check.sentence}</span>
        ) : (
          <span
            className={
              check.state === 'differs' ? 'block text-sm text-over-limit' : 'block text-sm text-ink-soft'
            }
          >
            {check.sentence}
          </span>
        )}
      </li>
    ))}
  </ul>
)
