import fc from 'fast-check'
import { describe, expect, it } from 'vitest'

import { parseCapture } from '@/lib/core/waveform/parse-capture'

const parse = (text: string) => parseCapture(new TextEncoder().encode(text))

function parsed(text: string) {
  const result = parse(text)
  if (!result.ok) throw new Error(result.error.message)
  return result.value
}

const numbersOf = (text: string) => parsed(text).channels.map(({ values }) => [...values])

describe('layouts that parseCapture reads', () => {
  it('reads carriage returns, a byte order mark, quotes, spaces, blank lines and a separator at the end', () => {
    const text = '\uFEFF"time [s]" , "u [V]",\r\n0, 1,\r\n1, 2,\r\n\r\n2 , 3,\r\n\r\n'
    expect(numbersOf(text)).toEqual([[1, 2, 3]])
    expect(parsed(text)).toMatchObject({ intervalSeconds: 1, warnings: [] })
  })

  it('reads a µ in Latin-1', () => {
    const bytes = Uint8Array.from('Zeit (\u00b5s);U (mV)\n0;1\n2;3\n4;5\n', (letter) => letter.charCodeAt(0))
    const result = parseCapture(bytes)
    expect(result).toMatchObject({ ok: true, value: { intervalSeconds: 2e-6, channels: [{ name: 'U' }] } })
  })

  it('reads decimal commas where semicolons or tabs separate', () => {
    expect(numbersOf('t [s];a [V]\n0,5;1,25\n1,5;2,5\n2,5;3\n')).toEqual([[1.25, 2.5, 3]])
    expect(numbersOf('t [s]\ta [V]\n0,5\t1,25\n1,5\t2,5\n2,5\t3\n')).toEqual([[1.25, 2.5, 3]])
  })

  it('reads a row of units under the names', () => {
    expect(parsed('Time,A,B\nms,mV,A\n0,5,1\n1,6,2\n2,7,3\n')).toMatchObject({
      intervalSeconds: 0.001,
      channels: [
        { name: 'A', unit: 'V' },
        { name: 'B', unit: 'A' },
      ],
    })
  })

  it('reads a stated interval or rate where there is no time column', () => {
    const stated = parsed('samples: 4\nsample interval: 2 ns\nunit: mV\n1\n2\n3\n')
    expect(stated).toMatchObject({ startSeconds: 0, intervalSeconds: 2e-9, samples: 3 })
    expect(stated.intervalSource).toContain('“sample interval: 2 ns”')
    expect(stated.warnings).toEqual(['The file states 4 samples but holds 3; it may have been cut off.'])
    expect(stated.channels[0]?.values).toEqual(Float64Array.of(0.001, 0.002, 0.003))
    expect(parsed('sample rate = 4 MHz\nu [V]\n1\n2\n3\n').intervalSeconds).toBe(2.5e-7)
  })

  it('recovers the interval from stamps that are rounded until they repeat', () => {
    const rows = Array.from({ length: 1000 }, (_, index) => `${(1e-6 + index * 1e-10).toExponential(3)},0`)
    const capture = parsed(`time [s],u [V]\n${rows.join('\n')}\n`)
    expect(Math.abs(capture.intervalSeconds / 1e-10 - 1)).toBeLessThan(0.01)
    expect(capture.intervalSource).toContain('rounded')
  })

  it('reads quoted numbers, with a decimal comma too, and quoted titles with a comma within', () => {
    expect(numbersOf('"time, s","u, V"\n"0,0","1,25"\n"1,0","-2,5e0"\n"2,0","3"\n')).toEqual([
      [1.25, -2.5, 3],
    ])
    expect(parsed('"time, s","out, mV"\n"0","1"\n"1","2"\n"2","3"\n').channels[0]).toMatchObject({
      name: 'out',
      unit: 'V',
    })
  })

  it('reads lines that end with a carriage return alone, and counts rows by them', () => {
    expect(numbersOf('time [s],u [V]\r0,1\r1,2\r2,3\r')).toEqual([[1, 2, 3]])
    expect(parse('time [s],u [V]\r0,1\r1,2\r2,3\r3,x\r')).toMatchObject({
      ok: false,
      error: { row: 5, column: 2 },
    })
  })

  it('reads columns that spaces separate, with titles', () => {
    const capture = parsed('time (s)    out (mV)\n  0.0    1.5\n  1.0   -2.5 \n  2.0    3\n')
    expect(capture.channels[0]?.values).toEqual(Float64Array.of(0.0015, -0.0025, 0.003))
    expect(capture).toMatchObject({ intervalSeconds: 1, channels: [{ name: 'out', unit: 'V' }] })
    expect(numbersOf('t u v\n0 1 2\n1 2 3\n2 3 4\n')).toEqual([
      [1, 2, 3],
      [2, 3, 4],
    ])
  })

  it.each([
    ['little', true],
    ['big', false],
  ])('reads UTF-16 with a byte order mark, %s end first', (_, isLittle) => {
    const text = '\uFEFFZeit (µs);U (mV)\r\n0;1\r\n2;3\r\n4;5\r\n'
    const view = new DataView(new ArrayBuffer(2 * text.length))
    for (let index = 0; index < text.length; index += 1)
      view.setUint16(2 * index, text.charCodeAt(index), isLittle)
    expect(parseCapture(new Uint8Array(view.buffer))).toMatchObject({
      ok: true,
      value: {
        intervalSeconds: 2e-6,
        channels: [{ name: 'U', values: Float64Array.of(0.001, 0.003, 0.005) }],
      },
    })
  })

  it('leaves out NULs that pad the end of a file', () => {
    expect(numbersOf(`time [s],u [V]\n0,1\n1,2\n2,3\n${'\u0000'.repeat(512)}`)).toEqual([[1, 2, 3]])
  })

  it('takes samples beyond the range as the extreme of the rest, and says so', () => {
    const capture = parsed('time [s],u [V],w [V]\n0,inf,1\n1,2,1\n2,-3,1\n3,-Infinity,1\n4,∞,1\n')
    expect(capture.channels[0]?.values).toEqual(Float64Array.of(2, 2, -3, -3, 2))
    expect(capture.warnings).toEqual([
      '3 samples of “u” lie beyond the range of the instrument; they are taken as its extreme.',
    ])
  })

  it('refuses a channel that holds nothing within the range', () => {
    expect(parse('time [s],u [V]\n0,inf\n1,inf\n2,-inf\n')).toMatchObject({
      ok: false,
      error: { code: 'bad_number', column: 2 },
    })
  })

  it('says what it had to assume', () => {
    expect(parsed('t,v\n0,1\n1,2\n2,3\n').warnings).toEqual([
      'No unit is given for the time column; seconds are assumed.',
      'No unit is given for “v”; its values are taken as they are written.',
    ])
  })
})

