import { z } from 'zod'

const atom = String.raw`[A-Za-z0-9!#$%&'*+/=?^_\x60{|}~-]+`
const label = '[A-Za-z0-9](?:[A-Za-z0-9-]*[A-Za-z0-9])?'
const plainAddress = new RegExp(String.raw`^${atom}(?:\.${atom})*@${label}(?:\.${label})+$`)

/**
 * The one spelling in which an address is stored, compared and mailed: NFKC-normalised, lower case, plain ASCII with a
 * single "@". Quoted parts, lists, comments and line breaks are refused, so a message can go to no second address.
 * @returns null when the text is not such an address.
 */
export function normaliseEmail(text: string): string | null {
  const trimmed = text.trim()
  const normal = trimmed.normalize('NFKC')
  // A look-alike that only becomes plain by normalisation (full-width "@") is refused, not repaired.
  if (normal !== trimmed || normal.length > 254 || !plainAddress.test(normal)) return null
  return normal.toLowerCase()
}

export const emailField = z.string({ error: 'An e-mail address is needed.' }).transform((text, context) => {
  const email = normaliseEmail(text)
  if (email !== null) return email
  context.addIssue({
    code: 'custom',
    message: 'Enter one plain e-mail address, such as name@company.example.',
  })
  return z.NEVER
})
