import { html, type Html } from '@/emails/html'

import type { FakeReply } from '../http-server'
import { page } from '../page'
import type { Account } from './account'
import type { EventRecord, Webhooks } from './webhooks'
import type { WireSession } from './wire'
import { writtenAmount } from './written-amount'

export const troubleNames = {
  dropped: 'act, then drop the answer',
  half: 'act, then break off half-way',
  unreadable: 'act, then answer nonsense',
  slow: 'act, then answer after 30 s',
  busy: 'refuse with 429',
  broken: 'refuse with 500',
} as const

const orderNames = {
  as_they_happen: 'as they happen',
  newest_first: 'newest first',
  held: 'only by hand',
} as const

/** What the stand-in holds, and the levers that make it misbehave. */
export const panelPage = (account: Account, webhooks: Webhooks, troublesWaiting: number): FakeReply =>
  page({
    title: 'Payments stand-in',
    banner: 'Local stand-in for the payment service – no money moves',
    isWide: true,
    body: html`${levers(webhooks, troublesWaiting)}
      <h2>Payments</h2>
      ${
        account.store.sessions.size === 0
          ? html`<p class="soft">None yet: buy a block of hours in the portal.</p>`
          : table(
              ['Checkout', 'What', 'Total', 'State', 'Do'],
              newestFirst(account.store.sessions).map((session) => sessionRow(account, session)),
            )
      }
      <h2>Payouts to the bank</h2>
      <div>
        ${account.store.payouts.size} so far. ${action('/panel/pay-out', {}, 'Pay out what is there')}
      </div>
      <h2>Events</h2>
      ${
        webhooks.records.size === 0
          ? html`<p class="soft">None yet.</p>`
          : table(['Event', 'Type', 'Answers', 'Do'], newestFirst(webhooks.records).map(eventRow))
      }`,
  })

const levers = ({ mode }: Webhooks, troublesWaiting: number): Html =>
  html`<h2>The next answers to the portal</h2>
    <form class="row" method="post" action="/panel/trouble">
      <label>What happens ${select('kind', troubleNames, 'dropped')}</label>
      <label>How many answers <input name="count" type="number" min="1" max="20" value="1" /></label>
      <button>Plan it</button>
    </form>
    <p class="soft">
      ${troublesWaiting === 0 ? 'All answers are sound.' : `Answers still to be spoilt: ${troublesWaiting}.`}
    </p>
    <h2>Webhooks</h2>
    <form class="row" method="post" action="/panel/webhooks">
      <label>Order ${select('order', orderNames, mode.order)}</label>
      <label>
        Copies of each <input name="copies" type="number" min="1" max="50" value="${mode.copies}" />
      </label>
      <label>
        Delay in ms
        <input name="delay" type="number" min="0" max="600000" value="${mode.delayMilliseconds}" />
      </label>
      <button>Set</button>
    </form>`

const select = (name: string, names: Readonly<Record<string, string>>, chosen: string): Html =>
  html`<select name="${name}">
    ${Object.entries(names).map(
      ([value, label]) =>
        html`<option value="${value}" ${value === chosen ? { markup: 'selected' } : null}>${label}</option>`,
    )}
  </select>`

const action = (path: string, fields: Readonly<Record<string, string>>, label: string): Html =>
  html`<form method="post" action="${path}">
    ${Object.entries(fields).map(
      ([name, value]) => html`<input type="hidden" name="${name}" value="${value}" />`,
    )}
    <button>${label}</button>
  </form> `

const table = (heads: readonly string[], rows: readonly Html[]): Html =>
  html`<div class="scroll" tabindex="0" role="region" aria-label="${heads[0] ?? ''} table">
    <table>
      <thead>
        <tr>
          ${heads.map((head) => html`<th scope="col">${head}</th>`)}
        </tr>
      </thead>
      <tbody>
        ${rows}
      </tbody>
    </table>
  </div>`

function sessionRow(account: Account, session: WireSession): Html {
  const intent = account.store.intents.get(session.payment_intent ?? '')
  const act = (what: string, label: string) => action('/panel/session', { id: session.id, act: what }, label)
  const actions = [
    ...(session.status === 'open' ? [act('pay', 'Pay'), act('expire', 'Expire')] : []),
    ...(intent?.status === 'processing' ? [act('arrive', 'Money arrives'), act('fail', 'Debit fails')] : []),
    ...(intent?.status === 'succeeded' ? [act('refund', 'Return all'), act('dispute', 'Dispute')] : []),
  ]
  return html`<tr>
    <td class="code"><a href="/pay/${session.id}">${session.id}</a></td>
    <td>${account.store.titles.get(session.id) ?? ''}</td>
    <td class="num">${writtenAmount(session.amount_total, session.currency)}</td>
    <td>${session.status}, ${session.payment_status}</td>
    <td>${actions}</td>
  </tr>`
}

const eventRow = ({ event, attempts, isDelivered }: EventRecord): Html =>
  html`<tr>
    <td class="code">${event.id}</td>
    <td>${event.type}</td>
    <td>${isDelivered ? 'delivered' : 'not delivered'} (${attempts.join(', ') || 'not sent'})</td>
    <td>${action('/panel/redeliver', { id: event.id }, 'Send again')}</td>
  </tr>`

const newestFirst = <T>(map: ReadonlyMap<string, T>): readonly T[] => [...map.values()].reverse()
