import type { Context } from './context';

const key = Symbol.for('dipwright.development-context');

/**
 * The context under `npm run dev`, where the framework runs without our entry: made at the first
 * request and kept when a changed module is loaded anew.
 */
export function developmentContext(): Promise<Context> {
  const kept = globalThis as { [key]?: Promise<Context> };
  kept[key] ??= compose();
  return kept[key];
}

async function compose(): Promise<Context> {
  const [{ composeContext }, { readConfig }] = await Promise.all([
    import('./compose'),
    import('./config'),
  ]);
  return composeContext(readConfig());
}
