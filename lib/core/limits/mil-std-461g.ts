import { flat, raised, sloped, type LimitSegment, type LimitTable } from './limit-table'

const common = {
  edition: 'G, 2015',
  detector: 'peak',
  standing: 'from memory',
} as const

const conducted = (volts: number, by: number): LimitTable => ({
  ...common,
  id: `mil-std-461g-ce102-${volts}v`,
  standard: 'MIL-STD-461G CE102',
  clause: 'CE102, limit by supply voltage',
  deviceClass: `${volts} V`,
  port: 'supply',
  distance: null,
  unit: 'dBµV',
  segments: raised(basic, by),
  source: 'the figure was not readable; its 60 dBµV plateau was seen in a public page',
})

const basic: readonly LimitSegment[] = [sloped(10e3, 500e3, 94, 60), flat(500e3, 10e6, 60)]

const ground: LimitTable = {
  ...common,
  id: 'mil-std-461g-re102-ground',
  standard: 'MIL-STD-461G RE102',
  clause: 'RE102, ground, Navy mobile and Army',
  deviceClass: 'ground, Navy mobile and Army',
  port: 'enclosure',
  distance: 1,
  unit: 'dBµV/m',
  segments: [flat(2e6, 100e6, 24), sloped(100e6, 18e9, 24, 69)],
  source: 'the figure was not readable',
}

/** MIL-STD-461G: CE102 at supply lines with its relaxation by voltage, and one line of RE102. */
export const milStd461g: readonly LimitTable[] = [
  conducted(28, 0),
  conducted(115, 6),
  conducted(220, 9),
  conducted(270, 10),
  conducted(440, 12),
  ground,
]
