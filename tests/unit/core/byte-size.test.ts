import { describe, expect, it } from 'vitest'

import { byteSizeInWords } from '@/lib/core/byte-size'

describe('a number of bytes in words', () => {
  it.each([
    [0, '0 bytes'],
    [1, '1 byte'],
    [1023, '1023 bytes'],
    [1024, '1.00 KiB'],
    [1536, '1.50 KiB'],
    [1024 * 1024 * 29.9, '29.9 MiB'],
    [1024 ** 3, '1.00 GiB'],
    [500 * 1024 ** 3, '500 GiB'],
  ])('%d is %s', (bytes, words) => {
    expect(byteSizeInWords(bytes).replace('\u00a0', ' ')).toBe(words)
  })
})
