import axe from 'axe-core';
import type { Page } from 'playwright-core';

/** What axe-core finds on a page that keeps people from using it: its serious and critical findings, one line each. */
export async function seriousViolations(page: Page): Promise<string[]> {
  await page.evaluate(axe.source);
  return page.evaluate(async () => {
    const { violations } = await window.axe.run(document, {
      runOnly: ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'],
    });
    return violations
      .filter(({ impact }) => impact === 'serious' || impact === 'critical')
      .map(({ id, nodes }) => `${id}: ${nodes.map(({ target }) => target.join(' ')).join(' | ')}`);
  });
}

declare global {
  interface Window {
    axe: typeof axe;
  }
}
