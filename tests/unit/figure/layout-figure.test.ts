import { describe, expect, it } from 'vitest'

import type { Figure, Series } from '@/lib/core/figure/figure'
import type { FigureLayout, PlacedLabel, Rect } from '@/lib/figure/layout'
import { layoutFigure } from '@/lib/figure/layout-figure'
import { crossedWidth, overlaps } from '@/lib/figure/label-space'

const size = { width: 760, height: 400 }
const steps = Array.from({ length: 400 }, (_, index) => 30e6 * (1000 / 30) ** (index / 399))

const limit: Series = {
  id: 'limit',
  label: 'Limit',
  role: 'limit',
  x: [30e6, 230e6, 230e6, 1e9],
  y: [40, 40, 47, 47],
}

const measured: Series = {
  id: 'measured',
  label: 'Board as received',
  role: 'measured',
  x: steps,
  y: steps.map((f, index) => 24 + (index % 7) + 16 * Math.exp(-(((f - 180e6) / 9e6) ** 2))),
}

const scan: Figure = {
  id: 'scan',
  title: 'Scan',
  description: 'A peak at 180 MHz.',
  x: { label: 'Frequency', unit: 'Hz', scale: 'log', range: [30e6, 1e9] },
  y: { label: 'Level', unit: 'dBµV/m', scale: 'linear' },
  series: [limit, measured],
  marks: [
    { kind: 'point', x: 180e6, y: 44, label: '180 MHz' },
    { kind: 'level', y: 10, label: 'Noise floor' },
    { kind: 'instant', x: 420e6, label: '1000th harmonic' },
  ],
}

const labelsOf = (layout: FigureLayout): PlacedLabel[] =>
  [...layout.lines, ...layout.marks].flatMap(({ label }) => (label ? [label] : []))

const isWithin = (outer: Rect, inner: Rect) =>
  inner.x >= outer.x &&
  inner.y >= outer.y &&
  inner.x + inner.width <= outer.x + outer.width &&
  inner.y + inner.height <= outer.y + outer.height

const pointsOf = (path: string) =>
  path
    .split('M')
    .filter(Boolean)
    .map((run) => run.split('L').map((pair) => pair.split(',').map(Number)))
    .map((run) => run.map(([x = NaN, y = NaN]) => [x, y] as const))

