import { readFile } from 'node:fs/promises';
import type { Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openOffice, type OpenOffice } from './support/open-office';
import { pageCalledImage, scriptedPdf } from './support/sample-documents';
import { seriousViolations } from './support/serious-violations';
import { DEMO_PASSWORD, signInAs } from './support/sign-in-as';

const NEWCOMER = {
  name: 'Wilma Hartfell',
  email: 'wilma@office.example',
  password: ' four wet grey stones ',
};

let office: OpenOffice;
let admin: Page;
beforeAll(async () => {
  office = await openOffice();
  admin = await office.newPage();
  await signInAs(admin, 'admin');
});
afterAll(async () => {
  await office.close();
});

/** A button by the whole of its words; one that has just been at work may still say so in front of them. */
const press = (page: Page, name: string) =>
  page.getByRole('button', { name: new RegExp(`^(loading )?${name}$`) }).click();
const overflow = (page: Page) =>
  page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);

/** Signs in by the form, and says nothing of what came of it. */
async function tryToSignIn(page: Page, email: string, password: string): Promise<void> {
  await page.goto('/sign-in');
  await page.getByLabel('E-mail address').fill(email);
  await page.getByLabel('Password', { exact: true }).fill(password);
  await press(page, 'Sign in');
}

/** The link of the latest letter with a subject to an address, read where an administrator reads it. */
async function linkFor(email: string, subject: string): Promise<string> {
  await admin.goto('/office/outbox');
  await admin
    .getByRole('listitem')
    .filter({ hasText: `to ${email}` })
    .getByRole('link', { name: subject })
    .first()
    .click();
  await admin.getByRole('heading', { level: 1, name: subject }).waitFor();
  expect(await seriousViolations(admin)).toEqual([]);
  const link = await admin.locator('.letter-body').getByRole('link').getAttribute('href');
  return link ?? '';
}

describe.each(['desk', 'phone'] as const)('the pages of the office, at %s width', (size) => {
  it.each([
    ['/office/people', 'People'],
    ['/office/appointments', 'Appointments'],
    ['/office/settings', 'Settings'],
    ['/office/outbox', 'Outbox'],
    ['/account', 'Ruben Marlpit'],
    ['/notices', 'Notices'],
  ])('%s can be used by everybody who may', async (path, heading) => {
    const page = await office.newPage(size);
    await signInAs(page, 'admin');
    await page.goto(path);
    await page.getByRole('heading', { level: 1, name: heading }).waitFor();
    await page.waitForLoadState('networkidle');
    expect(await seriousViolations(page)).toEqual([]);
    expect(await overflow(page)).toBeLessThanOrEqual(0);
  });

  it('so can the pages before the sign-in', async () => {
    const page = await office.newPage(size);
    await page.goto('/sign-in');
    await page.getByRole('link', { name: 'Forgot your password?' }).click();
    await page.getByRole('heading', { level: 1, name: 'A new password' }).waitFor();
    expect(await seriousViolations(page)).toEqual([]);
    await page.goto('/invitation/not-a-link');
    await page.getByRole('alert').waitFor();
    expect(await seriousViolations(page)).toEqual([]);
    expect(await overflow(page)).toBeLessThanOrEqual(0);
  });
});

describe('somebody new', () => {
  it('is invited, joins by the letter, signs in, and is shut out at once when deactivated', async () => {
    await admin.goto('/office/people');
    await press(admin, 'Invite somebody');
    expect(await seriousViolations(admin)).toEqual([]);
    await admin.getByLabel('Name', { exact: true }).fill(NEWCOMER.name);
    await admin.getByLabel('E-mail address').fill(NEWCOMER.email);
    await admin.getByLabel(/^Engineer/).check();
    await press(admin, 'Send the invitation');
    await admin.getByText(`${NEWCOMER.name} is invited`).waitFor();

    const link = await linkFor(NEWCOMER.email, 'Merestone: your invitation');
    const page = await office.newPage();
    await page.goto(link);
    await page.getByRole('heading', { name: `Welcome, ${NEWCOMER.name}` }).waitFor();
    expect(await seriousViolations(page)).toEqual([]);
    await page.getByLabel('Password', { exact: true }).fill('wilmahartfell');
    await press(page, 'Join');
    await page.getByRole('alert').getByRole('link').click();
    expect(await seriousViolations(page)).toEqual([]);
    await page.getByLabel('Password', { exact: true }).fill(NEWCOMER.password);
    await press(page, 'Join');
    await page.getByRole('heading', { level: 1, name: 'Desk' }).waitFor();

    await press(page, 'Sign out');
    await page.goto(link);
    await page.getByText('A link works once and for seven days.').waitFor();
    await tryToSignIn(page, NEWCOMER.email, NEWCOMER.password.trim());
    await page.getByText('do not belong together').first().waitFor();
    await tryToSignIn(page, NEWCOMER.email, NEWCOMER.password);
    await page.getByRole('heading', { level: 1, name: 'Desk' }).waitFor();

    await admin.goto('/office/people');
    await press(admin, `Deactivate: ${NEWCOMER.name}`);
    await admin.getByLabel('Reason').fill('Was here for this test only.');
    await press(admin, 'Deactivate');
    await admin.getByText(`${NEWCOMER.name} is inactive now`).waitFor();
    expect(await seriousViolations(admin)).toEqual([]);
    await page.getByRole('navigation', { name: 'Main' }).getByRole('link', { name: 'Register' }).click();
    await page.getByRole('heading', { level: 1, name: 'Sign in' }).waitFor();
    await tryToSignIn(page, NEWCOMER.email, NEWCOMER.password);
    await page.getByText('do not belong together').first().waitFor();
  });
});

