import 'server-only'

import type { Db } from '@/db/client'
import { addThrottleEvent, countThrottleEvents } from '@/db/repositories/throttle.repo'

import { identityLimits } from './limits'

/** One counted kind of event, for an account or a network address. */
export type Bucket = { readonly name: string; readonly limit: number }

export const failedSignInBuckets = (email: string, address: string): readonly Bucket[] => [
  { name: `sign-in:account:${email}`, limit: identityLimits.failedSignInsPerAccount },
  { name: `sign-in:address:${address}`, limit: identityLimits.failedSignInsPerAddress },
]

export const linkBuckets = (email: string, address: string): readonly Bucket[] => [
  { name: `link:account:${email}`, limit: identityLimits.linksPerAccount },
  { name: `link:address:${address}`, limit: identityLimits.linksPerAddress },
]

/** Whether one of the buckets is full within the window that ends now. */
export async function isThrottled(db: Db, buckets: readonly Bucket[], now: number): Promise<boolean> {
  for (const bucket of buckets) {
    const count = await countThrottleEvents(db, bucket.name, now - identityLimits.throttleWindow)
    if (count >= bucket.limit) return true
  }
  return false
}

export async function countAgainst(db: Db, buckets: readonly Bucket[], now: number): Promise<void> {
  for (const bucket of buckets) await addThrottleEvent(db, bucket.name, now)
}
