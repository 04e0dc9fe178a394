import { readFileSync } from 'node:fs';
import { mkdtempSync, rmSync, existsSync } from 'node:fs';
import { createRequire } from 'node:module';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { AxeResults } from 'axe-core';
import { chromium } from 'playwright-core';
import type { BrowserContext, Page } from 'playwright-core';

const PLACES = ['/usr/bin/chromium', '/usr/bin/chromium-browser', '/usr/bin/google-chrome'];
// A closed network refuses the browser's own calls home, many at a time; they are switched off.
const FLAGS = [
  '--headless',
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];

export interface Visitor {
  page: Page;
  /** What the page said on its console as an error, and requests that the content policy refused. */
  complaints: string[];
  close(): Promise<void>;
}

/** One person's browser: its own profile, cookies and storage. */
export async function openBrowser(size = { width: 1440, height: 900 }): Promise<Visitor> {
  const executablePath = process.env['CHROMIUM_PATH'] ?? PLACES.find((p) => existsSync(p));
  if (!executablePath) throw new Error('Chromium was not found: install it or set CHROMIUM_PATH');
  const profile = mkdtempSync(join(tmpdir(), 'counterpoise-browser-'));
  const context: BrowserContext = await chromium.launchPersistentContext(profile, {
    executablePath,
    args: FLAGS,
    viewport: size,
    reducedMotion: 'reduce',
  });
  const page = context.pages()[0] ?? (await context.newPage());
  page.setDefaultTimeout(15_000);
  const complaints: string[] = [];
  page.on('pageerror', (error) => complaints.push(error.message));
  page.on('console', (message) => {
    // An answer that refuses (401, 404, 409 …) is part of the product's talk and tested by what the page shows.
    if (message.type() === 'error' && !/Failed to load resource/.test(message.text()))
      complaints.push(message.text());
  });
  return {
    page,
    complaints,
    async close() {
      await context.close();
      rmSync(profile, { recursive: true, force: true });
    },
  };
}

const axeSource = readFileSync(createRequire(import.meta.url).resolve('axe-core/axe.min.js'), 'utf8');

/** What axe finds against WCAG 2.2 A and AA on the page as it stands: one line a fault, empty when there is none. */
export async function axeFaults(page: Page): Promise<string[]> {
  await page.evaluate(axeSource);
  const results = await page.evaluate(async () => {
    const { axe } = window as unknown as {
      axe: { run(context: Document, options: object): Promise<AxeResults> };
    };
    return axe.run(document, { runOnly: ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'] });
  });
  return results.violations.flatMap((v) =>
    v.nodes.map(
      (n) => `${new URL(page.url()).pathname} ${v.id}: ${n.target.join(' ')} ${n.failureSummary ?? ''}`,
    ),
  );
}
