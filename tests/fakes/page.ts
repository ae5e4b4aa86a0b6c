import { readFile } from 'node:fs/promises'
import path from 'node:path'

import { html, type Html } from '@/emails/html'

import type { FakeReply, Route } from './http-server'
import { pageStyle } from './page-style'

type Page = {
  readonly title: string
  readonly banner: string
  readonly body: Html
  readonly isWide?: boolean
  readonly status?: number
}

export const htmlReply = (status: number, markup: string, policy: string): FakeReply => ({
  status,
  headers: {
    'content-type': 'text/html; charset=utf-8',
    'content-security-policy': policy,
    'cache-control': 'no-store',
    'referrer-policy': 'no-referrer',
  },
  body: markup,
})

/** A page of a fake, which says on top that it is one. */
export const page = ({ title, banner, body, isWide = false, status = 200 }: Page): FakeReply =>
  htmlReply(
    status,
    html`<!doctype html>
      <html lang="en">
        <head>
          <meta charset="utf-8" />
          <meta name="viewport" content="width=device-width, initial-scale=1" />
          <title>${title}</title>
          <link rel="stylesheet" href="/style.css" />
          <link rel="icon" href="data:," />
        </head>
        <body>
          <header class="banner">${banner}</header>
          <main class="${isWide ? 'wide' : ''}">
            <h1>${title}</h1>
            ${body}
          </main>
        </body>
      </html>`.markup,
    "default-src 'none'; style-src 'self'; font-src 'self'; frame-src 'self'; img-src data:; base-uri 'none'",
  )

const fontFolder = path.resolve(import.meta.dirname, '../../public/fonts')

export const pageAssets: readonly Route[] = [
  {
    method: 'GET',
    path: /^\/style\.css$/,
    answer: () => ({ status: 200, headers: { 'content-type': 'text/css' }, body: pageStyle }),
  },
  {
    method: 'GET',
    path: /^\/fonts\/([A-Za-z0-9]+-[A-Za-z]+\.woff2)$/,
    answer: async (_request, name = '') => ({
      status: 200,
      headers: { 'content-type': 'font/woff2' },
      body: await readFile(path.join(fontFolder, name)),
    }),
  },
]
