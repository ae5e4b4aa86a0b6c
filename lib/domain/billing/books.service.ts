import 'server-only'

import { listCompanies } from '@/db/repositories/company.repo'
import { listLedger } from '@/db/repositories/hour-ledger.repo'
import { listPayments, type PaymentRow } from '@/db/repositories/payment.repo'
import { postedMinutesOfCompany } from '@/db/repositories/posted-time.repo'
import { listPurchases, type PurchaseRow } from '@/db/repositories/purchase.repo'
import { authorize } from '@/lib/authz/authorize'
import { practice } from '@/lib/authz/resource'
import { ok } from '@/lib/core/result'

import type { Deps } from '../deps'
import { noInput } from '../form-fields'
import { operation } from '../operation'
import { settlePayments } from './event.service'

/** One thing that must hold between two books, with the sentence that says whether it does. */
export type Agreement = { readonly agrees: boolean; readonly sentence: string }

/**
 * The books side by side: for each purchase its payment, fee and net and the hours it credited; for each company its
 * credits, debits and balance; and whether all of them agree.
 */
export const booksOverview = operation('billing.booksOverview', noInput, async (deps, actor) => {
  const allowed = authorize(actor, 'books.read', practice)
  if (!allowed.ok) return allowed
  await settlePayments(deps)
  const [purchases, payments, companies] = await Promise.all([
    listPurchases(deps.db),
    listPayments(deps.db),
    listCompanies(deps.db),
  ])
  const accounts = await Promise.all(companies.map((company) => accountOf(deps, company)))
  const credits = new Map(accounts.flatMap((account) => [...account.creditsBySource]))
  return ok({
    purchases: purchases.map((purchase) => {
      const payment = payments.find((candidate) => candidate.purchase_id === purchase.id)
      return purchaseLine(purchase, payment, credits.get(purchase.id) ?? 0)
    }),
    accounts: accounts.map(({ creditsBySource: _, ...account }) => account),
  })
})

function purchaseLine(
  purchase: PurchaseRow & { readonly company_name: string },
  payment: PaymentRow | undefined,
  creditedMinutes: number,
) {
  return {
    purchaseId: purchase.id,
    companyName: purchase.company_name,
    title: purchase.title,
    status: purchase.status,
    receiptNumber: purchase.receipt_number,
    paidAt: purchase.paid_at,
    currency: purchase.currency,
    priceCents: purchase.gross_cents,
    grossCents: payment?.gross_cents ?? null,
    feeCents: payment?.fee_cents ?? null,
    netCents: payment?.net_cents ?? null,
    creditedMinutes,
    agreements: purchaseAgreements(purchase, payment, creditedMinutes),
  }
}

function purchaseAgreements(
  purchase: PurchaseRow,
  payment: PaymentRow | undefined,
  creditedMinutes: number,
): Agreement[] {
  if (purchase.status !== 'paid') {
    const agrees = payment === undefined && creditedMinutes === 0
    return [
      { agrees, sentence: agrees ? 'Not paid, nothing credited' : 'Not paid, yet money or hours moved' },
    ]
  }
  const isPaidInFull = payment?.gross_cents === purchase.gross_cents
  const isCredited = creditedMinutes === purchase.minutes
  const isSettled = payment?.fee_cents != null
  return [
    {
      agrees: isPaidInFull,
      sentence: isPaidInFull ? 'Payment equals price' : 'Payment differs from the price',
    },
    {
      agrees: isCredited,
      sentence: isCredited ? 'Hours equal the block' : 'Credited hours differ from the block',
    },
    {
      agrees: isSettled,
      sentence: isSettled
        ? 'Gross less fee is net'
        : 'The provider has not told the fee yet; open the page again later',
    },
  ]
}

async function accountOf(deps: Deps, company: { readonly id: string; readonly name: string }) {
  const ledger = await listLedger(deps.db, company.id)
  const sumOf = (kind: string) =>
    ledger.filter((entry) => entry.kind === kind).reduce((sum, entry) => sum + entry.minutes, 0)
  const balance = ledger.reduce((sum, entry) => sum + entry.minutes, 0)
  const debited = -sumOf('debit')
  const posted = await postedMinutesOfCompany(deps.db, company.id)
  const agrees = posted === debited
  const agreement: Agreement = {
    agrees,
    sentence: agrees ? 'Debits equal posted time' : `Posted time is ${posted} min, debits are ${debited} min`,
  }
  return {
    companyId: company.id,
    companyName: company.name,
    creditedMinutes: sumOf('credit'),
    debitedMinutes: debited,
    balanceMinutes: balance,
    agreements: [
      agreement,
      {
        agrees: balance >= 0,
        sentence: balance >= 0 ? 'Balance is not below zero' : 'Balance is below zero',
      },
    ],
    creditsBySource: ledger
      .filter((entry) => entry.kind === 'credit')
      .map((entry) => [entry.source_id, entry.minutes] as const),
  }
}
