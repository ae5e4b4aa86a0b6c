import { describe, expect, it } from 'vitest'

import type { TableInput } from '@/lib/core/method/input-definition'
import { readTable } from '@/lib/core/method/read-table'
import { writtenValue } from '@/lib/core/method/written-value'

const sources: TableInput = {
  kind: 'table',
  label: 'Sources',
  symbol: 'f',
  help: 'Oscillators of the product',
  isRequired: true,
  columns: {
    name: { label: 'Name', symbol: '', unit: 'text' },
    frequency: { label: 'Frequency', symbol: 'f', unit: 'Hz', above: 0 },
    tolerance: { label: 'Tolerance', symbol: 'δ', unit: 'ppm', atLeast: 0, fallback: 100 },
  },
  leastRows: 1,
  mostRows: 3,
}

const buck = { name: 'Buck', frequency: 420e3, tolerance: 50 }

describe('rows of a table', () => {
  it.each([
    ['commas', 'Buck, 420 kHz, 50 ppm'],
    ['semicolons, which leave the comma to the decimals', 'Buck; 0,42 MHz; 50'],
    ['tabs', 'Buck\t420k\t50'],
    ['spaces', 'Buck 420k 50'],
    ['empty lines between', '\n\nBuck,420k,50\r\n\r\n'],
  ])('are read from text with %s', (_, text) => {
    expect(readTable(sources, text)).toEqual({ ok: true, value: [buck] })
  })

  it('are read from arrays and from objects', () => {
    expect(readTable(sources, [['Buck', 420e3, 50], buck])).toEqual({ ok: true, value: [buck, buck] })
  })

  it('take the fallback for a cell that is left out', () => {
    expect(readTable(sources, 'Buck, 420k')).toEqual({ ok: true, value: [{ ...buck, tolerance: 100 }] })
  })

  it.each([
    ['', 'Sources: at least 1 rows are needed, a line each.'],
    ['a,1\nb,2\nc,3\nd,4', 'Sources: at most 3 rows can be taken.'],
    [
      'Buck, 420k\nClock, 5 nH',
      'Sources, row 2: “5 nH” is an inductance; a frequency in Hz is expected here',
    ],
    ['Buck, -1', 'Sources, row 1: Frequency must be more than 0\u00a0Hz.'],
    ['Buck', 'Sources, row 1: Frequency is missing.'],
    ['Buck, 1, 2, 3', 'Sources, row 1: 3 cells (Name, Frequency, Tolerance) are wanted; there are 4 cells.'],
  ])('of “%s” are refused with the row and the column', (text, sentence) => {
    const read = readTable(sources, text)
    expect(!read.ok && read.error).toContain(sentence)
  })

  it('take no column that is not theirs', () => {
    expect(readTable(sources, [{ ...buck, colour: 1 }])).toMatchObject({ ok: false })
  })

  it('are written with every digit', () => {
    expect(writtenValue(sources, [buck])).toBe('Buck; 420\u00a0kHz; 50\u00a0ppm')
  })
})
