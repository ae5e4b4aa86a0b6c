import type { ReferenceCase } from './case-file'
import type { Outputs } from './topic'
import { areAlike, relativeDifference, type Verdict } from './verdict'

/** Outputs that a case carries for comparison: rules of thumb and popular forms. */
const comparisonOnly = /_rule_|_popular_|^ott_/u

/** Judges the outputs of a computed case, each within its own tolerance where it has one. */
export const judgeOutputs = (item: ReferenceCase, outputs: Outputs): readonly Verdict[] =>
  Object.entries(item.expected).map(([output, expected]) => {
    const got = outputs[output]
    const allowance = {
      relative: item.tolerance_rel_by_output[output] ?? item.tolerance_rel ?? 0,
      absolute: item.tolerance_abs_by_output[output],
    }
    const verdict = { output, expected, got, difference: relativeDifference(got, expected) }
    if (areAlike(got, expected, allowance)) return { ...verdict, outcome: 'pass' }
    const isJudged = got !== undefined || !comparisonOnly.test(output)
    return { ...verdict, outcome: isJudged ? 'miss' : 'not judged' }
  })
