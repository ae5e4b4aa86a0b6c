import { renderToStaticMarkup } from 'react-dom/server'
import { expect, it } from 'vitest'

import { DataTable } from '@/components/ui/data-table'
import type { Figures } from '@/components/ui/decimal-cell'

type Row = { readonly name: string; readonly value: Figures | null }

const rows: Row[] = [
  { name: 'Ring', value: { number: '180.3', unit: 'MHz' } },
  { name: 'Loss', value: { number: '0.354', unit: 'W' } },
  { name: 'Resistor', value: { number: '10', unit: 'Ω' } },
  { name: 'Open', value: null },
]

const render = (shown: readonly Row[]) =>
  renderToStaticMarkup(
    <DataTable
      caption="Values"
      columns={[
        { key: 'name', header: 'Quantity', isRowHeader: true, cell: (row) => row.name },
        { key: 'value', kind: 'number', header: 'Value', value: (row) => row.value },
      ]}
      rows={shown}
      rowKey={(row) => row.name}
      empty={<p>Add a value.</p>}
    />,
  )

it('pads numbers so that their decimal signs stand one below the other at the right edge', () => {
  const cells = [...render(rows).matchAll(/<td[^>]*><span class="num">(.*?)<\/td>/g)].map(([, cell = '']) =>
    cell.replace(/<[^>]*>/g, ''),
  )
  const afterPoint = cells.map((cell) => {
    const digits = /^−?\d+/.exec(cell)?.[0].length ?? 0
    return cell.length - digits
  })
  expect(cells).toHaveLength(3)
  expect(new Set(afterPoint).size).toBe(1)
})

it('names its scrolling region, its columns and its rows', () => {
  const markup = render(rows)
  expect(markup).toMatch(/role="region" aria-label="Values" tabindex="0"/i)
  expect(markup.match(/scope="col"/g)).toHaveLength(2)
  expect(markup.match(/scope="row"/g)).toHaveLength(4)
})

it('says the next step instead of showing no rows', () => {
  expect(render([])).toBe('<p>Add a value.</p>')
})
