import { randomBytes } from 'node:crypto'
import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs'
import path from 'node:path'

/** Secrets of a local portal, made once and kept beside its data so that a restart opens what it sealed. */
function localSecrets(dataFolder) {
  const file = path.join(dataFolder, 'secrets.json')
  if (existsSync(file)) return JSON.parse(readFileSync(file, 'utf8'))
  const make = () => randomBytes(32).toString('base64url')
  const secrets = { auth: make(), authority: make(), webhook: `whsec_${make()}` }
  mkdirSync(dataFolder, { recursive: true })
  writeFileSync(file, JSON.stringify(secrets), { mode: 0o600 })
  return secrets
}

/** The settings of a portal on this machine whose payments and mail go to the local fakes. */
export function localSettings({ dataFolder, port, stripePort, resendPort }) {
  const secrets = localSecrets(dataFolder)
  const publicUrl = `http://localhost:${port}`
  return {
    PUBLIC_URL: publicUrl,
    DATA_DIR: dataFolder,
    PRACTICE_NAME: 'Tarn Hollow EMC',
    PRACTICE_ADDRESS: '1 Weir Lane, Tarn Hollow (demo)',
    AUTH_SECRET: secrets.auth,
    AUTHORITY_PASSPHRASE: secrets.authority,
    STRIPE_SECRET_KEY: 'sk_test_local_fake',
    STRIPE_WEBHOOK_SECRET: secrets.webhook,
    STRIPE_API_BASE: `http://127.0.0.1:${stripePort}`,
    RESEND_API_KEY: 're_local_fake',
    RESEND_API_BASE: `http://127.0.0.1:${resendPort}`,
    MAIL_FROM: 'Tarn Hollow EMC <portal@tarnhollow.example>',
    STRIPE_FAKE_PORT: String(stripePort),
    RESEND_FAKE_PORT: String(resendPort),
    WEBHOOK_URL: `${publicUrl}/api/stripe/webhook`,
    NEXT_TELEMETRY_DISABLED: '1',
    NODE_ENV: 'production',
  }
}
