/** A point or a direction in space, metres. */
export type Point3 = readonly [x: number, y: number, z: number]

/** A point in a plane, metres. */
export type Point2 = readonly [x: number, y: number]

/** A straight piece in a plane. */
export type Side = { readonly from: Point2; readonly to: Point2 }

export const difference = (a: Point3, b: Point3): Point3 => [a[0] - b[0], a[1] - b[1], a[2] - b[2]]

export const sum = (a: Point3, b: Point3): Point3 => [a[0] + b[0], a[1] + b[1], a[2] + b[2]]

export const dot = (a: Point3, b: Point3): number => a[0] * b[0] + a[1] * b[1] + a[2] * b[2]

export const cross = (a: Point3, b: Point3): Point3 => [
  a[1] * b[2] - a[2] * b[1],
  a[2] * b[0] - a[0] * b[2],
  a[0] * b[1] - a[1] * b[0],
]

export const norm = (a: Point3): number => Math.hypot(a[0], a[1], a[2])

export const scaled = (a: Point3, factor: number): Point3 => [a[0] * factor, a[1] * factor, a[2] * factor]
