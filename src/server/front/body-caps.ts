const megabyte = 1024 * 1024;

/** First match counts. Forms of sign-in and sign-up are small; a tank design may be large. */
const caps: readonly { path: RegExp; bytes: number; streamed?: true }[] = [
  { path: /^\/api\/v1\/(session|workshops)$/, bytes: 16 * 1024 },
  { path: /^\/api\/v1\/tanks\/[^/]+\/(readings|handovers)$/, bytes: 16 * 1024 },
  { path: /^\/api\/v1\/meshes$/, bytes: 64 * megabyte, streamed: true },
  { path: /^\/api\//, bytes: megabyte },
];

/** The most bytes that a body sent to this path may have; pages take none. */
export function bodyCap(path: string): number {
  return caps.find((cap) => cap.path.test(path))?.bytes ?? 0;
}

/** Whether a body sent to this path is a file, passed on as it comes: nobody may make the server hold one in memory. */
export function isStreamed(path: string): boolean {
  return caps.find((cap) => cap.path.test(path))?.streamed ?? false;
}
