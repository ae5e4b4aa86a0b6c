import type { RunDto } from '@/lib/domain/findings/run-dto'

import { StatusMark } from '../ui/status-mark'
import { MathText } from './math-text'

/** The limits of the model and of the measurement, as they were checked against this very run. */
export const RunChecks = ({ run }: { readonly run: Pick<RunDto, 'validity' | 'warnings'> }) => (
  <ul className="flex flex-col gap-2">
    {run.validity.map(({ passed, sentence }) => (
      <li key={sentence} className="grid gap-x-4 sm:grid-cols-[8.5rem_minmax(0,1fr)]">
        {passed ? (
          <StatusMark kind="verified">Holds</StatusMark>
        ) : (
          <StatusMark kind="over-limit">Does not hold</StatusMark>
        )}
        <span className="max-w-measure">
          <MathText>{sentence}</MathText>
        </span>
      </li>
    ))}
    {run.warnings.map((warning) => (
      <li key={warning} className="grid gap-x-4 sm:grid-cols-[8.5rem_minmax(0,1fr)]">
        <StatusMark kind="attention">Mind</StatusMark>
        <span className="max-w-measure">{warning}</span>
      </li>
    ))}
  </ul>
)
