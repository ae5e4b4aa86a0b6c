import {
  flat,
  levelOfField,
  raised,
  type LimitDetector,
  type LimitSegment,
  type LimitTable,
} from './limit-table'

type Field = {
  readonly deviceClass: 'A' | 'B'
  readonly detector: LimitDetector
  readonly segments: readonly LimitSegment[]
}

const tableOf = ({ deviceClass, detector, segments }: Field): LimitTable => ({
  id: `fcc-15-109-${deviceClass.toLowerCase()}-${detector}`,
  standard: '47 CFR 15.109',
  edition: 'copies of 2010 and 2011',
  clause: deviceClass === 'A' ? '15.109(b), 15.35' : '15.109(a), 15.35',
  deviceClass,
  port: 'enclosure',
  detector,
  distance: deviceClass === 'A' ? 10 : 3,
  unit: 'dBµV/m',
  segments,
  standing: 'read in a public copy',
  source: 'public copies of 47 CFR 15.109, and of 15.35 for the detectors',
})

/** Field strengths of the four ranges, in µV/m. */
type Fields = readonly [below88: number, below216: number, below960: number, above960: number]

const classAFields: Fields = [90, 150, 210, 300]
const classBFields: Fields = [100, 150, 200, 500]

const below1GHz = ([a, b, c, d]: Fields): readonly LimitSegment[] => [
  flat(30e6, 88e6, levelOfField(a)),
  flat(88e6, 216e6, levelOfField(b)),
  flat(216e6, 960e6, levelOfField(c)),
  flat(960e6, 1e9, levelOfField(d)),
]

/** Up to the highest frequency that 15.33(b)(1) ever asks for. */
const above1GHz = ([, , , d]: Fields): readonly LimitSegment[] => [flat(1e9, 40e9, levelOfField(d))]

/** 15.35(b): the peak limit above 1 GHz is 20 dB over the average one. */
const peakOverAverage = 20

/** 47 CFR 15.109, unintentional radiators: (a) class B and all others at 3 m, (b) class A at 10 m. */
export const fcc15109: readonly LimitTable[] = (
  [
    ['B', classBFields],
    ['A', classAFields],
  ] as const
).flatMap(([deviceClass, fields]) => [
  tableOf({ deviceClass, detector: 'quasi-peak', segments: below1GHz(fields) }),
  tableOf({ deviceClass, detector: 'average', segments: above1GHz(fields) }),
  tableOf({ deviceClass, detector: 'peak', segments: raised(above1GHz(fields), peakOverAverage) }),
])
