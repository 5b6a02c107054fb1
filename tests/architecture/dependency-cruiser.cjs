// The transitive check of the import rules: `npm run boundaries`.
const { ROOMS, SPEC } = require('./import-rules.cjs');

const LOCAL = '^(src|server|seeds|tests|data)/';

/** Each room may import its own list and nothing else of the project, and only the packages named where it names any. */
const roomRules = ROOMS.flatMap(({ name, from, to, packages }) => [
  {
    name: `${name}-imports`,
    severity: 'error',
    from: { path: from, pathNot: SPEC },
    to: { path: LOCAL, pathNot: to },
  },
  ...(packages === undefined
    ? []
    : [
        {
          name: `${name}-packages`,
          severity: 'error',
          from: { path: from, pathNot: SPEC },
          to: {
            path: 'node_modules/',
            pathNot: packages.map((p) => `node_modules/${p}(/|$)`).concat('node_modules/tslib/'),
          },
        },
      ]),
]);

module.exports = {
  forbidden: [
    ...roomRules,
    {
      name: 'no-cycles',
      severity: 'error',
      from: { path: LOCAL },
      to: { circular: true, viaOnly: { dependencyTypesNot: ['type-only'] } },
    },
    {
      name: 'decimal-behind-money',
      severity: 'error',
      from: { path: '^(src|server)/', pathNot: '^src/domain/money/' },
      to: { path: 'node_modules/decimal\\.js' },
    },
    {
      name: 'only-repos-import-drizzle',
      severity: 'error',
      from: { path: '^server/modules/', pathNot: '\\.repo\\.ts$' },
      to: { path: 'node_modules/(drizzle-orm|better-sqlite3)' },
    },
    {
      name: 'routes-ask-services',
      severity: 'error',
      from: { path: '\\.routes\\.ts$' },
      to: { path: '\\.repo\\.ts$' },
    },
    {
      name: 'browser-never-reaches-server',
      severity: 'error',
      from: { path: '^src/' },
      to: { path: '^(server|seeds)/', reachable: true },
    },
    {
      name: 'server-never-reaches-app',
      severity: 'error',
      from: { path: '^server/' },
      to: { path: '^src/app/', reachable: true },
    },
    {
      name: 'nothing-imports-tests',
      severity: 'error',
      from: { path: '^(src|server|seeds)/', pathNot: SPEC },
      to: { path: '^tests/' },
    },
    { name: 'no-unresolvable', severity: 'error', from: { path: LOCAL }, to: { couldNotResolve: true } },
  ],
  options: {
    doNotFollow: { path: 'node_modules' },
    tsPreCompilationDeps: true,
    tsConfig: { fileName: 'tests/tsconfig.json' },
    enhancedResolveOptions: {
      exportsFields: ['exports'],
      conditionNames: ['import', 'require', 'node', 'default', 'types'],
    },
  },
};
