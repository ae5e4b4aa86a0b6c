/** A level in dBµV: 20 lg(U/1 µV) of an rms voltage in volts. A receiver shows the rms value of a sine. */
export const levelOfRms = (volts: number): number => 20 * Math.log10(volts / 1e-6)

/** The level of a sine given by its peak value, U = Û/√2, in dBµV. The same for field strengths, in dBµV/m. */
export const levelOfPeak = (volts: number): number => levelOfRms(volts * Math.SQRT1_2)

/** The rms voltage of a level in dBµV, in volts. */
export const rmsOfLevel = (level: number): number => 1e-6 * 10 ** (level / 20)

/** dBm into a resistance to dBµV: 1 mW is √(R · 1 mW); 106.99 dB above in 50 Ω. */
export const levelOfPower = (dbm: number, resistance = 50): number =>
  dbm + levelOfRms(Math.sqrt(resistance * 1e-3))
