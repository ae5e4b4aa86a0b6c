import { randomUUID } from 'node:crypto'

import { z } from 'zod'

const address = z
  .string()
  .regex(/^(?:[^<>,"\r\n]* <[^\s<>,"@]+@[^\s<>,"@]+>|[^\s<>,"@]+@[^\s<>,"@]+)$/, 'is not one address')

export const messageInput = z.looseObject({
  from: address,
  to: z.union([address.transform((one) => [one]), z.array(address).min(1).max(50)]),
  subject: z.string().regex(/^[^\r\n]+$/, 'must be one line'),
  html: z.string().optional(),
  text: z.string().optional(),
})

export type FakeMessage = {
  readonly id: string
  readonly createdAt: string
  readonly from: string
  readonly to: readonly string[]
  readonly subject: string
  readonly html: string
  readonly text: string
}

export const messageOf = (input: z.infer<typeof messageInput>): FakeMessage => ({
  id: randomUUID(),
  createdAt: new Date().toISOString(),
  from: input.from,
  to: input.to,
  subject: input.subject,
  html: input.html ?? '',
  text: input.text ?? '',
})

/** Messages to an address that contains the words asked for, newest first. */
export const messagesTo = (messages: readonly FakeMessage[], part: string): readonly FakeMessage[] =>
  messages
    .filter(({ to }) => to.some((one) => one.toLowerCase().includes(part.trim().toLowerCase())))
    .reverse()
