import { renderToStaticMarkup } from 'react-dom/server'
import { expect, it } from 'vitest'

import { FigureSvg } from '@/components/charts/figure-svg'
import type { Figure } from '@/lib/core/figure/figure'

const figure: Figure = {
  id: 'step',
  title: 'Step response',
  description: 'Overshoot 2.9 V.',
  x: { label: 'Time', unit: 's', scale: 'linear' },
  y: { label: 'Level', unit: 'V', scale: 'linear' },
  series: [{ id: 'a', label: 'Node', role: 'computed', x: [0, 1e-9, 2e-9], y: [0, 15, 12] }],
  marks: [{ kind: 'point', x: 1e-9, y: 15, label: 'Peak' }],
}

const markup = renderToStaticMarkup(<FigureSvg figure={figure} />)

it('is an image with a title and a description, each id used once', () => {
  expect(markup.match(/role="img"/g)).toHaveLength(2)
  const ids = [...markup.matchAll(/ id="([^"]+)"/g)].map(([, id]) => id)
  expect(new Set(ids).size).toBe(ids.length)
  for (const [, named = ''] of markup.matchAll(/aria-labelledby="([^"]+)"/g)) {
    for (const id of named.split(' ')) expect(ids).toContain(id)
  }
})

it('gives its values as a table too', () => {
  expect(markup).toContain('<table')
  expect(markup).toContain('15.00')
})

it('takes its colours from classes, never from inline styles', () => {
  expect(markup).not.toContain('style=')
  expect(markup).toContain('figure-computed')
})
