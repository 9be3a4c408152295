import type { Page } from 'playwright-core';

/** The password of everybody in the demo office. */
export const DEMO_PASSWORD = 'merestone-demo';

/** Signs in as somebody of the demo office by the first part of their address, which leads to the desk. */
export async function signInAs(page: Page, who: string): Promise<void> {
  await page.goto('/');
  await page.getByLabel('E-mail address').fill(`${who}@merestone.example`);
  await page.getByLabel('Password', { exact: true }).fill(DEMO_PASSWORD);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.getByRole('heading', { name: 'Desk', exact: true }).waitFor();
}
