import { vacuumPermeability } from '../physics/constants'

const perHeight = vacuumPermeability / (2 * Math.PI)

/** Two vias between planes at a height, with opposite currents: L = (µ₀ h/π) acosh(s/d). Metres, henries. */
export const viaPair = (height: number, spacing: number, diameter: number): number =>
  2 * perHeight * height * Math.acosh(spacing / diameter)

/** The same with thin vias: L = (µ₀ h/π) ln(2s/d); high by 1 % at s/d = 2.6. */
export const viaPairThin = (height: number, spacing: number, diameter: number): number =>
  2 * perHeight * height * Math.log((2 * spacing) / diameter)

/**
 * A signal via amid n return vias on a circle of radius s that share its current equally, thin against s:
 *
 *     L = (µ₀ h/2π) [(1 + 1/n) ln(s/r) − ln(n)/n],   r = d/2
 */
export const viaWithReturns = (height: number, radius: number, diameter: number, count: number): number =>
  perHeight * height * ((1 + 1 / count) * Math.log((2 * radius) / diameter) - Math.log(count) / count)

/** A plane pair from one via to a ring of radius R around it: L = (µ₀ h/2π) ln(R/r). Infinite planes. */
export const planeSpreading = (height: number, outerRadius: number, viaRadius: number): number =>
  perHeight * height * Math.log(outerRadius / viaRadius)
