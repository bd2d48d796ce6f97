import { useSyncExternalStore } from 'react';

const nothing = () => () => {};

/**
 * false on the server and until React has taken the page over. What would be lost if it were typed
 * or pressed before that is disabled until then.
 */
export function useAwake(): boolean {
  return useSyncExternalStore(
    nothing,
    () => true,
    () => false,
  );
}
