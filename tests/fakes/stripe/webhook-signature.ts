import { createHmac } from 'node:crypto'

/** `t=<seconds>,v1=<HMAC-SHA-256 of "t.body">`, made without the SDK so that the two check each other. */
export function signatureHeader(body: string, secret: string, signedAt: number): string {
  const seconds = Math.floor(signedAt / 1000)
  const code = createHmac('sha256', secret).update(`${seconds}.${body}`).digest('hex')
  return `t=${seconds},v1=${code}`
}
