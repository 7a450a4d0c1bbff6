import { existsSync } from 'node:fs';
import { chromium, type Browser, type BrowserContext, type Page } from 'playwright-core';
import { afterAll, afterEach, beforeAll, expect, inject } from 'vitest';
import type { DemoSignIn } from './launcher.ts';

const PLACES = ['/usr/bin/chromium', '/usr/bin/chromium-browser', '/usr/bin/google-chrome'];
const FLAGS = [
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];

export const PHONE = { width: 390, height: 844 };
export const DESK = { width: 1440, height: 900 };

/** Debian's Chromium with a fresh profile; as root it cannot have its sandbox. */
export function launchBrowser(): Promise<Browser> {
  const executablePath = process.env['LEEWAY_CHROMIUM'] ?? PLACES.find((path) => existsSync(path));
  if (executablePath === undefined) throw new Error('No Chromium was found: npm test installs it.');
  return chromium.launch({ executablePath, headless: true, args: FLAGS, chromiumSandbox: false });
}

export interface VisitOptions {
  viewport?: { width: number; height: number };
  colorScheme?: 'light' | 'dark';
  reducedMotion?: 'reduce' | 'no-preference';
  /** Without the header of a proxy, as a browser on the same machine comes; all that do share one address. */
  isDirect?: boolean;
}

/** A browser for somebody: its own cookies and, to the server, its own network address. */
export function newVisit(
  browser: Browser,
  baseURL: string,
  options: VisitOptions = {},
): Promise<BrowserContext> {
  const part = () => String(Math.floor(Math.random() * 254) + 1);
  return browser.newContext({
    baseURL,
    viewport: options.viewport ?? DESK,
    colorScheme: options.colorScheme ?? 'light',
    reducedMotion: options.reducedMotion ?? 'reduce',
    extraHTTPHeaders:
      options.isDirect === true ? {} : { 'x-forwarded-for': `10.${part()}.${part()}.${part()}` },
  });
}

/** Writes down what a page must never do: print an error, throw, or get a 5xx. */
export function watchPage(page: Page, faults: string[]): void {
  page.on('console', (message) => {
    if (message.type() !== 'error' && message.type() !== 'warning') return;
    // The browser itself prints every 4xx; those are the test's to judge.
    if (/status of 4\d\d/.test(message.text())) return;
    faults.push(`console.${message.type()} at ${page.url()}: ${message.text()}`);
  });
  page.on('pageerror', (error) => faults.push(`thrown at ${page.url()}: ${error.message}`));
  page.on('response', (response) => {
    if (response.status() >= 500) faults.push(`${String(response.status())} from ${response.url()}`);
  });
}

export async function signIn(
  context: BrowserContext,
  baseURL: string,
  who: Pick<DemoSignIn, 'email' | 'password'>,
) {
  const response = await context.request.post(`${baseURL}/api/auth/sign-in/email`, {
    headers: { origin: baseURL },
    data: { email: who.email, password: who.password },
  });
  if (!response.ok()) throw new Error(`Signing in answered ${String(response.status())}.`);
}

export interface Visitor {
  baseURL: string;
  signIns: DemoSignIn[];
  /** A page of a new visitor, signed out unless `as` names a role of the demo or says `newMember`. */
  open: (
    path: string,
    options?: VisitOptions & { as?: 'member' | 'teacher' | 'admin' | 'newMember' },
  ) => Promise<Page>;
  /** Faults that the test expects and takes away. */
  takeFaults: () => string[];
}

/** Call it once in a file of tests: a browser for the file, and each test fails for what its pages did wrong. */
export function visitor(): Visitor {
  const { url: baseURL, signIns } = inject('servedApp');
  let browser: Browser | null = null;
  let faults: string[] = [];
  const contexts: BrowserContext[] = [];
  beforeAll(async () => {
    browser = await launchBrowser();
  });
  afterAll(() => browser?.close());
  const takeFaults = () => {
    const taken = faults;
    faults = [];
    return taken;
  };
  afterEach(async () => {
    await Promise.all(contexts.splice(0).map((context) => context.close()));
    expect(takeFaults(), 'the browser reported').toEqual([]);
  });
  return {
    baseURL,
    signIns,
    takeFaults,
    async open(path, { as, ...options } = {}) {
      if (browser === null) throw new Error('Open pages within a test.');
      const context = await newVisit(browser, baseURL, options);
      contexts.push(context);
      if (as === 'newMember') await signUp(context, baseURL);
      else if (as) await signIn(context, baseURL, accountOf(signIns, as));
      const page = await context.newPage();
      watchPage(page, faults);
      await page.goto(path);
      return page;
    },
  };
}

/** The demo's first account with the role. */
export function accountOf(signIns: DemoSignIn[], role: string): DemoSignIn {
  const found = signIns.find((signIn) => signIn.role === role);
  if (!found) throw new Error(`The demo has no ${role}.`);
  return found;
}

/** The password of every account that these tests make. */
export const NEW_PASSWORD = 'a quiet tape measure';

async function signUp(context: BrowserContext, baseURL: string): Promise<void> {
  const email = `robin-${Math.random().toString(36).slice(2)}@example.org`;
  const account = { email, password: NEW_PASSWORD };
  const post = async (path: string, data: object) => {
    const headers = { origin: baseURL };
    const response = await context.request.post(`${baseURL}/api/auth/${path}`, { headers, data });
    if (!response.ok()) throw new Error(`${path} answered ${String(response.status())}.`);
  };
  await post('sign-up/email', { name: 'Robin', ...account });
  await post('sign-in/email', account);
}
