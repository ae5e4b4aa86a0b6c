import type { NewId } from './ids'
import type {
  WireBalanceTransaction,
  WireCharge,
  WireDispute,
  WireIntent,
  WireObject,
  WirePayout,
  WireRefund,
  WireSession,
} from './wire'

const newStore = () => ({
  sessions: new Map<string, WireSession>(),
  intents: new Map<string, WireIntent>(),
  charges: new Map<string, WireCharge>(),
  balance: new Map<string, WireBalanceTransaction>(),
  refunds: new Map<string, WireRefund>(),
  disputes: new Map<string, WireDispute>(),
  payouts: new Map<string, WirePayout>(),
  /** What the payment page calls the thing that is bought, by session. */
  titles: new Map<string, string>(),
  /** Which payout took a balance transaction along. */
  paidOutBy: new Map<string, string>(),
})

export type Store = ReturnType<typeof newStore>

/** One merchant's account in memory, with what its actions need. */
export type Account = {
  readonly store: Store
  readonly newId: NewId
  /** UTC milliseconds. */
  readonly now: () => number
  /** Tells the merchant; resolves with the event's id after the first attempt to deliver it. */
  readonly publish: (type: string, object: WireObject) => Promise<string>
}

export const openStore = newStore

export const stamp = ({ now }: Pick<Account, 'now'>) =>
  ({ created: Math.floor(now() / 1000), livemode: false }) as const

export function findObject(store: Store, id: string): WireObject | undefined {
  const places = [
    store.sessions,
    store.intents,
    store.charges,
    store.balance,
    store.refunds,
    store.disputes,
    store.payouts,
  ]
  for (const place of places) {
    const found = place.get(id)
    if (found !== undefined) return found
  }
  return undefined
}

/** The object, or a failure of the test that asked for one that does not exist. */
export function need<T>(place: ReadonlyMap<string, T>, id: string): T {
  const found = place.get(id)
  if (found === undefined) throw new Error(`The payments fake has no ${id}`)
  return found
}
