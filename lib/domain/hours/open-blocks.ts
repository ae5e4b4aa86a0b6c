import 'server-only'

import type { Db, Tx } from '@/db/client'
import { listBlocks, listLedger } from '@/db/repositories/hour-ledger.repo'
import type { OpenBlock } from '@/lib/core/ledger/allocate-debit'
import { remainingByBlock } from '@/lib/core/ledger/balance'
import { minutes } from '@/lib/core/ledger/minutes'

/** The blocks of a company with what the ledger leaves of each. */
export async function openBlocks(db: Db | Tx, companyId: string): Promise<readonly OpenBlock[]> {
  const blocks = await listBlocks(db, companyId)
  const entries = await listLedger(db, companyId)
  const remaining = remainingByBlock(
    entries.map((entry) => ({ blockId: entry.block_id, minutes: minutes(entry.minutes) })),
  )
  return blocks.map((block) => ({
    id: block.id,
    remaining: remaining.get(block.id) ?? minutes(0),
    validFrom: block.valid_from,
    validUntil: block.valid_until,
  }))
}

/** The minutes that can be spent now: what is left of the blocks that are valid. */
export function spendableMinutes(blocks: readonly OpenBlock[], now: number): number {
  return blocks
    .filter((block) => block.validFrom <= now && now < block.validUntil)
    .reduce((sum, block) => sum + block.remaining, 0)
}
