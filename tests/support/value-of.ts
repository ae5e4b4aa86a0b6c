import type { Result } from '@/lib/core/result'

/** The value of a result that the test takes for granted; a refusal fails the test with its sentence. */
export function valueOf<T>(result: Result<T, { readonly code: string; readonly message: string }>): T {
  if (!result.ok) throw new Error(`${result.error.code}: ${result.error.message}`)
  return result.value
}
