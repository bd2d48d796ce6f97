import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Role } from '~/domain/access/roles';
import { createSessions } from '~/server/auth/sessions';
import { readConfig } from '~/server/config';
import type { Context } from '~/server/context';
import type { ComputePool } from '~/server/jobs/compute-pool';
import { createLog } from '~/server/log';
import { localFiles } from '~/server/storage/local-files';
import { addWorkshop, type Team } from '../../../db/seeds/add-workshop';
import { freshDatabase, type FreshDatabase } from '../../support/database';
import { boxPool } from './box-pool';

export const ownOrigin = 'http://127.0.0.1:4321';
export const password = 'true-litres-2026';

/** A context over a fresh database, and what a test may want to see of it. */
export interface House extends FreshDatabase {
  context: Context;
  /** Where uploads are kept; goes with the database. */
  storageFolder: string;
  /** Lines of the log, as written. */
  logged: string[];
  /** Moves the clock of the context. */
  later(seconds: number): void;
}

export async function openHouse(
  options: { computePool?: ComputePool; tls?: boolean } = {},
): Promise<House> {
  const fresh = await freshDatabase();
  const storageFolder = await mkdtemp(join(tmpdir(), 'dipwright-storage-'));
  const logged: string[] = [];
  let aheadMs = 0;
  const config = readConfig({
    DIPWRIGHT_MODE: 'test',
    DIPWRIGHT_ORIGIN: options.tls === true ? 'https://dipwright.example' : ownOrigin,
    DIPWRIGHT_DATABASE_HOST: fresh.address.host,
    DIPWRIGHT_DATABASE_PORT: String(fresh.address.port),
    DIPWRIGHT_DATABASE_NAME: fresh.address.name,
    DIPWRIGHT_DATABASE_USER: fresh.address.user,
    DIPWRIGHT_DATABASE_PASSWORD: fresh.address.password,
  });
  const context: Context = {
    config,
    log: createLog('info', (line) => logged.push(line)),
    database: fresh.database,
    sessions: createSessions(fresh.database, { tls: config.http.tls }),
    computePool: options.computePool ?? boxPool(),
    clock: { now: () => new Date(Date.now() + aheadMs) },
    storage: localFiles(storageFolder),
    close: () => fresh.drop(),
  };
  const drop = async () => {
    await fresh.drop();
    await rm(storageFolder, { recursive: true });
  };
  return {
    ...fresh,
    drop,
    context,
    logged,
    storageFolder,
    later: (seconds) => (aheadMs += seconds * 1000),
  };
}

let workshops = 0;

/** A workshop with a member of every role. */
export async function addTestWorkshop(house: House, name = 'Tarnside Outfitters'): Promise<Team> {
  workshops += 1;
  const person = (role: Role) => ({
    name: `${role} of ${name}`,
    email: `${role}@w${workshops}.example`,
  });
  const people = {
    manager: person('manager'),
    designer: person('designer'),
    fitter: person('fitter'),
    owner: person('owner'),
  };
  return addWorkshop(house.context, { name, password, people });
}
