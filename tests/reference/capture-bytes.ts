import { readFileSync } from 'node:fs'
import path from 'node:path'

import { twoMillionCapture } from '../fixtures/two-million-capture'

const folder = new URL('./captures/', import.meta.url)

/** The bytes of a capture by its name, with or without the folder that a case puts before it. */
export function captureBytes(file: string): Uint8Array {
  const name = path.basename(file)
  if (name === 'o13_two_million.csv') return twoMillionCapture()
  return new Uint8Array(readFileSync(new URL(name, folder)))
}
