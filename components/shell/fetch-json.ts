import { z } from './plain-zod'

const problem = z.object({ title: z.string() })

/** What the portal answers under an address, parsed. Throws an `Error` with its sentence, or with `otherwise`. */
export async function fetchJson<Value>(
  address: string,
  schema: z.ZodType<Value>,
  { otherwise, signal }: { readonly otherwise: string; readonly signal: AbortSignal },
): Promise<Value> {
  const answer = await fetch(address, { signal })
  const body: unknown = await answer.json()
  if (answer.ok) return schema.parse(body)
  const known = problem.safeParse(body)
  throw new Error(known.success ? known.data.title : otherwise)
}
