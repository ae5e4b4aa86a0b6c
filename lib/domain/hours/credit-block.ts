import 'server-only'

import type { Tx } from '@/db/client'
import { insertBlock, insertLedgerEntry } from '@/db/repositories/hour-ledger.repo'

import type { Deps } from '../deps'

export type NewBlock = {
  readonly companyId: string
  readonly title: string
  readonly minutes: number
  readonly validFrom: number
  readonly validUntil: number
  /** What the block was bought with; the same source is credited once and never again. */
  readonly source: { readonly kind: string; readonly id: string }
}

/** Opens a block and credits its minutes, within the transaction that pays for it. */
export async function creditBlock(tx: Tx, deps: Pick<Deps, 'clock' | 'ids'>, block: NewBlock): Promise<void> {
  const blockId = deps.ids.newId()
  const now = deps.clock.now()
  await insertBlock(tx, {
    id: blockId,
    company_id: block.companyId,
    title: block.title,
    minutes: block.minutes,
    valid_from: block.validFrom,
    valid_until: block.validUntil,
    source_kind: block.source.kind,
    source_id: block.source.id,
    created_at: now,
  })
  await insertLedgerEntry(tx, {
    id: deps.ids.newId(),
    company_id: block.companyId,
    block_id: blockId,
    kind: 'credit',
    minutes: block.minutes,
    source_kind: block.source.kind,
    source_id: block.source.id,
    engagement_id: null,
    text: `Bought: ${block.title}`,
    created_by: null,
    created_at: now,
  })
}
