import { existsSync } from 'node:fs';
import { chromium as sparticuz } from './sparticuz';
import { chromium, type Browser } from 'playwright-core';

const SYSTEM = ['/usr/bin/chromium', '/usr/bin/chromium-browser', '/usr/bin/google-chrome'];

/** The browser of the tests: `CHROMIUM` if set, else the system's, else the one that `npm ci` brought. */
export async function launchBrowser(): Promise<Browser> {
  const executablePath = process.env['CHROMIUM'] ?? SYSTEM.find((path) => existsSync(path)) ?? (await sparticuz());
  return chromium.launch({
    executablePath,
    args: [
      '--no-sandbox',
      '--disable-quic',
      '--disable-background-networking',
      '--disable-component-update',
      '--disable-sync',
    ],
  });
}
