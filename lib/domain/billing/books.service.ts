import 'server-only'

import { listCompanies, type CompanyRow } from '@/db/repositories/company.repo'
import { listBlocks, listLedger, type BlockRow, type LedgerRow } from '@/db/repositories/hour-ledger.repo'
import { listCatalogue } from '@/db/repositories/offer.repo'
import { listPayments, type PaymentRow } from '@/db/repositories/payment.repo'
import { postedMinutesOfCompany } from '@/db/repositories/posted-time.repo'
import { listEvents } from '@/db/repositories/provider-event.repo'
import { listPurchases, type PurchaseRow } from '@/db/repositories/purchase.repo'
import { authorize } from '@/lib/authz/authorize'
import { practice } from '@/lib/authz/resource'
import { ok } from '@/lib/core/result'

import type { Deps } from '../deps'
import { noInput } from '../form-fields'
import { operation } from '../operation'
import { accountChecks, purchaseChecks, receiptCheck, type BlockFigures } from './books-checks'
import { totalsByCurrency } from './books-totals'
import { offerOf } from './offer-dto'
import { settlePayments } from './settle-payments'

/**
 * The books side by side: for each purchase its payment, fee and net and what the ledger holds of its hours; for each
 * company its credits, debits and balance; their sums; whether all of them agree; and the provider's events that
 * somebody must look at.
 */
export const booksOverview = operation('billing.booksOverview', noInput, async (deps, actor) => {
  const allowed = authorize(actor, 'books.read', practice)
  if (!allowed.ok) return allowed
  const purchases = await listPurchases(deps.db)
  const payments = await listPayments(deps.db)
  const companies = await listCompanies(deps.db)
  const accounts = await Promise.all(companies.map((company) => accountOf(deps, company, purchases)))
  const blocks = new Map(accounts.flatMap((account) => [...account.blocks]))
  const paymentOf = new Map(payments.map((payment) => [payment.purchase_id, payment]))
  const receiptNumbers = purchases.flatMap(({ receipt_number }) => receipt_number ?? [])
  const lines = purchases.map((purchase) =>
    purchaseLine(purchase, paymentOf.get(purchase.id), blocks.get(purchase.id)),
  )
  return ok({
    purchases: lines,
    totals: totalsByCurrency(lines),
    accounts: accounts.map(({ blocks: _, ...account }) => account),
    checks: [receiptCheck(receiptNumbers, payments.length)],
    events: await eventsToLookAt(deps),
  })
})

/** The catalogue as the administrator sees it: all blocks, also those taken off sale. */
export const catalogue = operation('billing.catalogue', noInput, async (deps, actor) => {
  const allowed = authorize(actor, 'books.read', practice)
  if (!allowed.ok) return allowed
  const rows = await listCatalogue(deps.db)
  return ok(rows.map((row) => ({ ...offerOf(row), isOnSale: row.archived_at === null })))
})

/** Asks the provider now for the fees that it has not told yet. */
export const fetchFees = operation('billing.fetchFees', noInput, async (deps, actor) => {
  const allowed = authorize(actor, 'books.read', practice)
  return allowed.ok ? ok(await settlePayments(deps)) : allowed
})

function purchaseLine(
  purchase: PurchaseRow & { readonly company_name: string },
  payment: PaymentRow | undefined,
  block: BlockFigures | undefined,
) {
  return {
    purchaseId: purchase.id,
    companyName: purchase.company_name,
    title: purchase.title,
    status: purchase.status,
    receiptNumber: purchase.receipt_number,
    createdAt: purchase.created_at,
    paidAt: purchase.paid_at,
    currency: purchase.currency,
    grossCents: payment?.gross_cents ?? null,
    feeCents: payment?.fee_cents ?? null,
    netCents: payment?.net_cents ?? null,
    creditedMinutes: block?.credited ?? 0,
    debitedMinutes: block?.debited ?? 0,
    remainingMinutes: block?.remaining ?? 0,
    checks: purchaseChecks(purchase, payment, block),
  }
}

async function accountOf(deps: Deps, company: CompanyRow, purchases: readonly PurchaseRow[]) {
  const ledger = await listLedger(deps.db, company.id)
  const blocks = await listBlocks(deps.db, company.id)
  const bought = blocks.filter((block) => block.source_kind === 'purchase')
  const figures = {
    soldMinutes: purchases
      .filter((purchase) => purchase.company_id === company.id && purchase.status === 'paid')
      .reduce((sum, purchase) => sum + purchase.minutes, 0),
    creditedMinutes: sumOf(ledger, 'credit'),
    debitedMinutes: 0 - sumOf(ledger, 'debit'),
    postedMinutes: await postedMinutesOfCompany(deps.db, company.id),
    balanceMinutes: sumOf(ledger),
  }
  return {
    companyId: company.id,
    companyName: company.name,
    creditedMinutes: figures.creditedMinutes,
    debitedMinutes: figures.debitedMinutes,
    balanceMinutes: figures.balanceMinutes,
    checks: accountChecks(figures),
    /** By the purchase that each block came from. */
    blocks: new Map(bought.map((block) => [block.source_id, blockFigures(block, ledger)])),
  }
}

function blockFigures(block: BlockRow, ledger: readonly LedgerRow[]): BlockFigures {
  const entries = ledger.filter((entry) => entry.block_id === block.id)
  return {
    minutes: block.minutes,
    credited: sumOf(entries, 'credit'),
    debited: 0 - sumOf(entries, 'debit'),
    remaining: sumOf(entries),
    validUntil: block.valid_until,
  }
}

const sumOf = (entries: readonly LedgerRow[], kind?: LedgerRow['kind']): number =>
  entries
    .filter((entry) => kind === undefined || entry.kind === kind)
    .reduce((sum, entry) => sum + entry.minutes, 0)

const settledByHand = ['charge.refunded', 'charge.dispute.created', 'charge.dispute.closed'] as const

/** Events that were refused, and those that an administrator settles by hand; newest first. */
async function eventsToLookAt({ db }: Deps) {
  const refused = await listEvents(db, { outcome: 'refused' })
  const byHand = await listEvents(db, { types: settledByHand })
  return [...refused, ...byHand.filter((event) => event.outcome !== 'refused')]
    .map(({ id, type, received_at, outcome, note }) => ({
      eventId: id,
      type,
      receivedAt: received_at,
      isRefused: outcome === 'refused',
      note,
    }))
    .sort((a, b) => b.receivedAt - a.receivedAt)
}
