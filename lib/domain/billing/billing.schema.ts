import { z } from 'zod'

import { idField } from '../form-fields'

export const companyIdSchema = z.strictObject({ companyId: idField })

export const startCheckoutSchema = z.strictObject({ companyId: idField, offerId: idField })

export const purchaseIdSchema = z.strictObject({ purchaseId: idField })

export const deliverySchema = z.strictObject({ rawBody: z.string(), signature: z.string().nullable() })
