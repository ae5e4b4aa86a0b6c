'use client'

import { signOut } from 'next-auth/react'
import { useState } from 'react'

import { Button } from '../ui/button'

export const SignOutForm = () => {
  const [isPending, setPending] = useState(false)
  return (
    <Button
      size="small"
      aria-disabled={isPending || undefined}
      onClick={() => {
        setPending(true)
        void signOut({ callbackUrl: '/sign-in' })
      }}
    >
      {isPending ? 'Signing out…' : 'Sign out'}
    </Button>
  )
}
