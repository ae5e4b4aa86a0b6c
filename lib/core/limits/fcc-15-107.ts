import { flat, raised, sloped, type LimitDetector, type LimitSegment, type LimitTable } from './limit-table'

const tableOf = (
  deviceClass: 'A' | 'B',
  detector: LimitDetector,
  segments: readonly LimitSegment[],
): LimitTable => ({
  id: `fcc-15-107-${deviceClass.toLowerCase()}-${detector}`,
  standard: '47 CFR 15.107',
  edition: 'as amended in 2002',
  clause: deviceClass === 'A' ? '15.107(b)' : '15.107(a)',
  deviceClass,
  port: 'mains',
  detector,
  distance: null,
  unit: 'dBµV',
  segments,
  standing: deviceClass === 'B' ? 'read in a related document' : 'from memory',
  source:
    deviceClass === 'B' ? 'equal to 47 CFR 15.207 and 18.307(b)' : 'no public copy of this edition found',
})

const classB = [sloped(0.15e6, 0.5e6, 66, 56), flat(0.5e6, 5e6, 56), flat(5e6, 30e6, 60)]

/** 47 CFR 15.107, conducted onto the mains: 50 Ω/50 µH, 9 kHz; the numbers of CISPR 22. */
export const fcc15107: readonly LimitTable[] = [
  tableOf('B', 'quasi-peak', classB),
  tableOf('B', 'average', raised(classB, -10)),
  tableOf('A', 'quasi-peak', [flat(0.15e6, 0.5e6, 79), flat(0.5e6, 30e6, 73)]),
  tableOf('A', 'average', [flat(0.15e6, 0.5e6, 66), flat(0.5e6, 30e6, 60)]),
]
