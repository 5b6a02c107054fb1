import { spawnSync } from 'node:child_process';
import { mkdirSync, rmSync, writeFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { ROOT } from '../support/root';

const PLANTED = join(ROOT, '.scratch', 'planted');

/** A small tree of the house's shape that keeps every rule. */
const HOUSE = {
  'src/domain/pure.ts': 'export const pure = 1;\n',
  'src/contracts/thing.ts': "export { pure } from '../domain/pure';\n",
  'src/app/ui/part.ts': "export { pure } from '../../domain/pure';\n",
  'src/app/core/client.ts': "export { part } from '../ui/part';\nexport { pure } from '../../contracts/thing';\n",
  'src/app/features/one/one.ts': "export { part } from '../../core/client';\n",
  'server/http/route.ts': "export { pure } from '../../src/contracts/thing';\n",
  'server/db/client.ts': "export * from 'drizzle-orm';\n",
  'server/modules/one/one.service.ts': "export { repo } from './one.repo';\n",
  'server/modules/one/one.repo.ts': "import 'drizzle-orm';\nexport const repo = 1;\n",
  'server/modules/two/two.service.ts': "export { repo } from '../one/one.service';\n",
  'seeds/demo.ts': "export { repo } from '../server/modules/one/one.service';\n",
  'tests/support/help.ts': 'export const help = 1;\n',
  'tests/tsconfig.json':
    '{ "compilerOptions": { "module": "preserve", "moduleResolution": "bundler" }, "files": ["support/help.ts"] }',
  'eslint.config.mjs': `
    import tseslint from 'typescript-eslint';
    import imports from '../../tests/architecture/eslint-import-rules.mjs';
    export default [{
      files: ['**/*.ts'],
      languageOptions: { parser: tseslint.parser },
      plugins: { house: { rules: { imports } } },
      rules: { 'house/imports': 'error' },
    }];`,
};

/** What is planted, where, importing what, and the rule of the transitive check that must refuse it. */
const DIRECT = [
  ['the domain reads a contract', 'src/domain/bad-1.ts', '../contracts/thing', 'domain-imports'],
  ['the domain uses rxjs', 'src/domain/bad-2.ts', 'rxjs', 'domain-packages'],
  ['a contract reads the app', 'src/contracts/bad-3.ts', '../app/core/client', 'contracts-imports'],
  ['a ui part asks the client', 'src/app/ui/bad-4.ts', '../core/client', 'ui-imports'],
  ['a ui part uses the router', 'src/app/ui/bad-5.ts', '@angular/router', 'ui-packages'],
  ['core reads a feature', 'src/app/core/bad-6.ts', '../features/one/one', 'core-imports'],
  ['a feature reads another', 'src/app/features/two/bad-7.ts', '../one/one', 'features-imports'],
  ['the app reads the server', 'src/app/features/two/bad-8.ts', '../../../../server/http/route', 'features-imports'],
  ['the server reads the app', 'server/modules/two/bad-9.ts', '../../../src/app/core/client', 'modules-imports'],
  ['a module reads a sibling’s repo', 'server/modules/two/bad-10.ts', '../one/one.repo', 'modules-imports'],
  ['seeds read the http room', 'seeds/bad-11.ts', '../server/http/route', 'seeds-imports'],
  ['the server reads tests', 'server/http/bad-12.ts', '../../tests/support/help', 'nothing-imports-tests'],
] as const;

/** Beyond a single import: only the transitive check sees these. */
const TRANSITIVE = [
  [
    'drizzle outside a repo',
    { 'server/modules/two/far-1.service.ts': "export * from 'drizzle-orm';\n" },
    'only-repos-import-drizzle',
  ],
  [
    'a route that asks a repo',
    { 'server/modules/one/far-2.routes.ts': "export * from './one.repo';\n" },
    'routes-ask-services',
  ],
  ['decimal.js outside money', { 'src/domain/far-3.ts': "export * from 'decimal.js';\n" }, 'decimal-behind-money'],
  [
    'a circle',
    {
      'src/domain/far-4a.ts': "import { b } from './far-4b';\nexport const a = b;\n",
      'src/domain/far-4b.ts': "import { a } from './far-4a';\nexport const b = () => a;\n",
    },
    'no-cycles',
  ],
  [
    'the browser reaching the server through a friend',
    {
      'src/contracts/friend.ts': "export * from '../../server/http/route';\n",
      'src/app/core/far-5.ts': "export * from '../../contracts/friend';\n",
    },
    'browser-never-reaches-server',
  ],
] as const;

interface Cruised {
  readonly summary: {
    readonly violations: readonly { readonly from: string; readonly rule: { readonly name: string } }[];
  };
}
type Linted = readonly { readonly filePath: string; readonly messages: readonly { readonly message: string }[] }[];

/** Runs both checks over a planted tree: refusals as `file rule` and `file message`. */
function check(files: Record<string, string>): { cruised: string[]; linted: string[] } {
  rmSync(PLANTED, { recursive: true, force: true });
  for (const [path, text] of Object.entries(files)) {
    mkdirSync(dirname(join(PLANTED, path)), { recursive: true });
    writeFileSync(join(PLANTED, path), text);
  }
  const run = (tool: string, ...args: string[]) =>
    spawnSync(process.execPath, [join(ROOT, 'node_modules', tool), ...args], { cwd: PLANTED, encoding: 'utf8' }).stdout;
  const config = join(ROOT, 'tests/architecture/dependency-cruiser.cjs');
  const cruised = JSON.parse(
    run(
      'dependency-cruiser/bin/dependency-cruise.mjs',
      '--config',
      config,
      '--output-type',
      'json',
      'src',
      'server',
      'seeds',
    ),
  ) as Cruised;
  const linted = JSON.parse(run('eslint/bin/eslint.js', '--format', 'json', 'src', 'server', 'seeds')) as Linted;
  return {
    cruised: cruised.summary.violations.map((v) => `${v.from} ${v.rule.name}`),
    linted: linted.flatMap((f) => f.messages.map((m) => `${f.filePath.slice(PLANTED.length + 1)} ${m.message}`)),
  };
}

afterAll(() => rmSync(PLANTED, { recursive: true, force: true }));

test('a house that keeps the rules passes both checks', () => {
  expect(check(HOUSE)).toEqual({ cruised: [], linted: [] });
});

describe('planted violations', () => {
  let refused: ReturnType<typeof check>;
  beforeAll(() => {
    const direct = Object.fromEntries(DIRECT.map(([, file, source]) => [file, `export * from '${source}';\n`]));
    refused = check(Object.assign({ ...HOUSE }, direct, ...TRANSITIVE.map(([, files]) => files)));
  });

  test.each(DIRECT)('%s: refused by both checks', (_what, file, _source, rule) => {
    expect(refused.cruised).toContain(`${file} ${rule}`);
    expect(refused.linted).toContainEqual(expect.stringMatching(`^${file} .*may not import`));
  });

  test.each(TRANSITIVE)('%s: refused by the transitive check', (_what, files, rule) => {
    const expected = Object.keys(files).map((file) => `${file} ${rule}`);
    expect(refused.cruised.filter((line) => expected.includes(line))).not.toEqual([]);
  });
});

test('the project itself keeps the rules', () => {
  const { status, stdout } = spawnSync(
    process.execPath,
    [
      join(ROOT, 'node_modules/dependency-cruiser/bin/dependency-cruise.mjs'),
      ...['--config', 'tests/architecture/dependency-cruiser.cjs', 'src', 'server', 'seeds', 'tests'],
    ],
    { cwd: ROOT, encoding: 'utf8' },
  );
  expect(stdout).toContain('no dependency violations found');
  expect(status).toBe(0);
});
