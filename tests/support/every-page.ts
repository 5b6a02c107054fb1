import type { Browser, BrowserContext } from 'playwright-core';
import { seriousFindings } from './axe';
import { launchBrowser } from './browser';
import { startServer, stopServers, temporaryFolder, type StartedServer } from './started-server';

const folder = temporaryFolder();
let server: StartedServer;
let browser: Browser;

/** One signed-in context for a window and a person; each page is a tab of it. */
const contexts = new Map<string, Promise<BrowserContext>>();
function contextFor(width: number, colorScheme: 'light' | 'dark', who: string | null): Promise<BrowserContext> {
  const key = `${width} ${colorScheme} ${who}`;
  const context = contexts.get(key) ?? newContext(width, colorScheme, who);
  contexts.set(key, context);
  return context;
}

async function newContext(width: number, colorScheme: 'light' | 'dark', who: string | null): Promise<BrowserContext> {
  const context = await browser.newContext({
    baseURL: server.address,
    viewport: { width, height: 844 },
    colorScheme,
    reducedMotion: 'reduce',
  });
  if (who !== null) {
    const answer = await context.request.post('/api/session', {
      data: { email: `${who}@quayside.example`, password: 'thenworth-demo' },
    });
    expect(answer.status()).toBe(200);
  }
  return context;
}

/** Page, who looks, and the words it must show. Numbers in braces are found by asking the API for the set «Meridian». */
const PAGES = [
  ['/then-and-now', null, 'What it cost then'],
  ['/then-and-now?amount=100&from=2025-10', null, 'Sep 2025'],
  ['/sign-in', null, 'Sign in'],
  ['/nothing-at-this-address', null, 'nothing at this address'],
  ['/sets', 'restorer', 'Halloway 41-X'],
  ['/sets?q=no-such-set-anywhere', 'restorer', 'No set matches'],
  ['/sets/new', 'restorer', 'Register a set'],
  ['/sets/{set}', 'restorer', 'Cost against worth'],
  ['/sets/{set}/edit', 'restorer', 'Price when new'],
  ['/sets/{set}/condition', 'restorer', 'Record condition'],
  ['/sets/{set}/worth', 'restorer', 'Record worth as found'],
  ['/sets/{set}/photos', 'restorer', 'Choose files'],
  ['/sets/{bare}', 'restorer', 'Not known'],
  ['/sets/{set}', 'collector', 'Cost against worth'],
  ['/estimates', 'restorer', 'Totals at likely hours'],
  ['/estimates/{estimate}', 'restorer', 'What it comes to'],
  ['/estimates/{estimate}', 'collector', 'What it comes to'],
  ['/papers/sets/{set}/appraisal-sheet', 'restorer', 'Appraisal sheet'],
  ['/papers/estimates/{estimate}/restoration-estimate', 'restorer', 'Restoration estimate'],
  ['/people', 'admin', 'appraiser@quayside.example'],
  ['/people', 'restorer', 'Your role does not open this page'],
  ['/practice', 'admin', 'Markup on parts'],
  ['/account', 'collector', 'Change your password'],
] as const;

/** Every page of the demo practice in one window: it shows its words, axe finds nothing serious, nothing scrolls sideways. */
export function describeEveryPage(width: number, scheme: 'light' | 'dark'): void {
  beforeAll(async () => {
    [server, browser] = await Promise.all([startServer(folder.path), launchBrowser()]);
  }, 120_000);
  afterAll(async () => {
    await browser?.close();
    stopServers();
    folder.remove();
  });

  test.each(PAGES)('%s as %s', async (path, who, words) => {
    const context = await contextFor(width, scheme, who);
    const ids = who === null || !path.includes('{') ? {} : await idsFor(context);
    const page = await context.newPage();
    const troubles: string[] = [];
    page.on('pageerror', (error) => troubles.push(String(error)));
    page.on('console', (message) => {
      if (message.type() === 'error' && !/status of 4\d\d/.test(message.text())) troubles.push(message.text());
    });
    await page.goto(path.replace(/\{(\w+)\}/g, (_, name: string) => String(ids[name])));
    await page.getByText(words).filter({ visible: true }).first().waitFor({ timeout: 15_000 });
    await page.locator('h1').first().waitFor({ state: 'attached' });
    await page.waitForFunction(() => document.fonts.status === 'loaded');
    expect(await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth)).toBeLessThanOrEqual(0);
    expect(await page.evaluate(() => document.fonts.check('16px Lato'))).toBe(true);
    expect(await seriousFindings(page)).toEqual([]);
    expect(troubles).toEqual([]);
    await page.close();
  });
}

async function idsFor(context: BrowserContext): Promise<Record<string, number>> {
  const json = async (path: string) => (await context.request.get(path)).json();
  const set = (await json('/api/sets?q=meridian')).items[0].id as number;
  const estimate = (await json(`/api/estimates?setId=${set}`)).items[0].id as number;
  const bare = ((await json('/api/sets?q=identified')).items[0]?.id ?? 0) as number;
  return { set, estimate, bare };
}
