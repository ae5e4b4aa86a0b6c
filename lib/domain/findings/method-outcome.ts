import type { MethodRun } from '@/lib/core/method/run-method'

import { asStored, type RunOutcome } from './run-record'

/** What a method gave, in the shape in which runs keep it. */
export const outcomeOf = ({ outcome, uncertainty }: MethodRun): RunOutcome =>
  asStored(
    {
      absence: null,
      results: [...outcome.results],
      choices: outcome.choices.map(({ title, columns, rows }) => ({
        title,
        columns: [...columns],
        rows: rows.map((row) => [...row]),
      })),
      validity: [...outcome.validity],
      warnings: [],
      uncertainty: uncertainty && { ...uncertainty, intervals: [...uncertainty.intervals] },
    },
    outcome.figures,
  )
