import { z } from 'zod'

const positive = z.number().positive()

const train = {
  amplitude: positive,
  period: positive,
  width_50: positive,
  rise_0_100: z.number().nonnegative(),
  fall_0_100: z.number().nonnegative(),
}

export const trapezoidSchema = z.object({
  ...train,
  harmonics: z.array(z.int().positive()).min(1).max(100_000),
})

export const envelopeSchema = z.object({
  ...train,
  rise_0_100: positive,
  fall_0_100: positive,
  freqs: z.array(positive).min(1),
})

const coefficients = z.array(z.number()).min(1).max(20)

export const windowSchema = z.object({
  window: z.string(),
  cosine_coefficients: coefficients,
  form: z.string().optional(),
})

export const dftSchema = z.object({
  window: z.string(),
  cosine_coefficients: coefficients,
  fs: positive,
  n: z
    .int()
    .min(1)
    .max(2 ** 23),
  components: z
    .array(z.object({ peak: z.number(), f: z.number().nonnegative(), phase: z.number() }))
    .max(1000),
  bins: z.array(z.int().nonnegative()).min(1),
})

export const conversionSchema = z.object({ kind: z.string(), value: z.number() })

export const combSchema = z.object({
  sources: z.array(z.object({ name: z.string(), f: positive })).min(1),
  peaks: z.array(positive),
  tolerance_ppm: z.number().nonnegative(),
  tolerance_hz: z.number().nonnegative(),
  max_harmonic: z.int().positive().nullish(),
})

export const intermodulationSchema = z.object({
  f1: positive,
  f2: positive,
  max_order: z.int().positive().max(100),
  f_min: z.number().nonnegative(),
  f_max: positive,
})
