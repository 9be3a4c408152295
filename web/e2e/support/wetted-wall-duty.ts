import type { Page } from 'playwright-core';
import { signInAs } from './sign-in-as';

/** Signs in as a demo engineer and goes on from the desk to the register. */
export async function signInAsEngineer(page: Page): Promise<void> {
  await signInAs(page, 'engineer');
  await page.getByRole('navigation', { name: 'Main' }).getByRole('link', { name: 'Register' }).click();
  await page.getByRole('heading', { name: 'Register', exact: true }).waitFor();
}

/** Opens the sheet of Gilliland and Sherwood from the register. */
export async function openWettedWallSheet(page: Page): Promise<void> {
  await page.getByLabel('Search words, authors, symbols').fill('Gilliland');
  await page.getByRole('link', { name: /Gilliland and Sherwood/ }).click();
  await page.getByRole('heading', { name: 'Your duty' }).waitFor();
}

/** Types a value, after its unit has been chosen. */
export async function typeQuantity(page: Page, label: RegExp, text: string, unit?: string): Promise<void> {
  const field = page.getByRole('textbox', { name: label });
  if (unit !== undefined)
    await page
      .getByRole('combobox', { name: new RegExp(`^Unit of ${label.source.replace('^', '')}`) })
      .selectOption(unit);
  await field.fill(text);
}

/**
 * Air over water in a 50 mm tube at 25 °C and 1 atm; density from the ideal-gas equation.
 * With ρ = 1.184 kg/m³: Re = 1.184·5·0.05/1.84e-5 = 16 090, Sc = 0.6119, Sh = 0.023·16090^0.83·0.6119^0.44 = 57.4,
 * k_c = Sh·D/d·P/p_BM = 57.4·2.54e-5/0.05·101.325/99.8 = 0.0296 m/s.
 */
export async function typeAirDuty(page: Page, velocity: string): Promise<void> {
  await typeQuantity(page, /^Tube inside diameter/, '50', 'mm');
  await typeQuantity(page, /^Gas temperature/, '25', 'degC');
  await typeQuantity(page, /^Total pressure/, '101.325', 'kPa');
  await typeQuantity(page, /^Mean gas velocity/, velocity);
  await typeQuantity(page, /^Gas viscosity/, '1.84e-5');
  await typeQuantity(page, /^Diffusivity of the transferred species/, '2.54e-5');
  await typeQuantity(page, /^Log-mean partial pressure/, '99.8', 'kPa');
  await page.getByRole('combobox', { name: /^Gas density.*taken from/ }).selectOption('air-density-ideal');
}
