import { expect, type APIRequestContext } from '@playwright/test'
import { z } from 'zod'

/** Where the local mail stand-in listens while the browser tests run. */
export const outboxAddress = 'http://127.0.0.1:4120'

const messages = z.array(z.object({ subject: z.string(), text: z.string() }))

/** Waits for a message to somebody whose text holds the given words, and returns its text. */
export async function mailTo(request: APIRequestContext, to: string, words: RegExp): Promise<string> {
  let found: string | undefined
  await expect
    .poll(async () => {
      const answer = await request.get(`${outboxAddress}/api/messages?to=${encodeURIComponent(to)}`)
      const list = messages.parse(await answer.json())
      found = list.map(({ subject, text }) => `${subject}\n${text}`).find((text) => words.test(text))
      return found
    })
    .toBeDefined()
  return found ?? ''
}

/** The first address of the portal in a mail that begins with the given path. */
export function linkIn(text: string, path: string): string {
  const link = new RegExp(`http://localhost:\\d+${path}[^\\s)>"]+`).exec(text)?.[0]
  if (!link) throw new Error(`No link to ${path} in: ${text}`)
  return link
}
