import { expect, it } from 'vitest'

import type { Figure } from '@/lib/core/figure/figure'
import { valueTables } from '@/lib/figure/value-table'

const x = Array.from({ length: 1000 }, (_, index) => index * 1e-9)
const figure: Figure = {
  id: 'f',
  title: 'Ring',
  description: 'A ring.',
  x: { label: 'Time', unit: 's', scale: 'linear' },
  y: { label: 'Level', unit: 'V', scale: 'linear' },
  series: [
    {
      id: 'a',
      label: 'Node',
      role: 'measured',
      x,
      y: x.map((_, index) => (index === 334 ? 20.5 : index === 778 ? -3 : 12)),
    },
  ],
  marks: [],
}

it('always shows the highest and the lowest point, and says how many there are', () => {
  const [table] = valueTables(figure, 10)
  expect(table?.total).toBe(1000)
  expect(table?.rows).toHaveLength(12)
  expect(table?.rows.find((row) => row.note === 'highest')).toMatchObject({
    index: 334,
    x: { number: '334.0', unit: 'ns' },
    y: { number: '20.50', unit: 'V' },
  })
  expect(table?.rows.find((row) => row.note === 'lowest')?.y.number).toBe('−3.00')
})

it('shows all points of a short series, in order', () => {
  const short: Figure = {
    ...figure,
    series: [{ id: 's', label: 'S', role: 'computed', x: [0, 1, 2], y: [5, 4, NaN] }],
  }
  expect(valueTables(short)[0]?.rows.map((row) => row.y.number)).toEqual(['5.000', '4.000', '–'])
})

it('gives a table without rows for a series without points', () => {
  const empty: Figure = { ...figure, series: [{ id: 's', label: 'S', role: 'computed', x: [], y: [] }] }
  expect(valueTables(empty)[0]?.rows).toEqual([])
})
