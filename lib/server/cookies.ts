import 'server-only'

/** `__Host-` ties a cookie to this very host, to HTTPS (or localhost) and to the whole path. */
const options = { httpOnly: true, secure: true, sameSite: 'lax', path: '/' } as const

export const cookieNames = {
  session: { name: '__Host-quellbench-session', options },
  csrf: { name: '__Host-quellbench-csrf', options },
  callback: { name: '__Host-quellbench-return', options },
  browser: { name: '__Host-quellbench-browser', options },
} as const
