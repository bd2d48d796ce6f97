import { z } from 'zod/v4';

/**
 * The whole configuration: one schema over the environment. What has a default is safe with it;
 * secrets have none, in no mode. docs/operations.md lists every setting.
 */
const environment = z.object({
  DIPWRIGHT_MODE: z.enum(['production', 'development', 'test']).default('production'),
  DIPWRIGHT_HOST: z.string().min(1).default('127.0.0.1'),
  DIPWRIGHT_PORT: wholeNumber(1, 65_535).default(4321),
  DIPWRIGHT_ORIGIN: z
    .string()
    .refine(isOrigin, 'must be an origin such as https://dipwright.example')
    .optional(),
  DIPWRIGHT_ALLOWED_HOSTS: z
    .string()
    .refine(areHosts, 'must be host names, with a port where one is used, parted by commas')
    .optional(),
  DIPWRIGHT_TRUSTED_PROXIES: wholeNumber(0, 10).default(0),
  DIPWRIGHT_LEAVE_SECONDS: wholeNumber(0, 600).default(0),
  DIPWRIGHT_DRAIN_SECONDS: wholeNumber(0, 600).default(20),
  DIPWRIGHT_DATABASE_HOST: z.string('is missing').min(1, 'is empty'),
  DIPWRIGHT_DATABASE_PORT: wholeNumber(1, 65_535).default(3306),
  DIPWRIGHT_DATABASE_NAME: z
    .string('is missing')
    .regex(/^[A-Za-z0-9_]{1,64}$/, 'must be 1 to 64 letters, digits and underscores'),
  DIPWRIGHT_DATABASE_USER: z.string('is missing').min(1, 'is empty'),
  DIPWRIGHT_DATABASE_PASSWORD: z.string('is missing').min(1, 'is empty'),
  DIPWRIGHT_DATABASE_POOL: wholeNumber(1, 200).default(10),
  DIPWRIGHT_COMPUTE_WORKERS: wholeNumber(1, 64).default(2),
  DIPWRIGHT_COMPUTE_WORKER_FILE: z.string().min(1).optional(),
  DIPWRIGHT_STORAGE_FOLDER: z.string().min(1).default('.data/storage'),
  DIPWRIGHT_LOG_LEVEL: z.enum(['debug', 'info', 'warn', 'error']).default('info'),
});

export interface Config {
  mode: 'production' | 'development' | 'test';
  http: {
    host: string;
    port: number;
    /** Scheme, host and port under which browsers reach the product. */
    origin: string;
    /** Values of the Host header that are answered, lower case. */
    allowedHosts: readonly string[];
    /** How many proxies of our own stand in front, each of which adds to X-Forwarded-For. */
    trustedProxies: number;
    /** Browsers reach the product over TLS: cookies are Secure and HSTS is sent. */
    tls: boolean;
    /** How long /readyz says "leaving" after SIGTERM while requests are still taken. */
    leaveSeconds: number;
    /** How long requests under way may take to finish after SIGTERM. */
    drainSeconds: number;
  };
  database: {
    host: string;
    port: number;
    name: string;
    user: string;
    password: string;
    poolSize: number;
  };
  compute: {
    workers: number;
    /** The built worker; where it is not given, whoever makes the pool knows the source file. */
    workerFile: string | undefined;
  };
  /** Folder of files that are too large for the database. */
  storage: { folder: string };
  log: { level: 'debug' | 'info' | 'warn' | 'error' };
}

/** Names every fault of the configuration at once; never a value, since one may be a secret. */
export class ConfigError extends Error {
  constructor(readonly faults: readonly string[]) {
    super(
      `The configuration has ${faults.length === 1 ? 'a fault' : `${faults.length} faults`}: ${faults.join('; ')}.`,
    );
    this.name = 'ConfigError';
  }
}

/** Reads and checks the configuration; throws `ConfigError`. */
export function readConfig(env: Record<string, string | undefined> = process.env): Config {
  const read = environment.safeParse(withoutEmpty(env));
  if (!read.success) {
    throw new ConfigError(
      read.error.issues.map((issue) => `${issue.path.join('.')} ${issue.message}`),
    );
  }
  const at = read.data;
  const origin = at.DIPWRIGHT_ORIGIN ?? `http://${at.DIPWRIGHT_HOST}:${at.DIPWRIGHT_PORT}`;
  return {
    mode: at.DIPWRIGHT_MODE,
    http: {
      host: at.DIPWRIGHT_HOST,
      port: at.DIPWRIGHT_PORT,
      origin,
      allowedHosts: allowedHosts(origin, at.DIPWRIGHT_PORT, at.DIPWRIGHT_ALLOWED_HOSTS),
      trustedProxies: at.DIPWRIGHT_TRUSTED_PROXIES,
      tls: origin.startsWith('https:'),
      leaveSeconds: at.DIPWRIGHT_LEAVE_SECONDS,
      drainSeconds: at.DIPWRIGHT_DRAIN_SECONDS,
    },
    database: {
      host: at.DIPWRIGHT_DATABASE_HOST,
      port: at.DIPWRIGHT_DATABASE_PORT,
      name: at.DIPWRIGHT_DATABASE_NAME,
      user: at.DIPWRIGHT_DATABASE_USER,
      password: at.DIPWRIGHT_DATABASE_PASSWORD,
      poolSize: at.DIPWRIGHT_DATABASE_POOL,
    },
    compute: {
      workers: at.DIPWRIGHT_COMPUTE_WORKERS,
      workerFile: at.DIPWRIGHT_COMPUTE_WORKER_FILE,
    },
    storage: { folder: at.DIPWRIGHT_STORAGE_FOLDER },
    log: { level: at.DIPWRIGHT_LOG_LEVEL },
  };
}

/** A name set to nothing is as good as not set. */
function withoutEmpty(env: Record<string, string | undefined>): Record<string, string | undefined> {
  return Object.fromEntries(Object.entries(env).filter(([, value]) => value !== ''));
}

function wholeNumber(least: number, most: number) {
  const inRange = (text: string) =>
    /^\d{1,9}$/.test(text) && Number(text) >= least && Number(text) <= most;
  return z
    .string()
    .refine(inRange, `must be a whole number from ${least} to ${most}`)
    .transform(Number);
}

function isOrigin(value: string): boolean {
  return (
    URL.canParse(value) &&
    /^https?:$/.test(new URL(value).protocol) &&
    new URL(value).origin === value
  );
}

function areHosts(value: string): boolean {
  return value
    .split(',')
    .every((host) =>
      /^[A-Za-z0-9.-]+(:\d{1,5})?$|^\[[0-9A-Fa-f:]+\](:\d{1,5})?$/.test(host.trim()),
    );
}

/** The origin's own host, what is listed, and, where the origin is this machine, its other names. */
function allowedHosts(origin: string, port: number, listed: string | undefined): string[] {
  const hosts = new Set([new URL(origin).host]);
  for (const host of listed?.split(',') ?? []) hosts.add(host.trim().toLowerCase());
  if (['127.0.0.1', 'localhost'].includes(new URL(origin).hostname)) {
    for (const name of ['127.0.0.1', 'localhost']) hosts.add(`${name}:${port}`);
  }
  return [...hosts];
}
