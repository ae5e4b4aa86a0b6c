import { StatusMark } from '../ui/status-mark'
import type { Check } from './check-list'

const counted = (count: number, one: string, many: string): string => `${count} ${count === 1 ? one : many}`

/** The verdict over all checks; what is not known yet is told beside it. */
export const BooksState = ({ checks }: { readonly checks: readonly Check[] }) => {
  const count = (state: Check['state']) => checks.filter((check) => check.state === state).length
  const [differing, pending] = [count('differs'), count('pending')]
  return (
    <>
      {differing === 0 ? (
        <StatusMark kind="verified">All books agree</StatusMark>
      ) : (
        <StatusMark kind="over-limit">
          {counted(differing, 'check does not agree', 'checks do not agree')}
        </StatusMark>
      )}
      {pending > 0 ? (
        <StatusMark kind="waiting">
          {counted(pending, 'fee is not known yet', 'fees are not known yet')}
        </StatusMark>
      ) : null}
    </>
  )
}