describe('figure layout', () => {
  it('gives the same layout for the same figure', () => {
    expect(layoutFigure(scan, size)).toEqual(layoutFigure(structuredClone(scan), size))
  })

  it('maps the stated range of a logarithmic axis to the edges of the plot', () => {
    const { plot, x } = layoutFigure(scan, size)
    const at = (text: string) => x.ticks.find((tick) => tick.text === text)?.x
    expect(at('30\u00a0MHz')).toBeCloseTo(plot.x, 6)
    expect(at('1\u00a0GHz')).toBeCloseTo(plot.x + plot.width, 6)
    const share = Math.log(100 / 30) / Math.log(1000 / 30)
    expect(at('100\u00a0MHz')).toBeCloseTo(plot.x + share * plot.width, 6)
  })

  it('names a point, a level, an instant and both lines on the plot', () => {
    const layout = layoutFigure(scan, size)
    expect(
      labelsOf(layout)
        .map((label) => label.text)
        .sort(),
    ).toEqual(['1000th harmonic', '180 MHz', 'Board as received', 'Limit', 'Noise floor'].sort())
    expect(layout.key).toEqual([])
  })

  it('keeps labels inside the plot, apart from each other and off the lines', () => {
    const layout = layoutFigure(scan, size)
    const labels = labelsOf(layout)
    labels.forEach((label, index) => {
      expect(isWithin(layout.plot, label.box), label.text).toBe(true)
      for (const other of labels.slice(index + 1)) expect(overlaps(label.box, other.box)).toBe(false)
      for (const line of layout.lines) expect(crossedWidth(pointsOf(line.path), label.box)).toBe(0)
    })
  })

  it('keeps tick labels apart on a narrow plot', () => {
    const { x } = layoutFigure(scan, { width: 330, height: 300, textSize: 13 })
    const spans = x.ticks.map((tick) => {
      const half = (tick.text.length * 13 * 0.6) / 2
      return [tick.x - half, tick.x + half] as const
    })
    spans.slice(1).forEach((span, index) => expect(span[0]).toBeGreaterThan(spans[index]?.[1] ?? Infinity))
  })

  it('lists a name below the plot when there is no room for it', () => {
    const crowd = Array.from({ length: 40 }, (_, index) => ({
      ...limit,
      id: `l${index}`,
      label: `Limit ${index}`,
    }))
    const layout = layoutFigure({ ...scan, series: crowd }, size)
    const named = layout.lines.filter((line) => line.label).length
    expect(layout.key.length).toBeGreaterThan(0)
    expect(named + layout.key.filter((entry) => entry.role === 'limit').length).toBe(40)
  })

  it('names a line where no other runs beside it', () => {
    const x = Array.from({ length: 101 }, (_, index) => index)
    const apart = (offset: number) => x.map((value) => (value < 50 ? offset : offset * 0.02))
    const layout = layoutFigure(
      {
        ...scan,
        x: { label: 'Time', unit: 's', scale: 'linear' },
        series: [
          { id: 'a', label: 'Before', role: 'measured', x, y: apart(40) },
          { id: 'b', label: 'After', role: 'measured', x, y: apart(10) },
        ],
        marks: [],
      },
      size,
    )
    const middle = layout.plot.x + layout.plot.width / 2
    for (const line of layout.lines) expect(line.label?.x).toBeLessThan(middle)
  })
})

describe('figure layout with data that cannot all be drawn', () => {
  it('breaks a line at what is not a number, and below zero on a logarithmic axis', () => {
    const broken: Series = { ...limit, x: [1, 2, 3, 4, 5, 6], y: [1, 2, NaN, 4, -1, 6] }
    const figure: Figure = { ...scan, y: { ...scan.y, scale: 'log' }, series: [broken], marks: [] }
    const { lines } = layoutFigure({ ...figure, x: { ...scan.x, range: [1, 6] } }, size)
    expect(lines[0]?.path.match(/M/g)).toHaveLength(1)
    expect(lines[0]?.path).not.toContain('NaN')
  })

  it('draws an empty figure as an empty frame', () => {
    const { lines, x, y } = layoutFigure({ ...scan, series: [], marks: [] }, size)
    expect(lines).toEqual([])
    expect(x.ticks.length).toBeGreaterThan(1)
    expect(y.ticks.length).toBeGreaterThan(1)
  })

  it('opens a range about a single point', () => {
    const single: Series = { ...measured, x: [5], y: [3] }
    const figure: Figure = {
      ...scan,
      x: { label: 'Time', unit: 's', scale: 'linear' },
      series: [single],
      marks: [],
    }
    const layout = layoutFigure(figure, size)
    expect(layout.x.ticks.every((tick) => Number.isFinite(tick.x))).toBe(true)
  })

  it('takes a range given the wrong way round', () => {
    const turned: Figure = { ...scan, x: { ...scan.x, range: [1e9, 30e6] } }
    expect(layoutFigure(turned, size)).toEqual(layoutFigure(scan, size))
  })

  it('leaves a mark outside the range away', () => {
    const outside: Figure = { ...scan, marks: [{ kind: 'instant', x: 5e9, label: 'Outside' }] }
    expect(layoutFigure(outside, size).marks).toEqual([])
  })

  it('scales the levels to what is in view', () => {
    const tall: Series = { ...measured, id: 'tall', x: [1e6, 2e6], y: [500, 500] }
    const { y } = layoutFigure({ ...scan, series: [...scan.series, tall] }, size)
    expect(y.ticks.map((tick) => tick.text)).not.toContain('500')
  })
})
