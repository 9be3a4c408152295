import type { Page } from 'playwright-core';

/** What the journeys need of a sheet as the server sends it. */
export interface SheetAnswer {
  revision: number;
  standing: string;
  hash: string;
  definition: { title: string; bounds: { on: string; stretches: { hi?: { value: number } }[] }[] };
}

/** Asks the server as the person who is signed in on a page; anything but success ends the journey. */
export async function call(
  page: Page,
  method: 'GET' | 'POST',
  path: string,
  data?: unknown,
): Promise<unknown> {
  const answer = await page.request.fetch(path, { method, ...(data === undefined ? {} : { data }) });
  if (!answer.ok()) throw new Error(`${method} ${path}: ${answer.status()} ${await answer.text()}`);
  return answer.json();
}

/** The sheet that the library has of Gilliland and Sherwood, as the pattern of a new one. */
export async function patternSheet(page: Page): Promise<SheetAnswer> {
  return (await call(page, 'GET', '/api/correlations/wetted-wall-gilliland-sherwood')) as SheetAnswer;
}

/** The ids of the people with these names. */
export async function idsOf(page: Page, names: readonly string[]): Promise<string[]> {
  const { items } = (await call(page, 'GET', '/api/people')) as { items: { id: string; name: string }[] };
  return names.map((name) => {
    const person = items.find((one) => one.name === name);
    if (!person) throw new Error(`There is nobody called ${name}.`);
    return person.id;
  });
}
