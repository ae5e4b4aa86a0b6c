import { z } from 'zod'

import { startResendFake } from './resend/resend-fake'
import { startStripeFake } from './stripe/stripe-fake'

const port = z.coerce.number().int().min(0).max(65_535)

const settings = z
  .object({
    STRIPE_FAKE_PORT: port.default(4010),
    RESEND_FAKE_PORT: port.default(4020),
    WEBHOOK_URL: z.url(),
    STRIPE_WEBHOOK_SECRET: z.string().min(16),
  })
  .parse(process.env)

const payments = await startStripeFake({
  port: settings.STRIPE_FAKE_PORT,
  webhookUrl: settings.WEBHOOK_URL,
  webhookSecret: settings.STRIPE_WEBHOOK_SECRET,
})
const mail = await startResendFake({ port: settings.RESEND_FAKE_PORT })

process.stdout.write(`Payments stand-in  ${payments.url}/panel\nMail stand-in      ${mail.url}\n`)

const stop = () => {
  void Promise.all([payments.close(), mail.close()]).then(() => process.exit(0))
}
process.once('SIGTERM', stop)
process.once('SIGINT', stop)
