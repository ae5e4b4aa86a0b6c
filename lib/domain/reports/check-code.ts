import type { Ids } from '@/lib/ports/ids'

/** Sixteen characters in groups of four, taken from the random part of a new identifier: 80 bits. */
export function newCheckCode(ids: Ids): string {
  return ids.newId().slice(-16).match(/.{4}/g)?.join('-') ?? ''
}

/** The code as it is stored, however it was typed or pasted. */
export function normaliseCheckCode(text: string): string {
  const letters = text
    .toLowerCase()
    .replaceAll('o', '0')
    .replace(/[il]/g, '1')
    .replace(/[^0-9a-z]/g, '')
  return letters.match(/.{1,4}/g)?.join('-') ?? ''
}
