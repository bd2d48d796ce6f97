/**
 * Who asks. Each trusted proxy appends the address it saw to X-Forwarded-For, so with n of them the
 * n-th entry from the end is the first that no stranger could have written. Without trusted
 * proxies the header counts for nothing.
 */
export function clientAddress(
  socketAddress: string | undefined,
  forwardedFor: string | undefined,
  trustedProxies: number,
): string {
  const direct = plain(socketAddress ?? 'unknown');
  if (trustedProxies === 0 || !forwardedFor) return direct;
  const seen = forwardedFor.split(',').map((entry) => entry.trim());
  const entry = seen[Math.max(0, seen.length - trustedProxies)] ?? '';
  return /^[0-9A-Fa-f.:]{2,45}$/.test(entry) ? plain(entry) : direct;
}

/** An IPv4 address that came in over an IPv6 socket is the same address. */
function plain(address: string): string {
  return address.replace(/^::ffff:(?=\d+\.)/i, '');
}
