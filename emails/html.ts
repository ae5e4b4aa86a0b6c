/** Markup of ours, kept apart from text of others by its type. */
export type Html = { readonly markup: string }

type Insertion = string | number | Html | readonly Html[] | null

const entities: Readonly<Record<string, string>> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
}

export const escapeHtml = (text: string): string => text.replace(/[&<>"']/g, (sign) => entities[sign] ?? sign)

/** Builds markup from a template; everything inserted is escaped unless it is markup itself. */
export const html = (parts: TemplateStringsArray, ...insertions: readonly Insertion[]): Html => ({
  markup: parts.map((part, index) => part + markupOf(insertions[index] ?? null)).join(''),
})

function markupOf(insertion: Insertion): string {
  if (insertion === null) return ''
  if (typeof insertion === 'string') return escapeHtml(insertion)
  if (typeof insertion === 'number') return String(insertion)
  return 'markup' in insertion ? insertion.markup : insertion.map((one) => one.markup).join('')
}
