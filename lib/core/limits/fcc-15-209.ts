import { flat, levelOfField, raised, sloped } from './limit-table'
import type { LimitDetector, LimitSegment, LimitTable } from './limit-table'

const tableOf = (
  distance: 3 | 30 | 300,
  detector: LimitDetector,
  segments: readonly LimitSegment[],
): LimitTable => ({
  id: `fcc-15-209-${distance}m-${detector}`,
  standard: '47 CFR 15.209',
  edition: 'current at the time of reading',
  clause: '15.209(a), (d), 15.35(b)',
  deviceClass: '-',
  port: 'enclosure',
  detector,
  distance,
  unit: 'dBµV/m',
  segments,
  standing: 'read in a public copy',
  source: 'a public copy of the electronic code',
})

/** A field strength that falls with frequency: so many µV/m over the frequency in kHz. */
const inverse = (from: number, to: number, product: number): LimitSegment =>
  sloped(from, to, levelOfField(product / (from / 1e3)), levelOfField(product / (to / 1e3)))

const microwave = [flat(1e9, 40e9, levelOfField(500))]

/** 47 CFR 15.209, intentional radiators: field strength in three ranges of distance; average in 9-90 and 110-490 kHz. */
export const fcc15209: readonly LimitTable[] = [
  tableOf(300, 'average', [inverse(9e3, 90e3, 2400), inverse(110e3, 490e3, 2400)]),
  tableOf(300, 'quasi-peak', [inverse(90e3, 110e3, 2400)]),
  tableOf(30, 'quasi-peak', [inverse(490e3, 1.705e6, 24000), flat(1.705e6, 30e6, levelOfField(30))]),
  tableOf(3, 'quasi-peak', [
    flat(30e6, 88e6, levelOfField(100)),
    flat(88e6, 216e6, levelOfField(150)),
    flat(216e6, 960e6, levelOfField(200)),
    flat(960e6, 1e9, levelOfField(500)),
  ]),
  tableOf(3, 'average', microwave),
  tableOf(3, 'peak', raised(microwave, 20)),
]
