import 'server-only'
import path from 'node:path'

import { z } from 'zod'

const secret = (name: string) =>
  z
    .string({ error: `${name} is missing` })
    .min(16, `${name} needs at least 16 characters; make one with: openssl rand -base64 32`)

const serviceAddress = (name: string) =>
  z.url(`${name} must be an address such as http://127.0.0.1:4010, or absent for the real service`).optional()

const schema = z.object({
  PUBLIC_URL: z.url('PUBLIC_URL must be the address people type, such as https://portal.practice.example'),
  DATA_DIR: z.string({ error: 'DATA_DIR must name the folder for the database and the evidence' }).min(1),
  PRACTICE_NAME: z.string({ error: 'PRACTICE_NAME is missing' }).min(1),
  PRACTICE_ADDRESS: z.string().default(''),
  AUTH_SECRET: secret('AUTH_SECRET'),
  AUTHORITY_PASSPHRASE: secret('AUTHORITY_PASSPHRASE'),
  STRIPE_SECRET_KEY: z.string({ error: 'STRIPE_SECRET_KEY is missing' }).min(8),
  STRIPE_WEBHOOK_SECRET: secret('STRIPE_WEBHOOK_SECRET'),
  STRIPE_API_BASE: serviceAddress('STRIPE_API_BASE'),
  RESEND_API_KEY: z.string({ error: 'RESEND_API_KEY is missing' }).min(8),
  RESEND_API_BASE: serviceAddress('RESEND_API_BASE'),
  MAIL_FROM: z.string({ error: 'MAIL_FROM must be a sender such as "Practice <portal@practice.example>"' }),
  UPLOAD_LIMIT_MB: z.coerce.number().int().positive().default(1024),
  LOG_LEVEL: z.enum(['trace', 'debug', 'info', 'warn', 'error', 'silent']).default('info'),
})

export type Env = ReturnType<typeof parseEnv>

/**
 * Reads the settings once. A missing or wrong value throws with a sentence for each, so that the portal does not start
 * half configured.
 */
export function parseEnv(source: Readonly<Record<string, string | undefined>>) {
  const present = Object.fromEntries(Object.entries(source).filter(([, value]) => value !== ''))
  const parsed = schema.safeParse(present)
  if (!parsed.success) {
    const sentences = parsed.error.issues.map((issue) => `  - ${issue.message}`)
    throw new Error(`The settings need attention (see .env.example):\n${sentences.join('\n')}`)
  }
  const values = parsed.data
  const dataFolder = path.resolve(values.DATA_DIR)
  return {
    publicUrl: values.PUBLIC_URL.replace(/\/$/, ''),
    dataFolder,
    databaseFile: path.join(/* turbopackIgnore: true */ dataFolder, 'quellbench.sqlite'),
    evidenceFolder: path.join(/* turbopackIgnore: true */ dataFolder, 'files'),
    practice: { name: values.PRACTICE_NAME, address: values.PRACTICE_ADDRESS },
    authSecret: values.AUTH_SECRET,
    authorityPassphrase: values.AUTHORITY_PASSPHRASE,
    stripe: {
      secretKey: values.STRIPE_SECRET_KEY,
      webhookSecret: values.STRIPE_WEBHOOK_SECRET,
      ...(values.STRIPE_API_BASE ? { apiBase: new URL(values.STRIPE_API_BASE) } : {}),
    },
    resend: {
      apiKey: values.RESEND_API_KEY,
      from: values.MAIL_FROM,
      ...(values.RESEND_API_BASE ? { apiBase: new URL(values.RESEND_API_BASE) } : {}),
    },
    uploadLimitBytes: values.UPLOAD_LIMIT_MB * 1024 * 1024,
    logLevel: values.LOG_LEVEL,
  }
}
