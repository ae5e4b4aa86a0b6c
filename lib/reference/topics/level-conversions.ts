import {
  currentOfLevel,
  levelOfCurrent,
  levelOfPeak,
  levelOfPower,
  levelOfRms,
} from '@/lib/core/spectrum/level'
import { peakOfLevel, powerOfLevel, rmsOfLevel } from '@/lib/core/spectrum/level'

type Conversion = {
  /** The quantity is one whose level exists only above 0. */
  readonly isPositive: boolean
  readonly convert: (value: number) => Readonly<Record<string, number>>
}

const ofQuantity = (convert: Conversion['convert']): Conversion => ({ isPositive: true, convert })
const ofLevel = (convert: Conversion['convert']): Conversion => ({ isPositive: false, convert })

/** Conversions of levels by the names that cases use for them. */
export const conversions: Readonly<Record<string, Conversion>> = {
  v_rms_to_dbuv: ofQuantity((v) => ({ dbuv: levelOfRms(v) })),
  v_peak_to_dbuv_rms: ofQuantity((v) => ({ dbuv: levelOfPeak(v) })),
  v_peak_to_dbuv: ofQuantity((v) => ({ dbuv: levelOfPeak(v) })),
  v_rms_to_dbm_50ohm: ofQuantity((v) => ({ dbm: powerOfLevel(levelOfRms(v)) })),
  a_rms_to_dbua: ofQuantity((i) => ({ dbua: levelOfRms(i) })),
  w_to_dbm: ofQuantity((p) => ({ dbm: 10 * Math.log10(p / 1e-3) })),
  uv_per_m_to_dbuv_per_m: ofQuantity((e) => ({ dbuv_per_m: levelOfRms(e * 1e-6) })),
  v_per_m_to_dbuv_per_m: ofQuantity((e) => ({ dbuv_per_m: levelOfRms(e) })),
  ua_per_m_to_dbua_per_m: ofQuantity((h) => ({ dbua_per_m: levelOfRms(h * 1e-6) })),
  dbuv_to_v_rms: ofLevel((l) => ({ v_rms: rmsOfLevel(l) })),
  dbuv_to_v_peak: ofLevel((l) => ({ v_peak: peakOfLevel(l) })),
  dbuv_rms_to_v_peak: ofLevel((l) => ({ v_peak: peakOfLevel(l) })),
  dbuv_to_dbm_50ohm: ofLevel((l) => ({ dbm: powerOfLevel(l), v_rms: rmsOfLevel(l) })),
  dbm_to_dbuv_50ohm: ofLevel((l) => ({ dbuv: levelOfPower(l), v_rms: rmsOfLevel(levelOfPower(l)) })),
  dbm_to_v_rms_50ohm: ofLevel((l) => ({ v_rms: rmsOfLevel(levelOfPower(l)) })),
  dbm_to_w: ofLevel((l) => ({ w: 1e-3 * 10 ** (l / 10) })),
  dbua_to_dbuv_50ohm: ofLevel((l) => ({ dbuv: levelOfCurrent(l) })),
  dbuv_to_dbua_50ohm: ofLevel((l) => ({ dbua: currentOfLevel(l) })),
  dbua_to_a_rms: ofLevel((l) => ({ a_rms: rmsOfLevel(l) })),
  dbuv_per_m_to_uv_per_m: ofLevel((l) => ({ uv_per_m: 1e6 * rmsOfLevel(l) })),
  dbuv_per_m_to_v_per_m: ofLevel((l) => ({ v_per_m: rmsOfLevel(l) })),
  dbua_per_m_to_ua_per_m: ofLevel((l) => ({ ua_per_m: 1e6 * rmsOfLevel(l) })),
}
