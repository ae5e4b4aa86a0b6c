import type { ReferenceCase } from './case-file'
import { judgeCapture } from './judge-capture'
import { judgeOutputs } from './judge-outputs'
import { topics } from './topics'
import type { CaptureReader } from './topic'
import type { Verdict } from './verdict'

export type CaseReport = {
  readonly id: string
  readonly topic: string
  readonly outcome: 'pass' | 'miss' | 'not run'
  readonly verdicts: readonly Verdict[]
  /** Why it was refused or could not be run. */
  readonly remark: string | null
}

/** Thrown by a capture reader whose file is not there. */
export class CaptureAbsent extends Error {}

/** Answers a case from the core and judges the answer. Every case of a topic goes the same way. */
export function runCase(item: ReferenceCase, readCapture: CaptureReader): CaseReport {
  const { id, topic, inputs } = item
  const report = { id, topic, verdicts: [] as readonly Verdict[], remark: null as string | null }
  const answer = topics[topic]
  if (!answer) return { ...report, outcome: 'miss', remark: `There is no topic “${topic}”.` }
  try {
    const answered = answer(inputs, readCapture)
    if (!answered.ok) {
      return { ...report, outcome: item.expect_error ? 'pass' : 'miss', remark: `refused: ${answered.error}` }
    }
    if (item.expect_error) return { ...report, outcome: 'miss', remark: 'answered, where a refusal is due' }
    const verdicts =
      item.tolerance === undefined
        ? judgeOutputs(item, answered.value)
        : judgeCapture(item.expected, answered.value, item.tolerance)
    const hasMiss = verdicts.some(({ outcome }) => outcome === 'miss')
    return { ...report, verdicts, outcome: hasMiss ? 'miss' : 'pass' }
  } catch (error) {
    if (error instanceof CaptureAbsent) return { ...report, outcome: 'not run', remark: error.message }
    throw error
  }
}
