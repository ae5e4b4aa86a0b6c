/** A product |m f₁ + n f₂| of two mixing frequencies, with the signs that make it positive. */
export type MixingProduct = {
  readonly frequency: number
  /** |m| + |n|; order 1 are the two frequencies themselves. */
  readonly order: number
  readonly m: number
  readonly n: number
}

/**
 * Every product m f₁ + n f₂ > 0 with |m| + |n| ≤ `mostOrder` from `lowest` to `highest`, both included, by rising
 * frequency; Hz. All whole-number pairs are tried, so two pairs that fall on one frequency are both listed.
 */
export function mixingProducts(
  f1: number,
  f2: number,
  mostOrder: number,
  lowest: number,
  highest: number,
): readonly MixingProduct[] {
  const products: MixingProduct[] = []
  for (let m = -mostOrder; m <= mostOrder; m += 1) {
    const most = mostOrder - Math.abs(m)
    for (let n = -most; n <= most; n += 1) {
      const frequency = m * f1 + n * f2
      if (!(frequency > 0) || frequency < lowest || frequency > highest) continue
      products.push({ frequency, order: Math.abs(m) + Math.abs(n), m, n })
    }
  }
  return products.sort((a, b) => a.frequency - b.frequency || a.order - b.order || a.m - b.m)
}

/** A band to be kept clear: of a radio, of a sensitive circuit; Hz. */
export type NamedBand = { readonly name: string; readonly from: number; readonly to: number }

/** The bands in which a frequency lies, both edges included. */
export const bandsAt = (frequency: number, bands: readonly NamedBand[]): readonly NamedBand[] =>
  bands.filter(({ from, to }) => frequency >= from && frequency <= to)
