import type { RawBuilder } from 'kysely'

/** One step of the schema. A migration that has been released is never edited: add another. */
export type Migration = { readonly name: string; readonly up: readonly RawBuilder<unknown>[] }
