import 'server-only'

import { findCompany } from '@/db/repositories/company.repo'
import { listBlocks, listLedger, type LedgerLine } from '@/db/repositories/hour-ledger.repo'
import type { LedgerKind } from '@/db/tables/hours'
import { authorize, isAllowed, notFound } from '@/lib/authz/authorize'
import { balanceOf } from '@/lib/core/ledger/balance'
import { minutes } from '@/lib/core/ledger/minutes'
import { err, ok } from '@/lib/core/result'

import { operation } from '../operation'
import { companyIdSchema } from './hours.schema'
import { openBlocks, spendableMinutes } from './open-blocks'

/** A company's hours: what can be spent, its blocks, and every movement with the balance after it. */
export const companyHours = operation('hours.companyHours', companyIdSchema, async (deps, actor, input) => {
  const resource = { kind: 'company', companyId: input.companyId } as const
  const allowed = authorize(actor, 'hours.read', resource)
  if (!allowed.ok) return allowed
  const company = await findCompany(deps.db, input.companyId)
  if (!company) return err(notFound)
  const now = deps.clock.now()
  const rows = await listBlocks(deps.db, input.companyId)
  const open = await openBlocks(deps.db, input.companyId)
  const ledger = await listLedger(deps.db, input.companyId)
  return ok({
    companyName: company.name,
    /** The steps that are open to the reader. */
    may: {
      buy: isAllowed(actor, 'purchase.start', resource),
      readPurchases: isAllowed(actor, 'purchase.read', resource),
    },
    balanceMinutes: balanceOf(ledger.map((entry) => ({ minutes: minutes(entry.minutes) }))),
    spendableMinutes: spendableMinutes(open, now),
    blocks: rows.map((row) => ({
      blockId: row.id,
      title: row.title,
      minutes: row.minutes,
      remaining: open.find((block) => block.id === row.id)?.remaining ?? 0,
      validUntil: row.valid_until,
      isExpired: row.valid_until <= now,
    })),
    movements: movementsOf(ledger).reverse(),
  })
})

export type MovementDto = {
  readonly entryId: string
  readonly at: number
  readonly kind: LedgerKind
  readonly text: string
  readonly engagement: string | null
  readonly minutes: number
  /** The balance after this movement. */
  readonly balance: number
}

function movementsOf(ledger: readonly LedgerLine[]): MovementDto[] {
  let balance = 0
  return ledger.map((entry) => {
    balance += entry.minutes
    return {
      entryId: entry.id,
      at: entry.created_at,
      kind: entry.kind,
      text: entry.text,
      engagement: entry.engagement_title,
      minutes: entry.minutes,
      balance,
    }
  })
}
