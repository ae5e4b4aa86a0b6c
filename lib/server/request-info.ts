import 'server-only'
import { cookies, headers } from 'next/headers'

import type { RequestInfo } from '@/lib/domain/deps'

import { container } from './container'
import { cookieNames } from './cookies'

/** What is known of the request that is being answered. */
export async function requestInfo(): Promise<RequestInfo> {
  const [head, jar] = await Promise.all([headers(), cookies()])
  return {
    id: container().deps.ids.newId(),
    address: head.get('x-forwarded-for')?.split(',')[0]?.trim() ?? 'unknown',
    browserSecret: jar.get(cookieNames.browser.name)?.value ?? '',
  }
}

/** As `requestInfo`, but gives the browser its secret first if it has none; only where a response sets cookies. */
export async function requestInfoWithBrowser(): Promise<RequestInfo> {
  const info = await requestInfo()
  if (info.browserSecret !== '') return info
  const browserSecret = container().deps.ids.newSecret()
  const jar = await cookies()
  const { name, options } = cookieNames.browser
  jar.set(name, browserSecret, { ...options, maxAge: 24 * 60 * 60 })
  return { ...info, browserSecret }
}
