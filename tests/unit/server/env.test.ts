import { describe, expect, it } from 'vitest'

import { parseEnv } from '@/lib/server/env'

const complete = {
  PUBLIC_URL: 'https://portal.practice.example/',
  DATA_DIR: '/var/lib/quellbench',
  PRACTICE_NAME: 'Tarn Hollow EMC',
  AUTH_SECRET: 'a'.repeat(32),
  AUTHORITY_PASSPHRASE: 'b'.repeat(32),
  STRIPE_SECRET_KEY: 'sk_test_example',
  STRIPE_WEBHOOK_SECRET: 'whsec_example_secret',
  RESEND_API_KEY: 're_example',
  MAIL_FROM: 'Practice <portal@practice.example>',
}

describe('settings', () => {
  it('use the real services when no other address is given', () => {
    const env = parseEnv(complete)
    expect(env.stripe).not.toHaveProperty('apiBase')
    expect(env.resend).not.toHaveProperty('apiBase')
    expect(env.publicUrl).toBe('https://portal.practice.example')
  })

  it.each(Object.keys(complete))('ST1, RB3: stop the start when %s is missing, naming it', (name) => {
    const incomplete: Record<string, string> = { ...complete, [name]: '' }
    expect(() => parseEnv(incomplete)).toThrow(name)
  })

  it('name every wrong value at once', () => {
    const wrong = { ...complete, PUBLIC_URL: 'portal', AUTH_SECRET: 'short', LOG_LEVEL: 'loud' }
    expect(() => parseEnv(wrong)).toThrow(/PUBLIC_URL[\s\S]*AUTH_SECRET/)
  })
})
