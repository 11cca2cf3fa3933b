/** Where a page may load things from. A script needs the nonce of its request or comes from this site as a file. */
export function contentPolicy(
  nonce: string,
  given: { readonly development: boolean; readonly https: boolean },
): string {
  const rules: Readonly<Record<string, string>> = {
    'default-src': "'self'",
    'script-src': `'self' 'nonce-${nonce}' 'wasm-unsafe-eval'${given.development ? " 'unsafe-eval'" : ''}`,
    // style attributes carry computed places and colours; style elements and files are this site's only
    'style-src': given.development ? "'self' 'unsafe-inline'" : `'self' 'nonce-${nonce}'`,
    'style-src-attr': "'unsafe-inline'",
    'img-src': "'self' blob: data:",
    'font-src': "'self'",
    'connect-src': "'self' blob: data:",
    'worker-src': "'self' blob:",
    'frame-src': "'none'",
    'object-src': "'none'",
    'base-uri': "'none'",
    'form-action': "'self'",
    'frame-ancestors': "'none'",
    'manifest-src': "'self'",
    ...(given.https && { 'upgrade-insecure-requests': '' }),
  };
  return Object.entries(rules)
    .map(([name, value]) => `${name} ${value}`.trim())
    .join('; ');
}

/** For answers that are data and load nothing. */
export const DATA_POLICY = "default-src 'none'; frame-ancestors 'none'";

/** On every answer, file or page. */
export const STANDING_HEADERS: Readonly<Record<string, string>> = {
  'X-Content-Type-Options': 'nosniff',
  'X-Frame-Options': 'DENY',
  'Referrer-Policy': 'same-origin',
  'Cross-Origin-Opener-Policy': 'same-origin',
  'Cross-Origin-Resource-Policy': 'same-origin',
  'Permissions-Policy': 'camera=(), microphone=(), geolocation=(), payment=(), usb=(), browsing-topics=()',
};

export const TRANSPORT_SECURITY = 'max-age=63072000; includeSubDomains';
