/** What a page may load and do; sent as a header with every file, by the desktop program and by the local server. */
const directives = {
  'default-src': "'none'",
  'script-src': "'self'",
  'style-src': "'self'",
  'img-src': "'self' data: blob:",
  'font-src': "'self'",
  'connect-src': "'self'",
  'worker-src': "'self'",
  'frame-src': "'none'",
  'object-src': "'none'",
  'base-uri': "'none'",
  'form-action': "'none'",
  'frame-ancestors': "'none'",
} as const;

export const contentPolicy = Object.entries(directives)
  .map(([name, sources]) => `${name} ${sources}`)
  .join('; ');

export const securityHeaders: Readonly<Record<string, string>> = {
  'content-security-policy': contentPolicy,
  'cross-origin-opener-policy': 'same-origin',
  'cross-origin-embedder-policy': 'require-corp',
  'cross-origin-resource-policy': 'same-origin',
  'permissions-policy':
    'camera=(), microphone=(), geolocation=(), usb=(), serial=(), hid=(), payment=(), display-capture=()',
  'referrer-policy': 'no-referrer',
  'x-content-type-options': 'nosniff',
  // Files change with each build while their addresses partly stay.
  'cache-control': 'no-cache',
};
