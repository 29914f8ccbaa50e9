import { chromium, type Browser, type BrowserContext, type Page } from 'playwright-core';
import { testPassword, type Admitted } from './test-server.ts';

export function openBrowser(): Promise<Browser> {
  return chromium.launch({ executablePath: '/usr/bin/chromium' });
}

export type SignedInPage = {
  page: Page;
  context: BrowserContext;
  /** Errors of the console, refused content and failed scripts; empty when all is well. */
  complaints: string[];
};

/** A browser of their own for a person of the test laboratory, signed in at the page's own routes. */
export function pageOf(
  browser: Browser,
  address: string,
  person: Admitted,
  size = { width: 1440, height: 900 },
): Promise<SignedInPage> {
  return signedInPage(browser, address, { mail: person.mail, password: testPassword }, size);
}

/** The same by mail address and password. */
export async function signedInPage(
  browser: Browser,
  address: string,
  data: { mail: string; password: string },
  size = { width: 1440, height: 900 },
): Promise<SignedInPage> {
  const visitor = await visitorPage(browser, address, size);
  const { context } = visitor;
  const token = await (await context.request.get('/api/session')).json();
  const answer = await context.request.post('/api/session', {
    data,
    headers: { 'x-request-token': token.requestToken },
  });
  if (answer.status() !== 201) throw new Error(`not signed in: ${await answer.text()}`);
  return visitor;
}

/** A browser of its own for someone not signed in. */
export async function visitorPage(
  browser: Browser,
  address: string,
  size = { width: 1440, height: 900 },
): Promise<SignedInPage> {
  const context = await browser.newContext({ viewport: size, baseURL: address });
  const page = await context.newPage();
  const complaints: string[] = [];
  page.on('console', (message) => {
    if (message.type() === 'error') complaints.push(message.text());
  });
  page.on('pageerror', (error) => complaints.push(error.message));
  return { page, context, complaints };
}
