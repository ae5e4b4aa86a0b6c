import 'server-only'

import type { Db, Tx } from '@/db/client'

export type FactRow = {
  readonly key: string
  readonly value: string
  readonly stated_by: string
  readonly stated_at: number
  readonly stater: string
}

export function listFacts(db: Db | Tx, evidenceId: string): Promise<FactRow[]> {
  return db
    .selectFrom('measurement_fact')
    .innerJoin('person', 'person.id', 'measurement_fact.stated_by')
    .where('evidence_id', '=', evidenceId)
    .select(['key', 'value', 'stated_by', 'stated_at', 'person.name as stater'])
    .execute()
}

export type StatedFact = { readonly key: string; readonly value: string | null }

/** Writes each fact under who states it now; null takes a fact back. An unchanged fact keeps its first stater. */
export async function putFacts(
  tx: Tx,
  evidenceId: string,
  facts: readonly StatedFact[],
  stated: { readonly by: string; readonly at: number },
): Promise<void> {
  for (const { key, value } of facts) {
    if (value === null) {
      await tx
        .deleteFrom('measurement_fact')
        .where('evidence_id', '=', evidenceId)
        .where('key', '=', key)
        .execute()
      continue
    }
    const row = { evidence_id: evidenceId, key, value, stated_by: stated.by, stated_at: stated.at }
    await tx
      .insertInto('measurement_fact')
      .values(row)
      .onConflict((conflict) =>
        conflict
          .columns(['evidence_id', 'key'])
          .doUpdateSet({ value, stated_by: stated.by, stated_at: stated.at })
          .where('measurement_fact.value', '!=', value),
      )
      .execute()
  }
}
