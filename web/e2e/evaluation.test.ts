import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Page } from 'playwright-core';
import { openOffice, type OpenOffice } from './support/open-office';
import { seriousViolations } from './support/serious-violations';
import { openWettedWallSheet, signInAsEngineer, typeAirDuty, typeQuantity } from './support/wetted-wall-duty';

let office: OpenOffice;
beforeAll(async () => {
  office = await openOffice();
});
afterAll(async () => {
  await office.close();
});

const press = (page: Page, name: string) => page.getByRole('button', { name }).click();
const headline = (page: Page) => page.locator('.headline');
const overflow = (page: Page) =>
  page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);

describe.each(['desk', 'phone'] as const)('a duty, at %s width', (size) => {
  it('leads from sign-in to a kept coefficient with every step', async () => {
    const page = await office.newPage(size);
    await page.goto('/');
    await page.getByRole('heading', { name: 'Sign in', exact: true }).waitFor();
    expect(await seriousViolations(page)).toEqual([]);
    await signInAsEngineer(page);
    await page.getByRole('table').first().waitFor();
    expect(await seriousViolations(page)).toEqual([]);
    await openWettedWallSheet(page);
    expect(await seriousViolations(page)).toEqual([]);

    await typeAirDuty(page, '5');
    await page.getByText('Preview', { exact: true }).waitFor();
    const preview = await headline(page).locator('data').getAttribute('value');
    expect(Number(preview)).toBeCloseTo(0.0296, 4);

    await press(page, 'Evaluate and keep');
    await page.getByText('Kept', { exact: true }).waitFor();
    // The number on record is the server's; the browser's preview showed the very same.
    expect(await headline(page).locator('data').getAttribute('value')).toBe(preview);
    expect(
      await page.getByRole('list', { name: 'Steps' }).getByRole('listitem').count(),
    ).toBeGreaterThanOrEqual(5);
    expect(await page.locator('.provenance').innerText()).toMatch(
      /wetted-wall-gilliland-sherwood rev 1.*air-density-ideal rev 1/,
    );
    expect(await page.getByRole('img', { name: /Reynolds number.*Now 16.090, in bounds/ }).count()).toBe(1);
    expect(await overflow(page)).toBeLessThanOrEqual(0);
    expect(await seriousViolations(page)).toEqual([]);
  });

  it('is refused past the bound, and marked once a deviation is on record', async () => {
    const page = await office.newPage(size);
    await signInAsEngineer(page);
    await openWettedWallSheet(page);
    await typeAirDuty(page, '16.3');
    await page.getByRole('heading', { name: 'No number is given here.' }).waitFor();
    expect(await headline(page).count()).toBe(0);
    expect(await page.locator('.refusal').innerText()).toMatch(
      /Re = 52.4\d0 is 1\.5 × the upper bound 35.000/,
    );
    await press(page, 'See what covers this duty');
    await page.getByRole('link', { name: 'all sheets of this geometry' }).waitFor();
    expect(await seriousViolations(page)).toEqual([]);

    await press(page, 'Record a deviation');
    await press(page, 'Record deviation and evaluate');
    await page.getByRole('alert').getByRole('link').click();
    const reason = page.getByRole('textbox', { name: 'Why may Re be outside its bound here?' });
    expect(await reason.evaluate((node) => node === document.activeElement)).toBe(true);
    await reason.fill('Only a first estimate of the blower; the duty is to be measured.');
    expect(await seriousViolations(page)).toEqual([]);
    await press(page, 'Record deviation and evaluate');

    await headline(page).waitFor();
    expect(await headline(page).innerText()).toContain('provisional, not for design');
    expect(await page.getByRole('list', { name: 'Steps' }).innerText()).toContain(
      'provisional, not for design',
    );
    expect(await overflow(page)).toBeLessThanOrEqual(0);
    expect(await seriousViolations(page)).toEqual([]);
  });
});

describe('what is typed', () => {
  it('is asked about where it can be read in two ways, and is there again after a reload', async () => {
    const page = await office.newPage();
    await signInAsEngineer(page);
    await openWettedWallSheet(page);
    await typeQuantity(page, /^Tube inside diameter/, '0,050');
    await press(page, 'Use 0.05');
    await typeQuantity(page, /^Gas temperature/, '25', 'degC');
    await page.getByRole('combobox', { name: /^Unit of Gas temperature/ }).selectOption('K');
    await press(page, 'Convert 25 °C to 298.15 K');
    await page.reload();
    const value = (name: RegExp) => page.getByRole('textbox', { name }).inputValue();
    await page.getByRole('textbox', { name: /^Tube inside diameter/ }).waitFor();
    expect(await value(/^Tube inside diameter/)).toBe('0.05');
    expect(await value(/^Gas temperature/)).toBe('298.15');
    await press(page, 'Start anew');
    expect(await value(/^Tube inside diameter/)).toBe('');
  });

  it('is summed up with what is missing, each line leading to its field', async () => {
    const page = await office.newPage();
    await signInAsEngineer(page);
    await openWettedWallSheet(page);
    await typeQuantity(page, /^Tube inside diameter/, '0.05');
    await press(page, 'Evaluate and keep');
    const alert = page.getByRole('alert');
    await alert.getByRole('link', { name: /Gas viscosity/ }).click();
    const field = page.getByRole('textbox', { name: /^Gas viscosity/ });
    expect(await field.evaluate((node) => node === document.activeElement)).toBe(true);
    expect(await seriousViolations(page)).toEqual([]);
  });
});
