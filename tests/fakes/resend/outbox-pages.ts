import { html, type Html } from '@/emails/html'

import { type FakeReply } from '../http-server'
import { htmlReply, page } from '../page'
import type { FakeMessage } from './messages'

const banner = 'Local stand-in for the mail service – nothing leaves this machine'

export const outboxPage = (messages: readonly FakeMessage[], recipient: string): FakeReply =>
  page({
    title: 'Mail sent so far',
    banner,
    isWide: true,
    body: html`<form class="row" method="get" action="/" role="search">
        <label>Recipient contains <input name="to" type="search" value="${recipient}" /></label>
        <button>Search</button>
      </form>
      <h2>${messages.length === 1 ? '1 message' : `${messages.length} messages`}</h2>
      ${
        messages.length === 0
          ? html`<p class="soft">
              ${recipient === '' ? 'None yet: invite somebody in the portal.' : 'None to such an address.'}
            </p>`
          : html`<div class="scroll" tabindex="0" role="region" aria-label="Messages">
              <table>
                <thead>
                  <tr>
                    <th scope="col">Sent</th>
                    <th scope="col">To</th>
                    <th scope="col">Subject</th>
                  </tr>
                </thead>
                <tbody>
                  ${messages.map(row)}
                </tbody>
              </table>
            </div>`
      }`,
  })

const row = (message: FakeMessage): Html =>
  html`<tr>
    <td class="code">${message.createdAt.slice(0, 19).replace('T', ' ')}</td>
    <td>${message.to.join(', ')}</td>
    <td><a href="/messages/${message.id}">${message.subject}</a></td>
  </tr>`

export const messagePage = (message: FakeMessage): FakeReply =>
  page({
    title: message.subject,
    banner,
    isWide: true,
    body: html`<dl class="plain">
        <dt>From</dt>
        <dd>${message.from}</dd>
        <dt>To</dt>
        <dd>${message.to.join(', ')}</dd>
        <dt>Sent</dt>
        <dd class="num">${message.createdAt}</dd>
      </dl>
      <h2>As plain text</h2>
      <pre>${linked(message.text)}</pre>
      <h2>As HTML</h2>
      <iframe
        title="The message as HTML"
        src="/messages/${message.id}/html"
        sandbox="allow-popups allow-popups-to-escape-sandbox"
      ></iframe>
      <p><a href="/">All messages</a></p>`,
  })

/** The addresses in a text become links, so that a reader follows them with one click. */
const linked = (text: string): readonly Html[] =>
  text
    .split(/(https?:\/\/\S+)/)
    .map((part, index) => (index % 2 === 1 ? html`<a href="${part}">${part}</a>` : html`${part}`))

/** The mail's own HTML, which may run nothing and load nothing; its links open beside it. */
export const messageHtml = (message: FakeMessage): FakeReply =>
  htmlReply(
    200,
    message.html.replace('<head>', '<head><base target="_blank">'),
    "default-src 'none'; style-src 'unsafe-inline'; sandbox allow-popups allow-popups-to-escape-sandbox",
  )

export const noSuchMessage = page({
  title: 'No such message',
  banner,
  status: 404,
  body: html`<p>
    This local stand-in keeps mail in memory and forgets it when it stops. <a href="/">All messages</a>
  </p>`,
})
