import { describe, expect, it } from 'vitest'

import { parseTolerance } from '@/lib/core/uncertainty/tolerance'

describe('a tolerance as it is written', () => {
  it.each([
    ['5 %', 470e-12, 'F', 23.5e-12, 'rectangular'],
    ['±5%', 470e-12, 'F', 23.5e-12, 'rectangular'],
    ['+/- 5 %', -10, 'V', 0.5, 'rectangular'],
    ['50 ppm', 16e6, 'Hz', 800, 'rectangular'],
    ['0,2 pF', 470e-12, 'F', 0.2e-12, 'rectangular'],
    ['1 % k=2', 12, 'V', 0.12, 'normal'],
    ['3 mV (k = 2)', 12, 'V', 0.003, 'normal'],
    ['2 %', 40, '%', 2, 'rectangular'],
    ['0.05', 0.3, '', 0.05, 'rectangular'],
  ] as const)('%s of %d %s', (text, value, unit, halfWidth, distribution) => {
    const read = parseTolerance(text, value, unit)
    expect(read).toMatchObject({ ok: true, value: { distribution } })
    expect(read.ok ? read.value.halfWidth / halfWidth : 0).toBeCloseTo(1, 12)
  })

  it.each(['', '%', '-5 %', '5 V', 'five', '5 %%', '1e999 %'])(
    'does not take “%s” for a capacitor',
    (text) => {
      expect(parseTolerance(text, 1e-9, 'F')).toMatchObject({ ok: false })
    },
  )

  it('says what is expected', () => {
    expect(parseTolerance('5 V', 1e-9, 'F')).toEqual({
      ok: false,
      error: '“5 V” is not a tolerance; enter a part such as 5 % or 50 ppm, or a value in F.',
    })
  })
})
