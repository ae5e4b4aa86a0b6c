import { z } from 'zod'

import { idField } from '../form-fields'

const channel = z.coerce.number('Choose a channel.').int('Choose a channel.').min(0).max(63).default(0)

export const compareCapturesSchema = z.strictObject({
  first: idField,
  second: idField,
  firstChannel: channel,
  secondChannel: channel,
})
