import { defineMethod, noSolution, type ChoiceTable } from '../method/method'
import { main } from '../method/result-value'
import { err, ok } from '../result'
import { bandsAt, mixingProducts, type MixingProduct, type NamedBand } from './intermodulation'

const frequency = { symbol: 'f', unit: 'Hz', atLeast: 1, atMost: 1e12 } as const

/** The sums and differences of several sources, and the bands in which they land. */
export const mixingProductsMethod = defineMethod({
  id: 'mixing-products',
  version: 1,
  title: 'Mixing products of sources',
  purpose:
    'Lists the sums and differences of the multiples of two or more frequencies, and the bands they land in.',
  inputs: {
    sources: {
      kind: 'table',
      label: 'Sources',
      symbol: 'f₁, f₂',
      help: 'Name and frequency, a line each; every two of them are mixed',
      isRequired: true,
      columns: {
        name: { label: 'Name', symbol: '', unit: 'text' },
        frequency: { label: 'Frequency', ...frequency },
      },
      leastRows: 2,
      mostRows: 12,
    },
    bands: {
      kind: 'table',
      label: 'Bands to keep clear',
      symbol: 'f',
      help: 'Name, lower and upper edge, a line each',
      isRequired: true,
      columns: {
        name: { label: 'Name', symbol: '', unit: 'text' },
        from: { label: 'From', ...frequency },
        to: { label: 'To', ...frequency },
      },
      leastRows: 1,
      mostRows: 100,
    },
    order: {
      kind: 'choice',
      label: 'Up to order',
      symbol: 'N',
      help: 'Sum of both multiples; high orders are weak',
      isRequired: true,
      options: { 2: '2', 3: '3', 4: '4', 5: '5', 6: '6', 7: '7' },
    },
  },
  formulas: ['f = |m f₁ + n f₂|,   |m| + |n| ≤ N'],
  notes: [
    'Products arise only where something is not linear: a rectifier, a protection diode, a saturated core, an overloaded input of the analyser itself. Put 6 dB of attenuation before the analyser: products made inside it fall by more than 6 dB.',
    'Odd orders that differ by one, such as 2f₁ − f₂, lie near the sources and cannot be filtered away.',
    'Which products are strong the arithmetic does not say.',
  ],
  cautions: [],
  sources: [
    { citation: 'Enumeration of all pairs of whole numbers', standing: 'derived here, checked from outside' },
    { citation: 'Attenuator test for products made in the analyser', standing: 'common practice, no source' },
  ],
  example: {
    sources: 'buck; 2.1 MHz\nclock; 25 MHz',
    bands: 'FM broadcast; 87.5 MHz; 108 MHz\nAir; 118 MHz; 137 MHz',
    order: '5',
  },
  compute: ({ sources, bands, order }) => {
    const reversed = bands.find(({ from, to }) => from > to)
    if (reversed) {
      return err(noSolution(`The band “${reversed.name}” ends below its beginning.`, 'bands'))
    }
    const landings = landingsOf(sources, bands, Number(order))
    const clear = bands.filter(({ name }) => !landings.some(({ band }) => band.name === name))
    return ok({
      results: [
        main('landings', 'Products in these bands', '', '', landings.length),
        main('clear', 'Bands without a product', '', '', clear.length),
        ...(landings[0]
          ? [main('lowestOrder', 'Lowest order that lands', 'N', '', landings[0].product.order)]
          : []),
      ],
      choices: [landingTable(landings)],
      validity: [
        {
          passed: true,
          sentence:
            'Frequencies are taken as exact: add the tolerances of the sources to the edges of a band.',
        },
      ],
      figures: [],
    })
  },
  // Counts have no interval.
  computeResults: () => ok([]),
})

type NamedSource = { readonly name: string; readonly frequency: number }

type Landing = {
  readonly band: NamedBand
  readonly product: MixingProduct
  readonly first: NamedSource
  readonly second: NamedSource
}

/** Products of both sources of a pair, not the multiples of one of them; the lowest orders first. */
function landingsOf(
  sources: readonly NamedSource[],
  bands: readonly NamedBand[],
  order: number,
): readonly Landing[] {
  const lowest = Math.min(...bands.map(({ from }) => from))
  const highest = Math.max(...bands.map(({ to }) => to))
  const pairs = sources.flatMap((first, index) =>
    sources.slice(index + 1).map((second) => ({ first, second })),
  )
  return pairs
    .flatMap(({ first, second }) =>
      mixingProducts(first.frequency, second.frequency, order, lowest, highest)
        .filter(({ m, n }) => m !== 0 && n !== 0)
        .flatMap((product) =>
          bandsAt(product.frequency, bands).map((band) => ({ band, product, first, second })),
        ),
    )
    .toSorted((a, b) => a.product.order - b.product.order || a.product.frequency - b.product.frequency)
}

/** Rows of a table for people; all products are counted. */
const mostRows = 200

const landingTable = (landings: readonly Landing[]): ChoiceTable => ({
  title:
    landings.length > mostRows
      ? `The first ${mostRows} of ${landings.length} products`
      : 'Products in the bands',
  columns: [
    { label: 'Band', unit: 'text' },
    { label: 'Product', unit: 'text' },
    { label: 'Order', unit: '' },
    { label: 'Frequency', unit: 'Hz' },
  ],
  rows: landings
    .slice(0, mostRows)
    .map(({ band, product, first, second }) => [
      band.name,
      productText(product, first.name, second.name),
      product.order,
      product.frequency,
    ]),
})

/** "2·buck − 1·clock", the positive part first. */
function productText({ m, n }: MixingProduct, first: string, second: string): string {
  if (m < 0) return `${n}·${second} − ${-m}·${first}`
  return `${m}·${first} ${n < 0 ? '−' : '+'} ${Math.abs(n)}·${second}`
}
