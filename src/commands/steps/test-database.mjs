import { openLocalServer } from '../../../db/local-server.mjs';
import { say } from './say.mjs';

export const testDatabasePrefix = 'dipwright_test';

/**
 * The tests' own MariaDB: never the demo's folder, port or databases.
 * @param {string} checkout
 */
export function openTestDatabase(checkout) {
  return openLocalServer({
    checkout,
    name: 'test',
    database: testDatabasePrefix,
    scratchPrefix: testDatabasePrefix,
    say,
  });
}

/**
 * Where the tests find it. The account may make and drop every database whose name begins with
 * the prefix.
 * @param {Awaited<ReturnType<typeof openTestDatabase>>} server
 * @returns {Record<string, string>}
 */
export function testDatabaseEnvironment(server) {
  return {
    DIPWRIGHT_TEST_DATABASE_HOST: server.host,
    DIPWRIGHT_TEST_DATABASE_PORT: String(server.port),
    DIPWRIGHT_TEST_DATABASE_USER: server.user,
    DIPWRIGHT_TEST_DATABASE_PASSWORD: server.password,
    DIPWRIGHT_TEST_DATABASE_PREFIX: testDatabasePrefix,
  };
}
