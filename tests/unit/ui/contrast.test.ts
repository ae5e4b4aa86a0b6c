import { readFileSync } from 'node:fs'

import { describe, expect, it } from 'vitest'

const tokens = new Map(
  [
    ...readFileSync('app/styles/tokens.css', 'utf8').matchAll(
      /--([\w-]+): light-dark\((#[0-9a-f]{6}), (#[0-9a-f]{6})\)/g,
    ),
  ].map(([, name = '', light = '', dark = '']) => [name, { light, dark }] as const),
)

/** Relative luminance and contrast ratio as WCAG 2.2 defines them. */
const luminance = (hex: string): number => {
  const [red = 0, green = 0, blue = 0] = [1, 3, 5]
    .map((start) => parseInt(hex.slice(start, start + 2), 16) / 255)
    .map((share) => (share <= 0.04045 ? share / 12.92 : ((share + 0.055) / 1.055) ** 2.4))
  return 0.2126 * red + 0.7152 * green + 0.0722 * blue
}

const contrast = (a: string, b: string): number => {
  const [high = 0, low = 0] = [luminance(a), luminance(b)].sort((left, right) => right - left)
  return (high + 0.05) / (low + 0.05)
}

const ratio = (front: string, back: string, theme: 'light' | 'dark'): number => {
  const pair = [tokens.get(front), tokens.get(back)]
  const [a, b] = pair.map((token) => token?.[theme])
  if (!a || !b) throw new Error(`No token ${front} or ${back}`)
  return contrast(a, b)
}

const grounds = ['ground', 'sheet', 'sunk', 'copper-wash', 'verified-wash', 'over-limit-wash']
const texts = ['ink', 'ink-soft', 'ink-faint', 'copper', 'copper-strong', 'verified', 'over-limit']

describe.each(['light', 'dark'] as const)('contrast in the %s theme (WCAG 2.2 AA)', (theme) => {
  it.each(grounds.flatMap((ground) => texts.map((text) => [text, ground] as const)))(
    'text in %s on %s reaches 4.5',
    (text, ground) => {
      expect(ratio(text, ground, theme)).toBeGreaterThanOrEqual(4.5)
    },
  )

  it.each(grounds)('frames of controls and the focus ring on %s reach 3', (ground) => {
    expect(ratio('rule-strong', ground, theme)).toBeGreaterThanOrEqual(3)
    expect(ratio('focus', ground, theme)).toBeGreaterThanOrEqual(3)
  })

  it('the words on a copper button reach 4.5, at rest and under the pointer', () => {
    expect(ratio('on-copper', 'copper', theme)).toBeGreaterThanOrEqual(4.5)
    expect(ratio('on-copper', 'copper-strong', theme)).toBeGreaterThanOrEqual(4.5)
  })
})
