import type { Result } from '@/lib/core/result'

export type StoredFile = { readonly sizeBytes: number; readonly sha256: string }

export type StoreError =
  | { readonly code: 'too_large'; readonly limitBytes: number }
  | { readonly code: 'interrupted' }
  | { readonly code: 'no_space' }

/** Keeps bytes under identifiers of ours; a name that a person chose is never part of a path. */
export type FileStore = {
  /** Streams a body to disk, hashing while it writes; the file is visible only when whole and synchronised. */
  readonly write: (
    id: string,
    body: ReadableStream<Uint8Array>,
    limitBytes: number,
  ) => Promise<Result<StoredFile, StoreError>>
  readonly writeBytes: (id: string, bytes: Uint8Array) => Promise<StoredFile>
  readonly read: (id: string) => Promise<Uint8Array>
  /** `length` bytes from `start`; fewer where the file ends. */
  readonly readPart: (id: string, start: number, length: number) => Promise<Uint8Array>
  /** A stream over part of a file, opened when first pulled and closed when done or cancelled. */
  readonly stream: (id: string) => ReadableStream<Uint8Array>
  readonly pathOf: (id: string) => string
  readonly remove: (id: string) => Promise<void>
}
