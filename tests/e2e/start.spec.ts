import { readdirSync, statSync } from 'node:fs';
import { join } from 'node:path';
import type { Browser } from 'playwright-core';
import { launchBrowser } from '../support/browser';
import { startServer, stopServers, temporaryFolder } from '../support/started-server';

/** The built server as a process: starting clean, starting again, stopping gently. */
const folder = temporaryFolder();
let browser: Browser;
beforeAll(async () => (browser = await launchBrowser()));
afterAll(async () => {
  await browser?.close();
  stopServers();
  folder.remove();
});

const FIRST = { name: 'Fia First', email: 'fia@new-works.example', password: 'a phrase long enough' };

test('a clean practice asks for its first administrator in the browser', async () => {
  const server = await startServer(folder.path, ['--empty']);
  expect(server.output()).toContain('A clean practice');
  expect(server.output()).not.toContain('quayside.example');
  const page = await browser.newPage({ baseURL: server.address });
  await page.goto('/sets');
  await page.waitForURL('**/set-up*');
  await page
    .getByLabel(/practice/i)
    .first()
    .fill('New Works');
  await page.getByLabel(/your name/i).fill(FIRST.name);
  await page.getByLabel('E-mail').fill(FIRST.email);
  await page.getByLabel('Password', { exact: true }).fill(FIRST.password);
  await page
    .getByRole('button', { name: /set up|begin|name/i })
    .last()
    .click();
  await page.waitForURL((url) => !url.pathname.startsWith('/set-up'));
  await page.goto('/sets');
  await page.getByText('Register the first set').waitFor();
  await page.close();
  expect(await server.stop()).toBe(0);
});

test('a second start keeps everything, even without being told that the practice is clean', async () => {
  const server = await startServer(folder.path);
  const session = await fetch(`${server.address}/api/session`, {
    method: 'POST',
    headers: { 'content-type': 'application/json' },
    body: JSON.stringify({ email: FIRST.email, password: FIRST.password }),
  });
  expect(session.status).toBe(200);
  expect(await session.json()).toMatchObject({
    demo: false,
    practiceName: 'New Works',
    user: { name: FIRST.name, role: 'administrator' },
  });
  expect(await server.stop()).toBe(0);
});

test('stopping lets a request under way finish, closes the file, and leaves nothing in the log', async () => {
  const server = await startServer(folder.path);
  const cookie = (
    await fetch(`${server.address}/api/session`, {
      method: 'POST',
      headers: { 'content-type': 'application/json' },
      body: JSON.stringify({ email: FIRST.email, password: FIRST.password }),
    })
  ).headers.get('set-cookie');
  const underWay = fetch(`${server.address}/api/session`, {
    method: 'POST',
    headers: { 'content-type': 'application/json', cookie: cookie ?? '' },
    body: JSON.stringify({ email: FIRST.email, password: FIRST.password }), // a password takes long enough to check
  });
  await new Promise((resolve) => setTimeout(resolve, 15));
  const stopped = server.stop();
  expect((await underWay).status).toBe(200);
  expect(await stopped).toBe(0);
  const left = readdirSync(folder.path).filter((file) => file.endsWith('-wal'));
  expect(left.map((file) => statSync(join(folder.path, file)).size)).toEqual([]);
  await expect(fetch(`${server.address}/api/health`)).rejects.toThrow();
});

test.each([
  [{ PORT: 'abc' }, 'PORT is «abc»'],
  [{ THENWORTH_DEMO: 'maybe' }, 'THENWORTH_DEMO is «maybe»: use on or off'],
])('a setting that cannot be used is named: %j', async (env, words) => {
  const fresh = temporaryFolder();
  await expect(startServer(fresh.path, [], env)).rejects.toThrow(words);
  fresh.remove();
});
