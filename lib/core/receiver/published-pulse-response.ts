import type { ReceiverBandId } from './bands'

/** Pulses per second, null for a single pulse, and the level in dB that reads like the reference rate. */
export type PublishedResponse = readonly [rate: number | null, level: number]

const bandsCD: readonly PublishedResponse[] = [
  [1000, -8],
  [100, 0],
  [20, 9],
  [10, 14],
  [2, 26],
  [1, 28.5],
  [null, 31.5],
]

/**
 * Relative level of pulses for a constant quasi-peak indication, as CISPR 16-1-1 tabulates it; from memory, not found in a
 * public copy. The response to pulses of constant size has the opposite sign.
 */
export const publishedPulseResponse: Readonly<Partial<Record<ReceiverBandId, readonly PublishedResponse[]>>> =
  {
    A: [
      [100, -4],
      [60, -3],
      [25, 0],
      [10, 4],
      [5, 7.5],
      [2, 13],
      [1, 17],
      [null, 19],
    ],
    B: [
      [1000, -4.5],
      [100, 0],
      [20, 6.5],
      [10, 10],
      [2, 20.5],
      [1, 22.5],
      [null, 23.5],
    ],
    C: bandsCD,
    D: bandsCD,
  }
