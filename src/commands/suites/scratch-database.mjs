import { administer } from '../../../db/local/administer.mjs';

/** An empty database of the test server; its name begins with the tests' prefix. */
export function makeDatabase(server, name) {
  dropDatabase(server, name);
  administer(
    server.folder,
    `CREATE DATABASE \`${name}\` CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci;`,
  );
}

export function dropDatabase(server, name) {
  administer(server.folder, `DROP DATABASE IF EXISTS \`${name}\`;`);
}
