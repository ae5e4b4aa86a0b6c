import { flat, type LimitDetector, type LimitSegment, type LimitTable } from './limit-table'

const tableOf = (detector: LimitDetector, segments: readonly LimitSegment[]): LimitTable => ({
  id: `cispr-25-5-supply-${detector}`,
  standard: 'CISPR 25',
  edition: 'depends on the edition: not identified',
  clause: 'conducted, voltage method, components',
  deviceClass: '5',
  port: 'supply',
  detector,
  distance: null,
  unit: 'dBµV',
  segments,
  standing: 'from memory',
  source: 'no public copy found; other classes are left out on purpose',
})

/** Broadcast and mobile bands of class 5, in MHz, with their peak and average limits in dBµV. */
const bands = [
  [0.15, 0.3, 70, 50],
  [0.53, 1.8, 54, 34],
  [5.9, 6.2, 53, 33],
  [26, 28, 44, 24],
  [30, 54, 44, 24],
  [41, 88, 34, 24],
  [68, 87, 38, 18],
  [76, 108, 38, 18],
] as const

/** CISPR 25, components in vehicles, class 5 at the supply lines: limits only within the bands; where bands meet, the lower. */
export const cispr25: readonly LimitTable[] = [
  tableOf(
    'peak',
    bands.map(([from, to, peak]) => flat(from * 1e6, to * 1e6, peak)),
  ),
  tableOf(
    'average',
    bands.map(([from, to, , average]) => flat(from * 1e6, to * 1e6, average)),
  ),
]
