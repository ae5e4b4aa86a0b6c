import type { Unit } from '../units/unit'

export type LimitPort = 'mains' | 'enclosure' | 'supply'

export type LimitDetector = 'quasi-peak' | 'average' | 'peak'

/**
 * What a table was held against: a public copy of the document, a public copy of another document with the same numbers, or
 * nothing but memory.
 */
export type LimitStanding = 'read in a public copy' | 'read in a related document' | 'from memory'

/** Straight over the logarithm of frequency, from one level to the other; Hz, and dB in the unit of the table. */
export type LimitSegment = {
  readonly from: number
  readonly to: number
  readonly startLevel: number
  readonly endLevel: number
}

/** One limit line of one standard. */
export type LimitTable = {
  readonly id: string
  readonly standard: string
  readonly edition: string
  readonly clause: string
  /** As the standard names it; “28 V” where the line follows the supply voltage. */
  readonly deviceClass: string
  readonly port: LimitPort
  readonly detector: LimitDetector
  /** Of the antenna, in metres; null for a conducted measurement. */
  readonly distance: number | null
  readonly unit: Extract<Unit, 'dBµV' | 'dBµV/m'>
  readonly segments: readonly LimitSegment[]
  readonly standing: LimitStanding
  /** Where the numbers were read, or that they were not. */
  readonly source: string
}

/** A segment of one level. */
export const flat = (from: number, to: number, level: number): LimitSegment => ({
  from,
  to,
  startLevel: level,
  endLevel: level,
})

/** A segment that falls or rises straight over the logarithm of frequency. */
export const sloped = (from: number, to: number, startLevel: number, endLevel: number): LimitSegment => ({
  from,
  to,
  startLevel,
  endLevel,
})

/** 20 lg of a field strength in µV/m. */
export const levelOfField = (microvoltsPerMetre: number): number => 20 * Math.log10(microvoltsPerMetre)

/** The same segments so many dB higher. */
export const raised = (segments: readonly LimitSegment[], by: number): readonly LimitSegment[] =>
  segments.map(({ from, to, startLevel, endLevel }) => sloped(from, to, startLevel + by, endLevel + by))
