import { renderToStaticMarkup } from 'react-dom/server'
import { describe, expect, it } from 'vitest'

import { Minutes, minutesInWords } from '@/components/ui/minutes'
import { Money, moneyDigits } from '@/components/ui/money'
import { dayInWords, instantInWords, Timestamp } from '@/components/ui/timestamp'

const textOf = (markup: string) => markup.replace(/<[^>]*>/g, '').replaceAll('\u00a0', ' ')

describe('money', () => {
  it.each([
    [0, '0.00'],
    [5, '0.05'],
    [123450, '1,234.50'],
    [-99, '−0.99'],
    [123456789012, '1,234,567,890.12'],
  ])('writes %i cents as %s', (cents, text) => {
    expect(moneyDigits(cents)).toBe(text)
  })

  it('puts the currency after the number', () => {
    expect(textOf(renderToStaticMarkup(<Money cents={9900} currency="EUR" />))).toBe('99.00 EUR')
  })
})

describe('working time', () => {
  it.each([
    [0, '0 min'],
    [45, '45 min'],
    [120, '2 h'],
    [750, '12 h 30 min'],
    [-75, '−1 h 15 min'],
  ])('writes %i minutes as %s', (minutes, text) => {
    expect(minutesInWords(minutes).replaceAll('\u00a0', ' ')).toBe(text)
    expect(textOf(renderToStaticMarkup(<Minutes minutes={minutes} />))).toBe(text)
  })
})

describe('instants', () => {
  it('are written in UTC and kept whole for machines', () => {
    const instant = Date.UTC(2026, 11, 1, 10, 4)
    expect(instantInWords(instant)).toBe('1 Dec 2026, 10:04 UTC')
    expect(dayInWords(instant)).toBe('1 Dec 2026')
    expect(renderToStaticMarkup(<Timestamp instant={instant} />)).toContain(
      'dateTime="2026-12-01T10:04:00.000Z"',
    )
  })
})
