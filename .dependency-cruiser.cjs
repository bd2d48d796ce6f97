/*
 * The import table as rules, and which outside thing lives in which room. Checked by
 * tests/structure/import-table.test.ts, which also proves with planted faults that it bites.
 */
const { rooms } = require('./tests/structure/import-table.cjs');

const pathOf = (room) => `^src/${room}(/|\\.(ts|d\\.ts)$)`;

const roomRules = Object.entries(rooms).map(([room, mayImport]) => ({
  name: `room-${room.replace('/', '-')}`,
  comment: `${room} may import ${mayImport.length > 0 ? mayImport.join(', ') : 'nothing of ours'}.`,
  severity: 'error',
  from: { path: `^src/${room}/` },
  to: {
    path: '^(src|db|tests)/',
    pathNot: [room, ...mayImport].map(pathOf),
  },
}));

module.exports = {
  forbidden: [
    ...roomRules,
    {
      name: 'no-cycles',
      comment: 'Arrows go one way only.',
      severity: 'error',
      from: {},
      to: { circular: true },
    },
    {
      name: 'no-missing',
      comment: 'Every import leads somewhere.',
      severity: 'error',
      from: { path: '^(src|db)/' },
      to: { couldNotResolve: true, pathNot: '^astro:' },
    },
    {
      name: 'manifold-in-one-file',
      comment: 'The mesh library stands behind one file of geometry.',
      severity: 'error',
      from: { path: '^src/', pathNot: '^src/geometry/manifold[^/]*\\.ts$' },
      to: { path: 'manifold-3d' },
    },
    {
      name: 'three-in-viewport',
      comment: 'three and react-three-fiber live only in viewport.',
      severity: 'error',
      from: { path: '^src/', pathNot: '^src/viewport/' },
      to: { path: 'node_modules/(three|@react-three)/' },
    },
    {
      name: 'sequelize-in-database',
      comment: 'All Sequelize lives in server/database, and in the migrations and seeds of db.',
      severity: 'error',
      from: { path: '^(src|db)/', pathNot: '^(src/server/database|db)/' },
      to: { path: 'node_modules/(sequelize|mariadb|umzug)/', dependencyTypesNot: ['type-only'] },
    },
    {
      name: 'lucia-in-auth',
      comment: 'Lucia and argon2 live in server/auth.',
      severity: 'error',
      from: { path: '^src/', pathNot: '^src/server/auth/' },
      to: { path: 'node_modules/(lucia|@node-rs/argon2)/' },
    },
    {
      name: 'pdfkit-in-pdf',
      comment: 'pdfkit lives in server/pdf.',
      severity: 'error',
      from: { path: '^src/', pathNot: '^src/server/pdf/' },
      to: { path: 'node_modules/pdfkit/' },
    },
    {
      name: 'migrations-stand-alone',
      comment: 'A migration imports nothing of ours: it must stay true when the program changes.',
      severity: 'error',
      from: { path: '^db/migrations/' },
      to: { path: '^(src|db|tests)/', pathNot: '^db/migrations/' },
    },
    {
      name: 'no-tests-in-product',
      comment: 'The product imports no test and no package that is only for development.',
      severity: 'error',
      from: { path: '^(src|db)/' },
      to: { dependencyTypes: ['npm-dev'], dependencyTypesNot: ['type-only'] },
    },
    {
      name: 'plain-commands',
      comment: 'What runs before npm ci needs Node alone.',
      severity: 'error',
      from: {
        path: '^(src/commands/(start|test|dev)\\.mjs|src/commands/(steps|suites)/|db/local)',
      },
      to: { dependencyTypesNot: ['core', 'local'] },
    },
    {
      name: 'commands-are-not-imported',
      comment: 'Nothing of the product reaches into the commands.',
      severity: 'error',
      from: { path: '^src/', pathNot: '^src/commands/' },
      to: { path: '^src/commands/' },
    },
  ],
  options: {
    doNotFollow: { path: 'node_modules' },
    exclude: { path: '^(dist|\\.astro)/' },
    tsPreCompilationDeps: true,
    tsConfig: { fileName: 'tsconfig.json' },
    enhancedResolveOptions: {
      exportsFields: ['exports'],
      conditionNames: ['import', 'node', 'default', 'types'],
      mainFields: ['module', 'main', 'types'],
      extensions: ['.ts', '.tsx', '.d.ts', '.mjs', '.js', '.astro', '.css'],
    },
  },
};
