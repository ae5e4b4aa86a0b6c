'use server'

import { action } from '@/lib/server/action'
import { certificates, sessions } from '@/lib/server/operations'

export const signOutEverywhere = action(sessions.signOutEverywhere, { goTo: () => '/sign-in' })

export const createCertificate = action(certificates.createCertificate)
