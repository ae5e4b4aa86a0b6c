import { flat, raised, sloped, type LimitDetector, type LimitSegment, type LimitTable } from './limit-table'

const standard = 'CISPR 32'
const edition = '2012 and 2015; EN 55032 is the same'

type Radiated = {
  readonly deviceClass: 'A' | 'B'
  readonly distance: 3 | 10
  readonly detector: LimitDetector
  readonly segments: readonly LimitSegment[]
}

const readInMail = 'a public mail-list post that quotes tables A.4 and A.5 of CISPR 32:2012'

function mains(
  deviceClass: 'A' | 'B',
  detector: LimitDetector,
  segments: readonly LimitSegment[],
): LimitTable {
  const short = detector === 'average' ? 'average' : 'quasi-peak'
  return {
    id: `cispr-32-${deviceClass.toLowerCase()}-mains-${short}`,
    standard,
    edition,
    clause: 'Annex A, mains port; tables not identified',
    deviceClass,
    port: 'mains',
    detector,
    distance: null,
    unit: 'dBµV',
    segments,
    standing: 'read in a related document',
    source: 'a public copy of the table of EN 55022; the class B row also in 47 CFR 18.307(b)',
  }
}

const radiated = ({ deviceClass, distance, detector, segments }: Radiated): LimitTable => ({
  id: `cispr-32-${deviceClass.toLowerCase()}-${distance}m-${detector}`,
  standard,
  edition,
  clause: deviceClass === 'A' ? 'Annex A; tables not identified' : 'Annex A, tables A.4 and A.5',
  deviceClass,
  port: 'enclosure',
  detector,
  distance,
  unit: 'dBµV/m',
  segments,
  standing: deviceClass === 'B' ? 'read in a public copy' : 'from memory',
  source: deviceClass === 'B' ? readInMail : 'no public copy found',
})

const classBMains = [sloped(0.15e6, 0.5e6, 66, 56), flat(0.5e6, 5e6, 56), flat(5e6, 30e6, 60)]
const classBField = [flat(30e6, 230e6, 30), flat(230e6, 1e9, 37)]
const classBMicrowave = [flat(1e9, 3e9, 50), flat(3e9, 6e9, 54)]

/** Above 1 GHz the peak limit is 20 dB over the average one. */
const peakOverAverage = 20

/** Radiated limits of class A: 10 dB over those of class B below 1 GHz, 6 dB above. */
const classAField = raised(classBField, 10)
const classAMicrowave = raised(classBMicrowave, 6)

/** The standard takes 10 dB for the way from 10 m to 3 m. */
const nearer = 10

/** CISPR 32, multimedia equipment: mains port with 50 Ω/50 µH, 9 kHz; radiated 120 kHz below and 1 MHz above 1 GHz. */
export const cispr32: readonly LimitTable[] = [
  mains('B', 'quasi-peak', classBMains),
  mains('B', 'average', raised(classBMains, -10)),
  mains('A', 'quasi-peak', [flat(0.15e6, 0.5e6, 79), flat(0.5e6, 30e6, 73)]),
  mains('A', 'average', [flat(0.15e6, 0.5e6, 66), flat(0.5e6, 30e6, 60)]),
  radiated({ deviceClass: 'B', distance: 10, detector: 'quasi-peak', segments: classBField }),
  radiated({ deviceClass: 'B', distance: 3, detector: 'quasi-peak', segments: raised(classBField, nearer) }),
  radiated({ deviceClass: 'B', distance: 3, detector: 'average', segments: classBMicrowave }),
  radiated({
    deviceClass: 'B',
    distance: 3,
    detector: 'peak',
    segments: raised(classBMicrowave, peakOverAverage),
  }),
  radiated({ deviceClass: 'A', distance: 10, detector: 'quasi-peak', segments: classAField }),
  radiated({ deviceClass: 'A', distance: 3, detector: 'quasi-peak', segments: raised(classAField, nearer) }),
  radiated({ deviceClass: 'A', distance: 3, detector: 'average', segments: classAMicrowave }),
  radiated({
    deviceClass: 'A',
    distance: 3,
    detector: 'peak',
    segments: raised(classAMicrowave, peakOverAverage),
  }),
]
