import 'server-only'
import NextAuth from 'next-auth'

import { authOptions } from './auth-options'
import { container } from './container'

type Handler = (request: Request, context: unknown) => Promise<Response>

function isHandler(value: unknown): value is Handler {
  return typeof value === 'function'
}

/** next-auth's own routes: the token against forged sign-ins, sign-in and sign-out. */
export const authHandler: Handler = async (request, context) => {
  // next-auth has no option for its own address; it reads this variable at every request.
  process.env.NEXTAUTH_URL = container().env.publicUrl
  const handler: unknown = NextAuth(authOptions())
  if (!isHandler(handler)) throw new Error('next-auth did not give a request handler')
  return handler(request, context)
}
