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

const tones: Record<Check['state'], string> = {
  agrees: 'text-ink-soft',
  pending: 'text-ink-soft',
  differs: 'text-over-limit',
}

type CheckListProps = {
  readonly checks: readonly Check[]
  /** Say also of those that agree what was compared. */
  readonly isExplained?: boolean
}

/** What must hold between two books: a mark for each, and the reason where one does not agree (yet). */
export const CheckList = ({ checks, isExplained = false }: CheckListProps) => (
  <ul className="flex flex-wrap gap-x-4 gap-y-0.5">
    {checks.map(({ name, state, sentence }) => {
      const isShown = isExplained || state !== 'agrees'
      return (
        <li key={name} className={isShown ? 'basis-full' : undefined}>
          <StatusMark kind={marks[state]}>{name}</StatusMark>
          <span className={isShown ? `block text-sm ${tones[state]}` : 'sr-only'}>{sentence}</span>
        </li>
      )
    })}
  </ul>
)
