import { z } from 'zod'

import { cosineWindows } from '@/lib/core/spectrum/cosine-window'

import { idField } from '../form-fields'

export const captureSpectrumSchema = z.strictObject({
  evidenceId: idField,
  channel: z.coerce.number().int().min(0).max(63).default(0),
  from: z.coerce.number('Say from where.'),
  to: z.coerce.number('Say to where.'),
  window: z.enum(
    cosineWindows.map(({ id }) => id),
    { error: 'Choose one of the windows.' },
  ),
})
