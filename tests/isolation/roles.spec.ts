import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import type { Test } from 'supertest';
import type TestAgent from 'supertest/lib/agent';
import type { Contract } from '../../src/contracts/contract';
import { can, ROLES, type Action } from '../../src/domain/access/policy';
import { CONTRACT_FILES, CONTRACTS } from '../support/contracts';
import { startTestApp, type TestApp } from '../support/harness';
import { ROOT } from '../support/root';

/** Calls a contract at records that do not exist and without a body: enough to see whether the door opens. */
function knock(agent: TestAgent, { method, path }: Contract): Test {
  const address = path
    .replace(':token', 'no-such-token-at-all-0123456789')
    .replace(':size', 'small')
    .replace(/:\w+/g, '999999');
  const verb = method.toLowerCase() as 'get' | 'post' | 'put' | 'patch' | 'delete';
  return agent[verb](address);
}

const ENDS_THE_SESSION = ['/api/session', '/api/sessions'];
const named = CONTRACTS.map((contract) => [`${contract.method} ${contract.path}`, contract] as const);

let app: TestApp;
beforeAll(async () => (app = await startTestApp()));
afterAll(() => app.close());

test('every file of contracts is tried here', () => {
  const shared = ['common.ts', 'contract.ts', 'problem.ts'];
  const files = readdirSync(join(ROOT, 'src/contracts')).filter((f) => /^[a-z-]+\.ts$/.test(f) && !shared.includes(f));
  expect(files).toHaveLength(CONTRACT_FILES);
  const declared = files.map(
    (f) => readFileSync(join(ROOT, 'src/contracts', f), 'utf8').match(/= contract\(/g)?.length ?? 0,
  );
  expect(CONTRACTS).toHaveLength(declared.reduce((a, b) => a + b, 0));
});

describe.each(named)('%s', (_name, contract) => {
  test('nobody: in only where it is public', async () => {
    const { status } = await knock(app.anyone(), contract);
    if (contract.access === 'public') expect([401, 403]).not.toContain(status);
    else expect(status).toBe(401);
    expect(status).toBeLessThan(500);
  });

  test.each(ROLES)('%s: as the access policy says', async (role) => {
    const agent = await app.agentAs(role);
    const { status, body } = await knock(agent, contract);
    const open =
      contract.access === 'public' || contract.access === 'signed-in' || can(role, contract.access satisfies Action);
    if (open) expect([401, 403]).not.toContain(status);
    else expect({ status, type: body.type }).toEqual({ status: 403, type: '/problems/forbidden' });
    expect(status).toBeLessThan(500);
  });
});

test('every contract is mounted and answers of its own', async () => {
  const agent = await app.agentAs('administrator');
  for (const contract of CONTRACTS.filter(({ path }) => !ENDS_THE_SESSION.includes(path))) {
    const { body } = await knock(agent, contract);
    expect(`${contract.path} ${String(body?.detail)}`).not.toContain('No such address');
  }
});

test('what is mounted are the contracts, method by method, and nothing else', async () => {
  expect((await app.anyone().get('/api/nothing-here')).status).toBe(404);
  const mounted = routesOf((app.app as unknown as { router: Stack }).router).filter((r) => r.includes(' /api/'));
  expect([...new Set(mounted)].sort()).toEqual(named.map(([name]) => name).sort());
});

interface Stack {
  readonly stack: readonly {
    readonly route?: { readonly path: string; readonly methods: Readonly<Record<string, boolean>> };
    readonly handle?: Partial<Stack>;
  }[];
}

/** Every method and path in Express's own tables, as `GET /api/sets`. */
function routesOf({ stack }: Stack): string[] {
  return stack.flatMap(({ route, handle }) => {
    if (route !== undefined) return Object.keys(route.methods).map((method) => `${method.toUpperCase()} ${route.path}`);
    return handle?.stack === undefined ? [] : routesOf(handle as Stack);
  });
}
