/** Who writes: shown at the head and the foot of every message. */
export type Practice = { readonly name: string; readonly address: string }

export type RenderedMail = { readonly subject: string; readonly html: string; readonly text: string }

export type Fact = {
  readonly label: string
  readonly value: string
  /** Figures line up in the monospaced face; the total of a column stands out. */
  readonly set: 'word' | 'figure' | 'total'
}

export type Block =
  | { readonly kind: 'paragraph'; readonly text: string }
  | { readonly kind: 'link'; readonly label: string; readonly href: string }
  | { readonly kind: 'facts'; readonly facts: readonly Fact[] }
  | { readonly kind: 'note'; readonly text: string }

/** A message before it becomes HTML and plain text, which therefore always say the same. */
export type MailContent = {
  readonly subject: string
  readonly heading: string
  readonly blocks: readonly Block[]
  /** Why this person receives it: a sentence for the foot. */
  readonly reason: string
}

export const paragraph = (text: string): Block => ({ kind: 'paragraph', text })
export const link = (label: string, href: string): Block => ({ kind: 'link', label, href })
export const word = (label: string, value: string): Fact => ({ label, value, set: 'word' })
export const figure = (label: string, value: string): Fact => ({ label, value, set: 'figure' })
export const total = (label: string, value: string): Fact => ({ label, value, set: 'total' })
export const facts = (...rows: readonly Fact[]): Block => ({ kind: 'facts', facts: rows })
export const note = (text: string): Block => ({ kind: 'note', text })
