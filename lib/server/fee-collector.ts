import 'server-only'

import { settlePayments } from '@/lib/domain/billing/settle-payments'

import { container, type Container } from './container'
import { repeatedly } from './repeatedly'

const minute = 60_000

/** Asks the payment provider every minute for the fees that it has not told yet. */
export const startFeeCollector = ({ deps, log }: Pick<Container, 'deps' | 'log'>): (() => void) =>
  repeatedly(
    minute,
    () => settlePayments(deps),
    (error) => log.error({ error }, 'fees not collected'),
  )

/** Asks once, now; a provider that does not answer is asked again by the collector. */
export async function collectFees(): Promise<void> {
  const { deps, log } = container()
  await settlePayments(deps).catch((error: unknown) => log.error({ error }, 'fees not collected'))
}
