/** What the policy allows; sources that a page adds (hashes of its inline pieces) join script-src and style-src. */
const directives: readonly (readonly [name: string, ...sources: string[]])[] = [
  ['default-src', "'none'"],
  ['script-src', "'self'", "'wasm-unsafe-eval'"],
  ['style-src', "'self'"],
  ['img-src', "'self'", 'data:', 'blob:'],
  ['font-src', "'self'"],
  ['connect-src', "'self'"],
  ['worker-src', "'self'"],
  ['manifest-src', "'self'"],
  ['base-uri', "'none'"],
  ['form-action', "'self'"],
  ['frame-ancestors', "'none'"],
];

/**
 * The Content-Security-Policy header. From the policy that the framework made for a page only the
 * hashes are taken over (minus those in `drop`: hashes of files, which 'self' covers already).
 */
export function contentSecurityPolicy(
  pagePolicy?: string,
  drop: ReadonlySet<string> = new Set(),
): string {
  const ofPage = new Map(
    (pagePolicy ?? '').split(';').map((directive) => {
      const [name = '', ...sources] = directive.trim().split(/\s+/);
      return [
        name,
        sources.filter((source) => /^'sha(256|384|512)-[A-Za-z0-9+/]+=*'$/.test(source)),
      ] as const;
    }),
  );
  return directives
    .map(([name, ...sources]) =>
      [name, ...sources, ...(ofPage.get(name) ?? []).filter((hash) => !drop.has(hash))].join(' '),
    )
    .join('; ');
}

/** Headers of every answer, whatever it is. HSTS only where browsers reach us over TLS. */
export function securityHeaders(tls: boolean): Record<string, string> {
  return {
    'Content-Security-Policy': contentSecurityPolicy(),
    'X-Content-Type-Options': 'nosniff',
    'Referrer-Policy': 'no-referrer',
    'Cross-Origin-Opener-Policy': 'same-origin',
    'Cross-Origin-Resource-Policy': 'same-origin',
    'Permissions-Policy':
      'camera=(), geolocation=(), microphone=(), payment=(), usb=(), browsing-topics=()',
    ...(tls ? { 'Strict-Transport-Security': 'max-age=63072000; includeSubDomains' } : {}),
  };
}
