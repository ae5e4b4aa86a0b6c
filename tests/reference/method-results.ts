import { findMethod } from '@/lib/core/method/registry'

/** The results of a method by their keys; null where it refuses the inputs. */
export function resultsOf(
  id: string,
  raw: Readonly<Record<string, number>>,
): ((key: string) => number) | null {
  const method = findMethod(id)
  if (method === undefined) throw new Error(`There is no method ${id}`)
  const run = method.run(raw)
  if (!run.ok) return null
  const { results } = run.value.outcome
  return (key) => {
    const result = results.find((candidate) => candidate.key === key)
    if (result === undefined) throw new Error(`The method ${id} has no result ${key}`)
    return result.value
  }
}
