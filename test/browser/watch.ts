/** Notes everything that must not happen while the app runs. */
import type { BrowserContext, Page } from '@playwright/test';

export interface Watched {
  /** Requests to anywhere but the app's own origin. */
  readonly strayRequests: string[];
  readonly cspViolations: string[];
  /** Uncaught errors of the page. */
  readonly pageErrors: string[];
}

/** Call before the page is opened. */
export async function watch(context: BrowserContext, origin: string): Promise<Watched> {
  const watched: Watched = { strayRequests: [], cspViolations: [], pageErrors: [] };
  context.on('request', (request) => {
    const { protocol } = new URL(request.url());
    const local = protocol === 'data:' || protocol === 'blob:' || request.url().startsWith(origin);
    if (!local) watched.strayRequests.push(request.url());
  });
  await context.exposeBinding('noteCspViolation', (_source, text: string) => watched.cspViolations.push(text));
  await context.addInitScript(() => {
    addEventListener('securitypolicyviolation', (event) => {
      const note = Reflect.get(window, 'noteCspViolation') as (text: string) => void;
      note(`${event.violatedDirective} ${event.blockedURI}`);
    });
  });
  const listen = (page: Page) => {
    page.on('pageerror', (error) => watched.pageErrors.push(error.message));
    page.on('console', (message) => {
      if (/content.security.policy/i.test(message.text())) watched.cspViolations.push(message.text());
    });
  };
  context.pages().forEach(listen);
  context.on('page', listen);
  return watched;
}
