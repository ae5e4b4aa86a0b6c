import { describe, expect, it } from 'vitest'

import { describedCapture, readCapture } from './reference-captures'

const layouts = [
  { file: 'o01_bare.csv', start: -4e-7, channels: [['SW', 'V']] },
  { file: 'o02_with_cadd_470pF.csv', start: -4e-7, channels: [['SW', 'V']] },
  { file: 'o03_snubbed.csv', start: -4e-7, channels: [['SW', 'V']] },
  { file: 'o04_semicolon_us_mV.csv', start: -2e-6, channels: [['Kanal 1', 'V']] },
  {
    file: 'o05_four_channels.csv',
    start: -4e-7,
    channels: [
      ['SW', 'V'],
      ['VIN', 'V'],
      ['GATE', 'V'],
    ],
  },
  { file: 'o06_falling_tab.tsv', start: -1e-6, channels: [['v_sw', '']] },
  { file: 'o10_rounded_time.csv', start: -2.5e-7, channels: [['volts', 'V']] },
  { file: 'o11_clipped.csv', start: -8e-7, channels: [['Voltage', 'V']] },
  { file: 'o12_first_order.csv', start: -2e-6, channels: [['u', 'V']] },
] as const

describe('captures of known content', () => {
  for (const { file, start, channels } of layouts) {
    const description = describedCapture(file)
    it(`reads ${file}, made with ${description.origin}`, () => {
      const capture = readCapture(file)
      expect(capture.samples).toBe(description.samples)
      expect(capture.intervalSeconds * description.sample_rate).toBeCloseTo(1, 9)
      expect(capture.startSeconds).toBe(start)
      expect(capture.channels.map(({ name, unit }) => [name, unit])).toEqual(channels)
      for (const { values } of capture.channels) expect(values).toHaveLength(description.samples)
    })
  }

  it('reads millivolts with a decimal comma into exact volts', () => {
    expect(readCapture('o04_semicolon_us_mV.csv').channels[0]?.values.at(-1)).toBe(48)
  })
})
