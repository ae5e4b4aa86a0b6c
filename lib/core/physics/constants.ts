/** Permeability of vacuum, H/m: the exact value before 2019, 1e-10 from today's; the formulas here are written with it. */
export const vacuumPermeability = 4e-7 * Math.PI

/** Speed of light in vacuum, m/s: exact (SI Brochure, 9th edition). */
export const speedOfLight = 299_792_458

/** Impedance of free space, Ω. */
export const freeSpaceImpedance = vacuumPermeability * speedOfLight
