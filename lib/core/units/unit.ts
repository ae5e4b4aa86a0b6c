/** A unit as it is stored and shown; every value in the core is in one of these, without a prefix. */
export const units = [
  'Hz',
  's',
  'H',
  'F',
  'Ω',
  'V',
  'A',
  'W',
  'J',
  'm',
  'm²',
  'V/m',
  'A/m',
  'T',
  'V·s',
  'S/m',
  'H/m',
  '%',
  'ppm',
  '°',
  'dB',
  'dBm',
  'dBµV',
  'dBµA',
  'dBµV/m',
  '',
] as const

export type Unit = (typeof units)[number]

type UnitFacts = {
  readonly quantity: string
  readonly takesPrefix: boolean
  /** Other spellings that people and instruments write. */
  readonly spellings: readonly string[]
  /** Multiples that are no prefixed units, as powers of ten: areas. The largest that keeps a value at 1 or above is shown. */
  readonly multiples?: Readonly<Record<string, number>>
  readonly example: string
}

const facts: Readonly<Record<Unit, UnitFacts>> = {
  Hz: { quantity: 'a frequency', takesPrefix: true, spellings: ['hz', 'HZ'], example: '420k or 102.7 MHz' },
  s: { quantity: 'a time', takesPrefix: true, spellings: ['sec'], example: '1.5n or 2,5 µs' },
  H: { quantity: 'an inductance', takesPrefix: true, spellings: [], example: '8n or 4.7 µH' },
  F: { quantity: 'a capacitance', takesPrefix: true, spellings: [], example: '470p or 4n7' },
  Ω: {
    quantity: 'a resistance',
    takesPrefix: true,
    spellings: ['\u2126', 'ohm', 'Ohm', 'ohms', 'R'],
    example: '5.1, 4R7 or 2.2 kΩ',
  },
  V: { quantity: 'a voltage', takesPrefix: true, spellings: [], example: '12 or 250 mV' },
  A: { quantity: 'a current', takesPrefix: true, spellings: [], example: '3.5 or 20 mA' },
  W: { quantity: 'a power', takesPrefix: true, spellings: [], example: '0.25 or 90 mW' },
  J: { quantity: 'an energy', takesPrefix: true, spellings: [], example: '1.2 µJ' },
  m: { quantity: 'a length', takesPrefix: true, spellings: [], example: '12 mm' },
  'm²': {
    quantity: 'an area',
    takesPrefix: false,
    spellings: ['m2'],
    multiples: { 'mm²': -6, 'cm²': -4 },
    example: '4 cm² or 25 mm²',
  },
  'V/m': { quantity: 'a field strength', takesPrefix: true, spellings: [], example: '100 µV/m' },
  'A/m': { quantity: 'a magnetic field strength', takesPrefix: true, spellings: [], example: '20 mA/m' },
  T: { quantity: 'a magnetic flux density', takesPrefix: true, spellings: [], example: '1.5 µT' },
  'V·s': { quantity: 'an impulse area', takesPrefix: true, spellings: ['Vs'], example: '0.316 µVs' },
  'S/m': { quantity: 'a conductivity', takesPrefix: true, spellings: [], example: '58 MS/m' },
  'H/m': { quantity: 'an inductance per length', takesPrefix: true, spellings: [], example: '250 nH/m' },
  '%': { quantity: 'a percentage', takesPrefix: false, spellings: [], example: '5 %' },
  ppm: { quantity: 'a tolerance in ppm', takesPrefix: false, spellings: [], example: '50 ppm' },
  '°': { quantity: 'an angle', takesPrefix: false, spellings: ['deg'], example: '90' },
  dB: { quantity: 'a level difference', takesPrefix: false, spellings: [], example: '6 dB' },
  dBµV: { quantity: 'a level', takesPrefix: false, spellings: ['dBuV'], example: '56 dBµV' },
  dBm: { quantity: 'a power level', takesPrefix: false, spellings: [], example: '-47 dBm' },
  dBµA: { quantity: 'a current level', takesPrefix: false, spellings: ['dBuA'], example: '15 dBµA' },
  'dBµV/m': { quantity: 'a field level', takesPrefix: false, spellings: ['dBuV/m'], example: '40 dBµV/m' },
  '': { quantity: 'a plain number', takesPrefix: false, spellings: [], example: '0.5' },
}

export const unitFacts = (unit: Unit): UnitFacts => facts[unit]
