import 'server-only'
import { createHash } from 'node:crypto'

/** What is stored of a random secret (link token, session, browser): reading the database gives none of them away. */
export function hashSecret(secret: string): string {
  return createHash('sha256').update(secret).digest('base64url')
}
