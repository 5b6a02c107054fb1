/**
 * Who may import whom: one table, asked by the lint rule (at once, in the editor) and by dependency-cruiser (over the
 * whole graph). `from` and `to` are regular expressions on paths from the project's root; everything a room imports
 * must be in its `to`.
 */
const SPEC = '\\.spec\\.ts$';

const ROOMS = [
  { name: 'domain', from: '^src/domain/', to: ['^src/domain/'], packages: ['decimal.js'] },
  { name: 'contracts', from: '^src/contracts/', to: ['^src/contracts/', '^src/domain/'], packages: ['zod'] },
  {
    name: 'ui',
    from: '^src/app/ui/',
    to: ['^src/app/ui/', '^src/domain/'],
    packages: ['@angular/(core|common|forms|material|cdk|platform-browser)', 'chart.js', 'ng2-charts', 'rxjs'],
  },
  {
    name: 'core',
    from: '^src/app/core/',
    to: ['^src/app/(core|ui)/', '^src/(contracts|domain)/'],
    packages: ['@angular/.+', 'rxjs', 'zod'],
  },
  {
    name: 'features',
    from: '^src/app/features/([^/]+)/',
    to: ['^src/app/features/$1/', '^src/app/(core|ui)/', '^src/(contracts|domain)/'],
    packages: ['@angular/.+', 'chart.js', 'ng2-charts', 'rxjs', 'zod'],
  },
  { name: 'http', from: '^server/http/', to: ['^server/(http|db/authorized)', '^src/(contracts|domain)/'] },
  { name: 'db', from: '^server/db/', to: ['^server/db/', '^server/http/problem', '^src/domain/'] },
  { name: 'reference-data', from: '^server/reference-data/', to: ['^server/reference-data/', '^src/domain/'] },
  { name: 'services', from: '^server/services/', to: ['^server/services/', '^src/domain/'] },
  {
    name: 'modules',
    from: '^server/modules/([^/]+)/',
    to: [
      '^server/modules/$1/',
      '^server/modules/[^/]+/[^/]+\\.service\\.ts$',
      '^server/(http|db|services|reference-data)/',
      '^src/(contracts|domain)/',
    ],
  },
  {
    name: 'seeds',
    from: '^seeds/',
    to: [
      '^seeds/',
      '^server/composition\\.ts$',
      '^server/modules/[^/]+/[^/]+\\.service\\.ts$',
      '^server/(db|reference-data)/',
      '^src/(contracts|domain)/',
    ],
  },
];

module.exports = { ROOMS, SPEC };
