const closed = [/^\/_image(\/|$)/, /^\/_server-islands(\/|$)/, /^\/_actions(\/|$)/];

/**
 * Routes that the framework would open by itself and that the product does not use. They answer as
 * if they were not there.
 */
export function isClosedRoute(path: string): boolean {
  return closed.some((pattern) => pattern.test(path.toLowerCase()));
}
