import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Page } from 'playwright-core';
import { openOffice, type OpenOffice } from './support/open-office';
import { call, idsOf, patternSheet, type SheetAnswer } from './support/revision-by-api';
import { seriousViolations } from './support/serious-violations';
import { DEMO_PASSWORD, signInAs } from './support/sign-in-as';

const SLUG = 'wetted-wall-journey';
const TITLE = 'Wetted wall, gas side, for the journey';
const REVIEWERS = ['Mirela Oakhanger', 'Saoirse Larkmead'];
const at = (revision: number) => `/api/correlations/${SLUG}/revisions/${revision}`;

let office: OpenOffice;
let engineer: Page;
let reviewers: Page[];
let authority: Page;

beforeAll(async () => {
  office = await openOffice();
  const enter = async (who: string) => {
    const page = await office.newPage();
    await signInAs(page, who);
    return page;
  };
  engineer = await enter('engineer');
  reviewers = [await enter('reviewer'), await enter('reviewer3')];
  authority = await enter('authority');
});
afterAll(async () => {
  await office.close();
});

const press = (page: Page, name: string | RegExp) => page.getByRole('button', { name }).click();
const toDesk = (page: Page) =>
  page.getByRole('navigation', { name: 'Main' }).getByRole('link', { name: 'Desk' }).click();

/** From the desk to the review that waits in one of its sections. */
async function openFromDesk(page: Page, section: string): Promise<void> {
  await page.goto('/');
  await page.getByRole('region', { name: section }).getByRole('link', { name: TITLE }).first().click();
  await page.getByRole('heading', { level: 1, name: TITLE }).waitFor();
}

/** Ticks the whole checklist and recommends the revision. */
async function recommend(page: Page, revision: number): Promise<void> {
  for (const point of await page.getByRole('checkbox').all()) await point.check();
  await press(page, `Recommend revision ${revision}`);
  await page.getByRole('heading', { name: 'Your verdict' }).waitFor();
}

async function approve(page: Page, revision: number): Promise<void> {
  await page.getByLabel('Your password, once more').fill(DEMO_PASSWORD);
  await press(page, `Sign and approve revision ${revision}`);
  await page.getByText(`Revision ${revision} is approved.`).waitFor();
}

describe('the life of a revision', () => {
  it('begins as a draft that the engineer puts into review, naming two reviewers', async () => {
    const { definition } = await patternSheet(engineer);
    await call(engineer, 'POST', '/api/correlations', {
      slug: SLUG,
      definition: { ...definition, title: TITLE },
    });
    const named = { reviewers: await idsOf(engineer, REVIEWERS) };
    const sheet = (await call(engineer, 'POST', `${at(1)}/submission`, named)) as SheetAnswer;
    expect(sheet.standing).toBe('in review');
  });

  it('is asked about by a reviewer beside the field', async () => {
    const page = reviewers[0]!;
    await page.goto('/');
    await page.getByRole('region', { name: 'To review' }).waitFor();
    expect(await seriousViolations(page)).toEqual([]);
    await openFromDesk(page, 'To review');
    await press(page, 'Comment on Bound on Reynolds number');
    await page
      .getByLabel('Your comment on Bound on Reynolds number')
      .fill('Which table has the upper limit?');
    expect(await seriousViolations(page)).toEqual([]);
    await press(page, 'Send comment');
    await page.locator('#field-bounds-0').getByText('Which table has the upper limit?').waitFor();
    // A favourable verdict needs the whole list.
    await press(page, 'Recommend revision 1');
    expect(await page.getByRole('alert').getByRole('link').count()).toBe(6);
  });

  it('is answered by the engineer, resolved by the reviewer, and recommended by both', async () => {
    await openFromDesk(engineer, 'Open comments');
    await press(engineer, /^Answer the comment/);
    await engineer.getByLabel(/^Your answer to/).fill('Table 2, its last row.');
    await press(engineer, 'Send answer');
    await engineer.getByText('Ada Quillfeather answers').waitFor();
    expect(await seriousViolations(engineer)).toEqual([]);

    const [first, second] = [reviewers[0]!, reviewers[1]!];
    await openFromDesk(first, 'Open comments');
    await press(first, /^Resolve the comment/);
    await first.getByText('One resolved comment').waitFor();
    await recommend(first, 1);
    await first.getByText(/^1 of 2 favourable reviews/).waitFor();
    await openFromDesk(second, 'To review');
    await recommend(second, 1);
    await second.getByText(/^2 of 2 favourable reviews/).waitFor();
    expect(await seriousViolations(second)).toEqual([]);
  });

  it('is approved by a technical authority, with the password once more', async () => {
    await openFromDesk(authority, 'To approve');
    await press(authority, 'Sign and approve revision 1');
    expect(await authority.getByRole('alert').innerText()).toContain('Write your password');
    expect(await seriousViolations(authority)).toEqual([]);
    await approve(authority, 1);
    await authority.getByRole('link', { name: 'Read the sheet as a page' }).click();
    await authority.getByText(/by Henrik Stonebridge on/).waitFor();
    expect(await authority.locator('.running-head').innerText()).toMatch(/rev 1\s+approved/i);
    expect(await seriousViolations(authority)).toEqual([]);
  });

  it('ends when a second revision supersedes it, and then points to that', async () => {
    const { definition } = (await call(engineer, 'GET', `/api/correlations/${SLUG}`)) as SheetAnswer;
    const reynolds = definition.bounds.find(({ on }) => on === 'Re')?.stretches[0]?.hi;
    if (reynolds) reynolds.value = 27000;
    await call(engineer, 'POST', `/api/correlations/${SLUG}/revisions`, { definition });
    await call(engineer, 'POST', `${at(2)}/submission`, { reviewers: await idsOf(engineer, REVIEWERS) });
    for (const page of reviewers) {
      await openFromDesk(page, 'To review');
      await recommend(page, 2);
      await page.getByText(/^\d of 2 favourable reviews/).waitFor();
    }
    await openFromDesk(authority, 'To approve');
    await approve(authority, 2);

    await engineer.goto(`/register/${SLUG}/revisions/1`);
    const note = engineer.getByRole('note', { name: 'Standing' });
    await note.waitFor();
    expect(await note.innerText()).toContain('Superseded: a later revision has taken its place.');
    expect(await seriousViolations(engineer)).toEqual([]);
    await note.getByRole('link', { name: 'rev 2' }).click();
    await engineer.getByRole('link', { name: 'Differences from rev 1' }).click();
    await engineer.getByRole('img', { name: /Before: .*35.000.*After: .*27.000/ }).waitFor();
    expect(await seriousViolations(engineer)).toEqual([]);
  });

  it('leaves the desks of those concerned empty of it', async () => {
    for (const page of [...reviewers, authority]) {
      await toDesk(page);
      await page.getByRole('heading', { name: 'Desk', exact: true }).waitFor();
      for (const section of ['To review', 'To approve']) {
        // What was there before may stand until the desk has been fetched anew.
        const waiting = page.getByRole('region', { name: section }).getByText(TITLE);
        await expect.poll(() => waiting.count()).toBe(0);
      }
    }
    await reviewers[0]!.goto('/reviews');
    await reviewers[0]!.getByRole('heading', { name: 'Also in review' }).waitFor();
    expect(await seriousViolations(reviewers[0]!)).toEqual([]);
  });
});
