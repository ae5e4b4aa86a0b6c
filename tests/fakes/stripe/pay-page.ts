import { setTimeout as pause } from 'node:timers/promises'

import { html, type Html } from '@/emails/html'

import { redirect, type FakeReply, type Route } from '../http-server'
import { page } from '../page'
import type { Account } from './account'
import { payLater, payNow } from './pay-session'
import type { WireSession } from './wire'
import { writtenAmount } from './written-amount'

const banner = 'Test payment – no money moves'

/** How long the browser waits for the merchant to hear of the payment before it goes back there anyway. */
const headStartMilliseconds = 2_000

export function payRoutes(account: Account): readonly Route[] {
  const withSession = async (id: string, act: (session: WireSession) => FakeReply | Promise<FakeReply>) => {
    const session = account.store.sessions.get(id)
    return session === undefined ? unknownPage : act(session)
  }
  return [
    {
      method: 'GET',
      path: /^\/pay\/([^/]+)$/,
      answer: (_request, id = '') => withSession(id, (session) => payPage(account, session)),
    },
    {
      method: 'POST',
      path: /^\/pay\/([^/]+)$/,
      answer: (request, id = '') =>
        withSession(id, (session) => pay(account, session, new URLSearchParams(request.body).get('with'))),
    },
  ]
}

async function pay(account: Account, session: WireSession, choice: string | null): Promise<FakeReply> {
  if (session.status !== 'open') return payPage(account, session)
  if (choice === 'declined') return payPage(account, session, declined)
  const published = choice === 'later' ? payLater(account, session.id) : payNow(account, session.id)
  await Promise.race([published, pause(headStartMilliseconds, undefined, { ref: false })])
  return redirect(returnAddress(session))
}

const returnAddress = (session: WireSession): string =>
  session.success_url.replaceAll('{CHECKOUT_SESSION_ID}', session.id)

const declined =
  'The card was declined and nothing was paid. Choose another way to pay, or go back without paying.'

const payPage = (account: Account, session: WireSession, refusal?: string): FakeReply =>
  page({
    title: session.status === 'open' ? 'Pay for hours' : 'Nothing left to pay here',
    banner,
    status: refusal === undefined ? 200 : 402,
    body: html`<div class="sheet">
      ${refusal === undefined ? null : html`<p class="refusal" role="alert">${refusal}</p>`}
      <dl>
        <dt>What</dt>
        <dd>${account.store.titles.get(session.id) ?? ''}</dd>
        <dt>Quantity</dt>
        <dd class="num">1</dd>
        <dt>Receipt to</dt>
        <dd>${session.customer_email ?? 'not given'}</dd>
        <dt>Total</dt>
        <dd class="num">${writtenAmount(session.amount_total, session.currency)}</dd>
      </dl>
      ${session.status === 'open' ? choices(session) : outcome(session)}
    </div>`,
  })

const choices = (session: WireSession): Html =>
  html`<form class="stack" method="post" action="/pay/${session.id}" aria-label="Ways to pay">
      <button class="main" name="with" value="accepted">Pay with a card that is accepted</button>
      <button name="with" value="declined">Pay with a card that is declined</button>
      <button name="with" value="later">Pay by bank debit, which arrives later</button>
    </form>
    ${
      session.cancel_url === null
        ? null
        : html`<p><a href="${session.cancel_url}">Go back without paying</a></p>`
    }`

const outcome = (session: WireSession): Html =>
  session.status === 'expired'
    ? html`<p>This payment has expired. Start again from the portal.</p>`
    : html`<p>This payment is complete. <a href="${returnAddress(session)}">Go back to the portal</a></p>`

const unknownPage = page({
  title: 'No such payment',
  banner,
  status: 404,
  body: html`<p>
    This local stand-in keeps payments in memory and forgets them when it stops. Start the purchase again from
    the portal.
  </p>`,
})