describe('what parseCapture refuses, with the place and what to do', () => {
  const head = 'time [s],u [V]\n0,1\n1,2\n2,3\n'
  it.each([
    ['an empty file', '', 'empty', {}],
    ['a byte order mark alone', '\uFEFF', 'empty', {}],
    ['NUL bytes', '0,1\n\u0000\n', 'not_text', {}],
    ['text without numbers', 'hello\nworld\n', 'no_numbers', {}],
    ['one row', '1,2\n', 'no_interval', {}],
    ['one column without an interval', '1\n2\n3\n', 'no_interval', {}],
    ['a time that stands still', 'time [s],u [V]\n0,1\n0,2\n0,3\n', 'no_interval', {}],
    ['1e400', `${head}3,1e400\n`, 'bad_number', { row: 5, column: 2 }],
    ['1e', `${head}3,1e\n`, 'bad_number', { row: 5, column: 2 }],
    ['an empty cell', `${head}3,\n`, 'bad_number', { row: 5, column: 2 }],
    ['a word', `${head}\nfin,1\n`, 'bad_number', { row: 6, column: 1 }],
    ['a column too many', `${head}3,4,5\n`, 'bad_number', { row: 5 }],
    ['a column too few', `${head}3\n`, 'bad_number', { row: 5 }],
    [
      'another decimal mark',
      't [s];u [V]\n0,5;1\n1,5;1\n2,5;1\n3.5;1\n',
      'bad_number',
      { row: 5, column: 1 },
    ],
    ['NUL among the numbers', `${head}${'3,4\n'.repeat(20_000)}\u0000\n3,4\n`, 'bad_number', { row: 20_005 }],
    ['a gap in time', 'time [s],u [V]\n0,1\n1,1\n2,1\n3,1\n50,1\n51,1\n', 'uneven_time', { column: 1 }],
    ['time going back', 'time [s],u [V]\n0,1\n1,1\n2,1\n1,1\n4,1\n', 'uneven_time', { row: 5, column: 1 }],
  ])('refuses %s', (_, text, code, place) => {
    const result = parse(text)
    expect(result).toMatchObject({ ok: false, error: { code, ...place } })
    if (!result.ok) expect(result.error.message).toMatch(/^\p{Lu}.*\.$/u)
  })

  it('never throws, whatever the bytes', () => {
    fc.assert(
      fc.property(fc.uint8Array({ maxLength: 400 }), (bytes) => {
        expect(typeof parseCapture(bytes).ok).toBe('boolean')
      }),
      { numRuns: 2000 },
    )
    const pieces = fc.constantFrom(
      '1',
      '-',
      '.',
      ',',
      ';',
      '\t',
      '\n',
      '\r\n',
      'e',
      'time [s]',
      '"',
      ' ',
      '#',
      ':',
    )
    fc.assert(
      fc.property(fc.array(pieces, { maxLength: 60 }), (text) => {
        expect(typeof parse(text.join('')).ok).toBe('boolean')
      }),
      { numRuns: 5000 },
    )
  })

  it('gives back any numbers that are written out, in every layout', () => {
    const value = fc.double({ noNaN: true, noDefaultInfinity: true })
    const layout = fc.constantFrom([',', '.'], [';', '.'], [';', ','], ['\t', ','], ['\t', '.'])
    fc.assert(
      fc.property(fc.array(value, { minLength: 3, maxLength: 40 }), layout, (values, [separator, mark]) => {
        const rows = values.map(
          (item, index) => `${index}${separator}${String(item).replace('.', mark ?? '.')}`,
        )
        expect(numbersOf(`t [s]${separator}u [V]\n${rows.join('\n')}`)).toEqual([
          values.map((item) => Number(String(item))),
        ])
      }),
      { numRuns: 500 },
    )
  })
})
