export type SignatureRole = 'author' | 'reviewer'

/** Where the visible signatures stand on the last page, in points from its lower left corner; fits A4 and Letter. */
export const signatureBoxes = {
  author: { x: 56, y: 440, width: 220, height: 84 },
  reviewer: { x: 316, y: 440, width: 220, height: 84 },
} as const satisfies Record<SignatureRole, { x: number; y: number; width: number; height: number }>
