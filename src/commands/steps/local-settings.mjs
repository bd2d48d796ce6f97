import { availableParallelism } from 'node:os';

/** Address that `npm start` and `npm run dev` serve under, unless the environment says otherwise. */
export function webAddress(env = process.env) {
  const host = env.DIPWRIGHT_HOST || '127.0.0.1';
  const port = Number(env.DIPWRIGHT_PORT || 4321);
  return { host, port, origin: env.DIPWRIGHT_ORIGIN || `http://${host}:${port}` };
}

/**
 * The settings of the local product: those of the environment, with the local database and quiet
 * logs where nothing else is said.
 * @param {{ host: string, port: number, user: string, password: string, database: string }} server
 * @returns {Record<string, string>}
 */
export function localSettings(server, env = process.env) {
  return {
    DIPWRIGHT_LOG_LEVEL: env.DIPWRIGHT_LOG_LEVEL || 'warn',
    DIPWRIGHT_COMPUTE_WORKERS:
      env.DIPWRIGHT_COMPUTE_WORKERS || String(Math.min(4, availableParallelism())),
    DIPWRIGHT_DATABASE_HOST: server.host,
    DIPWRIGHT_DATABASE_PORT: String(server.port),
    DIPWRIGHT_DATABASE_NAME: server.database,
    DIPWRIGHT_DATABASE_USER: server.user,
    DIPWRIGHT_DATABASE_PASSWORD: server.password,
  };
}
