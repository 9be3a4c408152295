import { cleanup, render, screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';
import { MemoryRouter } from 'react-router-dom';
import { SWRConfig } from 'swr';
import { afterEach, expect, test, vi } from 'vitest';
import type { CorrelationPage, ListedCorrelation } from '../../../shared/api/types';
import { NO_FILTERS, type RegisterFilters } from '../model/register-filters';
import { RegisterView } from './register-view';

afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

function correlation(slug: string, authors: string[]): ListedCorrelation {
  return {
    slug,
    title: `Sheet of ${authors.join(' and ')}`,
    authors,
    year: 1934,
    geometry: 'wetted-wall',
    geometryName: 'Wetted wall',
    phase: 'gas',
    standing: 'approved',
    revision: 2,
    summary: '',
    verification: 'expression-seen',
    bounds: [
      {
        symbol: 'Re',
        name: 'Reynolds number',
        unit: '1',
        basis: 'stated',
        stretches: [{ lo: { value: 2000, nature: 'regime' }, hi: { value: 35000, nature: 'data' } }],
      },
    ],
  };
}

const facets: CorrelationPage['facets'] = {
  geometry: [
    { value: 'wetted-wall', label: 'Wetted wall', count: 2 },
    { value: 'pipe', label: 'Pipe', count: 0 },
  ],
  phase: [{ value: 'gas', label: 'Gas', count: 2 }],
  standing: [{ value: 'approved', label: 'Approved', count: 2 }],
};

/** Stands in for the server; returns the queries it was asked. */
function serve(answerTo: (query: URLSearchParams) => Response) {
  const asked: string[] = [];
  vi.stubGlobal('fetch', (call: Request) => {
    const { searchParams } = new URL(call.url);
    asked.push(searchParams.toString());
    return Promise.resolve(answerTo(searchParams));
  });
  return asked;
}
const page = (items: ListedCorrelation[], nextCursor: string | null = null, total = items.length) =>
  Response.json({ items, nextCursor, total, facets });

function renderRegister(start: RegisterFilters = NO_FILTERS) {
  const changes: RegisterFilters[] = [];
  function Harness() {
    const [filters, setFilters] = useState(start);
    const change = (next: RegisterFilters) => {
      changes.push(next);
      setFilters(next);
    };
    return <RegisterView filters={filters} onChange={change} />;
  }
  render(
    <SWRConfig value={{ provider: () => new Map(), dedupingInterval: 0 }}>
      <MemoryRouter>
        <Harness />
      </MemoryRouter>
    </SWRConfig>,
  );
  return { user: userEvent.setup(), changes };
}

test('lists each correlation with its geometry, strip, standing and revision', async () => {
  serve(() => page([correlation('gilliland', ['Gilliland', 'Sherwood'])]));
  renderRegister();
  const row = await screen.findByRole('row', { name: /Gilliland and Sherwood/ });
  expect(within(row).getByRole('link', { name: 'Gilliland and Sherwood (1934)' }).getAttribute('href')).toBe(
    '/register/gilliland',
  );
  expect(within(row).getByRole('link', { name: 'Wetted wall' }).getAttribute('href')).toBe(
    '/geometries/wetted-wall',
  );
  expect(within(row).getByRole('img').getAttribute('aria-label')).toMatch(
    /^Reynolds number, Re: 2.000 to 35.000\.$/,
  );
  expect(within(row).getByText('approved')).toBeTruthy();
  expect(within(row).getByText('rev 2')).toBeTruthy();
  expect(screen.getByText('1 correlation.')).toBeTruthy();
});

test('shows how many sheets stand behind a choice, and only choices with some', async () => {
  serve(() => page([correlation('a', ['A'])]));
  renderRegister();
  await screen.findByRole('option', { name: 'Wetted wall (2)' });
  expect(screen.queryByRole('option', { name: /Pipe/ })).toBeNull();
});

test('asks with the chosen filter and hands it on for the address bar', async () => {
  const asked = serve(() => page([correlation('a', ['A'])]));
  const { user, changes } = renderRegister();
  await screen.findByRole('option', { name: 'Wetted wall (2)' });
  await user.selectOptions(screen.getByLabelText('Geometry'), 'wetted-wall');
  expect(changes.at(-1)).toEqual({ ...NO_FILTERS, geometry: 'wetted-wall' });
  await waitFor(() => expect(asked.at(-1)).toBe('geometry=wetted-wall&limit=25'));
});

test('searches after a pause, once for a word that was typed in one go', async () => {
  const asked = serve(() => page([correlation('a', ['A'])]));
  const { user } = renderRegister();
  await screen.findByText('1 correlation.');
  await user.type(screen.getByLabelText(/Search words/), 'falling');
  await waitFor(() => expect(asked.at(-1)).toBe('q=falling&limit=25'));
  expect(asked).toHaveLength(2);
});

test('says what to do when nothing fits, and leads back to the whole', async () => {
  serve((query) => (query.has('q') ? page([]) : page([correlation('a', ['A'])])));
  const { user } = renderRegister({ ...NO_FILTERS, q: 'nothing' });
  expect(await screen.findByText('No correlation fits all of this')).toBeTruthy();
  await user.click(screen.getByRole('button', { name: 'Show the whole register' }));
  expect(await screen.findByRole('link', { name: 'A (1934)' })).toBeTruthy();
});

test('an empty register says what would be there', async () => {
  serve(() => page([]));
  renderRegister();
  expect(await screen.findByText('The register is empty')).toBeTruthy();
});

test('adds the next page on request and keeps the first', async () => {
  const asked = serve((query) =>
    query.has('cursor')
      ? page([correlation('b', ['B'])], null, 2)
      : page([correlation('a', ['A'])], 'next', 2),
  );
  const { user } = renderRegister();
  await user.click(await screen.findByRole('button', { name: 'Show more correlations' }));
  expect(await screen.findByRole('link', { name: 'B (1934)' })).toBeTruthy();
  expect(screen.getByRole('link', { name: 'A (1934)' })).toBeTruthy();
  expect(asked.at(-1)).toBe('cursor=next&limit=25');
  expect(screen.queryByRole('button', { name: 'Show more correlations' })).toBeNull();
});

test('shows the server’s own words when it refuses, and asks again on request', async () => {
  let refusing = true;
  serve(() =>
    refusing
      ? Response.json(
          {
            type: 'urn:merestone:problem:forbidden',
            title: 'Not yours to read',
            status: 403,
            detail: 'Ask.',
          },
          { status: 403 },
        )
      : page([correlation('a', ['A'])]),
  );
  const { user } = renderRegister();
  expect((await screen.findByRole('alert')).textContent).toContain('Not yours to read');
  refusing = false;
  await user.click(screen.getByRole('button', { name: 'Try again' }));
  expect(await screen.findByRole('link', { name: 'A (1934)' })).toBeTruthy();
});
