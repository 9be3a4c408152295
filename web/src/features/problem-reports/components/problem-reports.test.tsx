import { cleanup, render, screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { MemoryRouter } from 'react-router-dom';
import { SWRConfig } from 'swr';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import type { ProblemReport } from '../../../shared/api/types';
import { ReportList } from './report-list';
import { ReportProblem } from './report-problem';

beforeEach(() => window.localStorage.clear());
afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

const report: ProblemReport = {
  id: 4,
  slug: 'gilliland-sherwood',
  revision: 2,
  hash: 'abc',
  severity: 'unsafe',
  text: 'The bound on Sc is too low.',
  by: { id: 'p-engineer', name: 'Edda Krantz' },
  at: '2026-03-04T09:00:00Z',
  answer: null,
  abilities: { answer: true },
};

function serve(items: ProblemReport[] = []) {
  const asked: { path: string; body: unknown }[] = [];
  vi.stubGlobal('fetch', async (call: Request) => {
    const { pathname } = new URL(call.url);
    if (pathname === '/api/session') return new Response('{}', { status: 401 });
    if (call.method === 'GET') return new Response(JSON.stringify({ items }));
    asked.push({ path: pathname, body: await call.json() });
    return new Response('{}', { status: 201 });
  });
  return asked;
}

function show(what: 'report' | 'list') {
  const user = userEvent.setup();
  render(
    <SWRConfig value={{ provider: () => new Map() }}>
      <MemoryRouter>
        {what === 'report' ? (
          <ReportProblem slug="gilliland-sherwood" revision={2} />
        ) : (
          <ReportList slug="gilliland-sherwood" />
        )}
      </MemoryRouter>
    </SWRConfig>,
  );
  return user;
}

describe('a problem report', () => {
  it('is filed about the revision, once it says how bad and what', async () => {
    const asked = serve();
    const user = show('report');
    await user.click(screen.getByRole('button', { name: 'Report a problem with this sheet' }));
    const dialog = within(screen.getByRole('dialog'));
    await user.click(dialog.getByRole('button', { name: 'File the report' }));
    expect(dialog.getByText('Choose one.')).toBeTruthy();
    expect(dialog.getByText('Write 10 characters at least.')).toBeTruthy();
    await user.click(dialog.getByRole('radio', { name: /^An error/ }));
    await user.type(dialog.getByRole('textbox'), 'Table 3 begins with 0.56.');
    await user.click(dialog.getByRole('button', { name: 'File the report' }));
    await waitFor(() => expect(screen.getByRole('status').textContent).toMatch(/^Your report is filed/));
    expect(asked).toEqual([
      {
        path: '/api/correlations/gilliland-sherwood/problem-reports',
        body: { revision: 2, severity: 'error', text: 'Table 3 begins with 0.56.' },
      },
    ]);
  });

  it('stands on the sheet, and is answered by who may', async () => {
    const asked = serve([report]);
    const user = show('list');
    await waitFor(() => expect(screen.getByText('The bound on Sc is too low.')).toBeTruthy());
    expect(screen.getByText(/reports it as unsafe, 4 March 2026/)).toBeTruthy();
    await user.click(screen.getByRole('button', { name: 'Answer the report of Edda Krantz' }));
    const dialog = within(screen.getByRole('dialog'));
    await user.click(dialog.getByRole('radio', { name: /^No fault/ }));
    await user.type(dialog.getByRole('textbox'), 'The paper has 0.6 in table 3.');
    await user.click(dialog.getByRole('button', { name: 'Send the answer' }));
    await waitFor(() => expect(screen.queryByRole('dialog')).toBeNull());
    expect(asked[0]).toEqual({
      path: '/api/problem-reports/4/answer',
      body: { outcome: 'no-fault', text: 'The paper has 0.6 in table 3.' },
    });
  });

  it('that is answered is folded with its answer', async () => {
    const answer = {
      outcome: 'no-fault',
      text: 'It is 0.6.',
      by: { id: 'p-authority', name: 'Ines Vauquelin' },
      at: '2026-03-05T09:00:00Z',
    } as const;
    serve([{ ...report, answer, abilities: { answer: false } }]);
    show('list');
    await waitFor(() => expect(screen.getByText('One answered report')).toBeTruthy());
    expect(screen.getByText(/found no fault, 5 March 2026/)).toBeTruthy();
  });
});
