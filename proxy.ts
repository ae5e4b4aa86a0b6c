import { NextResponse, type NextRequest } from 'next/server'

/**
 * Sets the security headers of every page. Nothing here decides who may see what: that is `lib/authz` alone.
 * Routes of evidence, reports and checks stay out of the matcher: a matched route has its body cut at 10 MB, and this
 * policy would replace the stricter one of their answers.
 */
export function proxy(request: NextRequest): NextResponse {
  const nonce = btoa(crypto.randomUUID())
  const policy = contentSecurityPolicy(nonce, process.env.NODE_ENV === 'development')
  const requestHeaders = new Headers(request.headers)
  requestHeaders.set('x-nonce', nonce)
  requestHeaders.set('content-security-policy', policy)
  const response = NextResponse.next({ request: { headers: requestHeaders } })
  response.headers.set('content-security-policy', policy)
  return response
}

function contentSecurityPolicy(nonce: string, isDevelopment: boolean): string {
  const scripts = `'self' 'nonce-${nonce}' 'strict-dynamic'${isDevelopment ? " 'unsafe-eval'" : ''}`
  const styles = isDevelopment ? "'self' 'unsafe-inline'" : `'self' 'nonce-${nonce}'`
  return [
    "default-src 'self'",
    `script-src ${scripts}`,
    `style-src ${styles}`,
    "img-src 'self' data: blob:",
    "font-src 'self'",
    `connect-src 'self'${isDevelopment ? ' ws:' : ''}`,
    "worker-src 'self' blob:",
    "object-src 'none'",
    "base-uri 'none'",
    "form-action 'self'",
    "frame-ancestors 'none'",
  ].join('; ')
}

export const config = { matcher: ['/((?!_next/static|fonts/|api/evidence/|api/reports/|api/check).*)'] }