describe('a forgotten password', () => {
  it('is answered alike for every address, and replaced by the letter', async () => {
    const page = await office.newPage();
    const ask = async (email: string) => {
      await page.goto('/password-reset');
      await page.getByLabel('E-mail address').fill(email);
      await press(page, 'Send a link');
      return page.getByText(/a letter is on its way there/).innerText();
    };
    expect(await ask('nobody@office.example')).toBe(await ask('engineer2@merestone.example'));

    await page.goto(await linkFor('engineer2@merestone.example', 'Merestone: a new password'));
    expect(await seriousViolations(page)).toEqual([]);
    await page.getByLabel('New password', { exact: true }).fill('a heron on one leg');
    await press(page, 'Choose this password');
    await page.getByText('Your new password holds.').waitFor();
    await tryToSignIn(page, 'engineer2@merestone.example', 'a heron on one leg');
    await page.getByRole('heading', { level: 1, name: 'Desk' }).waitFor();

    await page.goto('/account');
    await page.getByLabel('Present password', { exact: true }).fill('a heron on one leg');
    await page.getByLabel('New password', { exact: true }).fill('two herons on one leg each');
    await press(page, 'Change the password');
    await page.getByText('Your password is changed.').waitFor();
    expect(await seriousViolations(page)).toEqual([]);
  });
});

describe('a technical authority', () => {
  it('is proposed by an administrator and confirmed by the principal, who is told', async () => {
    await admin.goto('/office/appointments');
    await press(admin, 'Propose a technical authority');
    await admin.getByLabel('Person').selectOption('Mirela Oakhanger');
    await admin.getByLabel(/^Only some/).check();
    await admin.getByLabel('Sphere', { exact: true }).check();
    await admin.getByLabel('Last day').fill(`${new Date().getUTCFullYear() + 1}-06-30`);
    expect(await seriousViolations(admin)).toEqual([]);
    await press(admin, 'Propose');
    await admin.getByText(/A second person has to confirm it/).waitFor();
    expect(await admin.getByRole('button', { name: /^Confirm/ }).count()).toBe(0);

    const principal = await office.newPage();
    await signInAs(principal, 'reviewer3');
    await principal.getByRole('button', { name: /new notices?$/ }).click();
    expect(await seriousViolations(principal)).toEqual([]);
    await principal
      .getByRole('region', { name: 'Latest notices' })
      .getByRole('link', { name: /Mirela/ })
      .click();
    await principal.getByRole('heading', { level: 1, name: 'Appointments' }).waitFor();
    await press(principal, 'Confirm the appointment of Mirela Oakhanger');
    await principal.getByLabel('Password', { exact: true }).fill('wrong');
    await press(principal, 'Sign and confirm');
    await principal.getByRole('alert').waitFor();
    expect(await seriousViolations(principal)).toEqual([]);
    await principal.getByLabel('Password', { exact: true }).fill(DEMO_PASSWORD);
    await press(principal, 'Sign and confirm');
    await principal.getByText(/Mirela Oakhanger is a technical authority until/).waitFor();
  });
});

describe('the document behind a source', () => {
  it('is attached with its licence, said to be active, saved as a file; what is no document is refused', async () => {
    const page = await office.newPage();
    await signInAs(page, 'reviewer');
    await page.goto('/register/wetted-wall-gilliland-sherwood');
    await press(page, 'Attach a document');
    await page.getByLabel('File').setInputFiles(pageCalledImage);
    await page.getByLabel(/^It stays in the office/).check();
    await press(page, 'Attach it');
    await page.getByRole('alert').getByRole('link').waitFor();
    expect(await seriousViolations(page)).toEqual([]);
    await page.getByLabel('File').setInputFiles(scriptedPdf);
    await press(page, 'Attach it');
    await page.getByText('"page 516.pdf" is attached.').waitFor();
    await page.getByText(/^Contains active content: .*a script/).waitFor();
    const [download] = await Promise.all([
      page.waitForEvent('download'),
      page.getByRole('link', { name: 'page 516.pdf' }).click(),
    ]);
    expect(await readFile(await download.path())).toEqual(scriptedPdf.buffer);
    expect(await seriousViolations(page)).toEqual([]);
  });
});

describe('an empty office', () => {
  it('is entered by the link on the terminal, once', async () => {
    const empty = await openOffice({ MERESTONE_DEMO: '0' });
    try {
      const link = /\/invitation\/\S+/.exec(empty.printed())?.[0] ?? '';
      const page = await empty.newPage();
      await page.goto(link);
      await page.getByRole('heading', { level: 1, name: 'The first administrator' }).waitFor();
      expect(await seriousViolations(page)).toEqual([]);
      await page.getByLabel('Name', { exact: true }).fill('Ottilie Marran');
      await page.getByLabel('E-mail address').fill('ottilie@office.example');
      await page.getByLabel('Password', { exact: true }).fill('four wet grey stones');
      await press(page, 'Join');
      await page.getByRole('heading', { level: 1, name: 'Desk' }).waitFor();
      await page.goto('/office');
      await page.getByRole('heading', { level: 1, name: 'People' }).waitFor();
      expect(await page.getByRole('table', { name: 'Here' }).getByRole('rowheader').count()).toBe(1);
      await page.goto(link);
      await page.getByText('A link works once and for seven days.').waitFor();
    } finally {
      await empty.close();
    }
  });
});
