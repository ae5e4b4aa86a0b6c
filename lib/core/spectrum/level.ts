/** A level in dBµV: 20 lg(U/1 µV) of an rms voltage in volts. A receiver shows the rms value of a sine. */
export const levelOfRms = (volts: number): number => 20 * Math.log10(volts / 1e-6)

/** The level of a sine given by its peak value, U = Û/√2, in dBµV. The same for field strengths, in dBµV/m. */
export const levelOfPeak = (volts: number): number => levelOfRms(volts * Math.SQRT1_2)

/** The rms voltage of a level in dBµV, in volts. */
export const rmsOfLevel = (level: number): number => 1e-6 * 10 ** (level / 20)

/** The peak value of a sine whose rms voltage has a level in dBµV, in volts. */
export const peakOfLevel = (level: number): number => Math.SQRT2 * rmsOfLevel(level)

/** dBm into a resistance to dBµV: 1 mW is √(R · 1 mW); 106.99 dB above in 50 Ω. */
export const levelOfPower = (dbm: number, resistance = 50): number =>
  dbm + levelOfRms(Math.sqrt(resistance * 1e-3))

/** dBµV across a resistance to dBm; the reverse of `levelOfPower`. */
export const powerOfLevel = (level: number, resistance = 50): number => level - levelOfPower(0, resistance)

/** dBµA through a resistance to dBµV across it: 20 lg(R/1 Ω) above; 33.98 dB in 50 Ω. */
export const levelOfCurrent = (dbua: number, resistance = 50): number => dbua + 20 * Math.log10(resistance)

/** dBµV across a resistance to dBµA through it; the reverse of `levelOfCurrent`. */
export const currentOfLevel = (level: number, resistance = 50): number =>
  level - levelOfCurrent(0, resistance)
