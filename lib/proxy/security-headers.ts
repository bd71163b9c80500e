/**
 * Scripts and style elements only with the page's nonce. Style attributes are allowed: charts position their parts with them.
 * Development needs eval (hot reload), a socket, and style elements without a nonce, which a nonce in the list would switch off.
 */
export const contentPolicy = (nonce: string, isDevelopment: boolean): string => [
  `default-src 'self'`,
  `script-src 'self' 'nonce-${nonce}' 'strict-dynamic'${isDevelopment ? ` 'unsafe-eval'` : ''}`,
  `style-src 'self' ${isDevelopment ? `'unsafe-inline'` : `'nonce-${nonce}'`}`,
  `style-src-attr 'unsafe-inline'`,
  `img-src 'self' blob: data:`,
  `font-src 'self'`,
  `worker-src 'self'`,
  `connect-src 'self'${isDevelopment ? ' ws:' : ''}`,
  `object-src 'none'`,
  `base-uri 'self'`,
  `form-action 'self'`,
  `frame-ancestors 'none'`,
].join('; ')

export const securityHeaders = (policy: string): Record<string, string> => ({
  'content-security-policy': policy,
  'x-content-type-options': 'nosniff',
  'x-frame-options': 'DENY',
  'referrer-policy': 'same-origin',
  'cross-origin-opener-policy': 'same-origin',
  'cross-origin-resource-policy': 'same-origin',
  'permissions-policy': 'camera=(), microphone=(), geolocation=(), payment=()',
  // Only where the shop is reached over TLS: on plain loopback it would lock the browser out.
  ...(process.env.COOKIE_SECURE === '1' ? { 'strict-transport-security': 'max-age=31536000' } : {}),
})
