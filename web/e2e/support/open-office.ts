import type { Page } from 'playwright-core';
import { launchBrowser } from '@merestone/workshop/browser';
import { serveForTests } from '@merestone/workshop/serve-for-tests';

/** The two widths that the screens are made for. */
export const sizes = {
  desk: { width: 1280, height: 900 },
  phone: { width: 390, height: 844 },
} as const;

export interface OpenOffice {
  readonly origin: string;
  /** What the server has said on its terminal so far. */
  printed(): string;
  /** A page of a person who has not been here before. Ends with the office. */
  newPage(size?: keyof typeof sizes): Promise<Page>;
  /** Ends the browsers and the server and removes their data. */
  close(): Promise<void>;
}

/** Starts the built product as a new office, a demo one unless `env` says otherwise, and a browser for each page. */
export async function openOffice(env: Record<string, string> = {}): Promise<OpenOffice> {
  const office = await serveForTests({ env });
  const browsers: Awaited<ReturnType<typeof launchBrowser>>[] = [];
  return {
    origin: office.origin,
    printed: () => office.output(),
    newPage: async (size = 'desk') => {
      const browser = await launchBrowser({ baseURL: office.origin, viewport: sizes[size] });
      browsers.push(browser);
      return browser.context.pages()[0] ?? (await browser.context.newPage());
    },
    close: async () => {
      await Promise.all(browsers.map((browser) => browser.close()));
      await office.stop();
    },
  };
}
