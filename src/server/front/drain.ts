import type { Server } from 'node:http';
import { setTimeout as delay } from 'node:timers/promises';
import type { DrainState } from './drain-state';

/**
 * Leaves in good order: first /readyz says so while requests are still taken (`leaveSeconds`, for
 * a load balancer to notice), then no new connection is taken and those under way may finish
 * (`drainSeconds`), then what is left is cut.
 */
export async function drain(
  server: Server,
  state: DrainState,
  { leaveSeconds, drainSeconds }: { leaveSeconds: number; drainSeconds: number },
): Promise<void> {
  state.leaving = true;
  if (leaveSeconds > 0) await delay(leaveSeconds * 1000);
  const closed = new Promise<void>((resolve) => server.close(() => resolve()));
  const sweep = setInterval(() => server.closeIdleConnections(), 100);
  const cut = setTimeout(() => server.closeAllConnections(), drainSeconds * 1000);
  await closed;
  clearInterval(sweep);
  clearTimeout(cut);
}
