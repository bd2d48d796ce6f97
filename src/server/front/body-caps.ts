const megabyte = 1024 * 1024;

/** First match counts. Forms of sign-in and sign-up are small; a tank design may be large. */
const caps: readonly { path: RegExp; bytes: number }[] = [
  { path: /^\/api\/v1\/(session|workshops)$/, bytes: 16 * 1024 },
  { path: /^\/api\/v1\/tanks\/[^/]+\/(readings|handovers)$/, bytes: 16 * 1024 },
  { path: /^\/api\//, bytes: megabyte },
];

/** The most bytes that a body sent to this path may have; pages take none. */
export function bodyCap(path: string): number {
  return caps.find((cap) => cap.path.test(path))?.bytes ?? 0;
}
