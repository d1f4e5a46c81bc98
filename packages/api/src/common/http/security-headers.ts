const HSTS = 'max-age=31536000';

/** On every answer. What is no page may load nothing and be framed by nobody; the page sets its own policy. */
export function securityHeaders(https: boolean): Record<string, string> {
  return {
    'content-security-policy':
      "default-src 'none'; base-uri 'none'; form-action 'none'; frame-ancestors 'none'",
    'cross-origin-opener-policy': 'same-origin',
    'cross-origin-resource-policy': 'same-origin',
    'permissions-policy': 'camera=(self), geolocation=(), microphone=(), payment=(), usb=()',
    // Tokens travel in addresses of mailed links: no other site is told where somebody came from.
    'referrer-policy': 'same-origin',
    'x-content-type-options': 'nosniff',
    'x-frame-options': 'DENY',
    ...(https ? { 'strict-transport-security': HSTS } : {}),
  };
}
