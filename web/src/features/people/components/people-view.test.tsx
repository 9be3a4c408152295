import { cleanup, render, screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { MemoryRouter } from 'react-router-dom';
import { afterEach, expect, test, vi } from 'vitest';
import type { ManagedPerson } from '../../../shared/api/types';
import { PeopleView } from './people-view';

afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
  window.localStorage.clear();
});

const person = (part: Partial<ManagedPerson>): ManagedPerson => ({
  id: 'p-1',
  name: 'Ada Quillfeather',
  email: 'ada@office.example',
  roles: ['engineer'],
  active: true,
  invited: false,
  lastSignIn: '2026-11-30T08:00:00Z',
  ...part,
});
const ADMIN = person({ id: 'p-admin', name: 'Ruben Marlpit', roles: ['administrator'] });
const AUTHORITY = person({ id: 'p-authority', name: 'Henrik Stonebridge', roles: ['authority'] });

interface Call {
  method: string;
  path: string;
  body: unknown;
}

/** Stands in for the server: keeps what was asked, answers each act with the status given. */
function serve(status = 201, answer: unknown = person({})) {
  const calls: Call[] = [];
  vi.stubGlobal('fetch', async (request: Request) => {
    const text = await request.text();
    const path = new URL(request.url).pathname;
    if (request.method === 'GET') return new Response('{}', { status: 401 });
    calls.push({ method: request.method, path, body: text ? JSON.parse(text) : null });
    return new Response(JSON.stringify(answer), { status });
  });
  return calls;
}

function renderView(people: ManagedPerson[]) {
  const refetch = vi.fn(() => Promise.resolve());
  render(
    <MemoryRouter>
      <PeopleView people={people} ownId={ADMIN.id} refetch={refetch} />
    </MemoryRouter>,
  );
  return { user: userEvent.setup(), refetch };
}

const press = (name: string | RegExp) => screen.getByRole('button', { name });

test('people stand by whether they are here, invited or inactive, and nobody shuts themselves out', () => {
  serve();
  renderView([
    ADMIN,
    AUTHORITY,
    person({ id: 'p-2', name: 'Wilma Hartfell', invited: true, lastSignIn: null }),
    person({ id: 'p-3', name: 'Odo Fellgate', active: false }),
  ]);
  const tableOf = (heading: string) => within(screen.getByRole('table', { name: heading }));
  expect(tableOf('Here').getAllByRole('rowheader')).toHaveLength(2);
  expect(tableOf('Invited, not joined yet').getByText('has not joined yet')).toBeTruthy();
  expect(tableOf('Inactive').getByRole('button', { name: 'Reactivate: Odo Fellgate' })).toBeTruthy();
  expect(screen.queryByRole('button', { name: 'Deactivate: Ruben Marlpit' })).toBeNull();
  expect(press('Deactivate: Henrik Stonebridge')).toBeTruthy();
});

test('an invitation asks for name, address and a role, in that order, and sends nothing before', async () => {
  const calls = serve();
  const { user, refetch } = renderView([ADMIN]);
  await user.click(press('Invite somebody'));
  await user.click(press('Send the invitation'));
  const lines = within(screen.getByRole('alert')).getAllByRole('link');
  expect(lines.map((line) => line.textContent)).toEqual([
    'Write the name as it is to stand on record.',
    'Write the e-mail address.',
    'Choose at least one role.',
  ]);
  expect(calls).toEqual([]);

  await user.type(screen.getByLabelText('Name'), ' Wilma Hartfell ');
  await user.type(screen.getByLabelText('E-mail address'), 'wilma@office.example');
  await user.click(screen.getByLabelText(/^Reviewer/));
  await user.click(screen.getByLabelText(/^Engineer/));
  await user.click(press('Send the invitation'));
  await waitFor(() => expect(refetch).toHaveBeenCalled());
  expect(calls).toEqual([
    {
      method: 'POST',
      path: '/api/people/invitations',
      body: { name: 'Wilma Hartfell', email: 'wilma@office.example', roles: ['engineer', 'reviewer'] },
    },
  ]);
  expect(screen.queryByRole('dialog')).toBeNull();
  expect(screen.getByText(/is invited; the letter to ada@office.example is on its way/)).toBeTruthy();
});

test('what the server refuses comes back beside its field, and what was typed stays', async () => {
  serve(409, {
    type: 'urn:merestone:problem:duplicate',
    title: 'This exists already',
    status: 409,
    detail: 'Somebody with this address is here already.',
    fields: [{ field: 'email', code: 'duplicate', message: 'Somebody with this address is here already.' }],
  });
  const { user } = renderView([ADMIN]);
  await user.click(press('Invite somebody'));
  await user.type(screen.getByLabelText('Name'), 'Ada');
  await user.type(screen.getByLabelText('E-mail address'), 'ada@office.example');
  await user.click(screen.getByLabelText(/^Auditor/));
  await user.click(press('Send the invitation'));
  await user.click(await screen.findByRole('link', { name: 'Somebody with this address is here already.' }));
  const field = screen.getByLabelText<HTMLInputElement>('E-mail address');
  expect(document.activeElement).toBe(field);
  expect([field.value, field.getAttribute('aria-invalid')]).toEqual(['ada@office.example', 'true']);
});

test('the rule on administrator and authority stands beside the roles and stops the change', async () => {
  const calls = serve(200);
  const { user } = renderView([ADMIN, AUTHORITY, person({})]);
  await user.click(press('Change: Ada Quillfeather'));
  expect(screen.queryByLabelText(/^Technical authority/)).toBeNull();
  expect(screen.getByRole('link', { name: 'propose an appointment' })).toBeTruthy();
  await user.click(press('Leave it as it is'));

  await user.click(press('Change: Henrik Stonebridge'));
  expect(screen.getByText(/exclude each other/, { selector: '.field-hint' })).toBeTruthy();
  await user.click(screen.getByLabelText(/^Administrator/));
  expect(screen.getByText(/Take one of the two away/, { selector: '.field-error' })).toBeTruthy();
  await user.click(press('Keep the change'));
  expect(screen.getByRole('alert').textContent).toContain('Take one of the two away');
  expect(calls).toEqual([]);

  await user.click(screen.getByLabelText(/^Technical authority/));
  await user.click(press('Keep the change'));
  await waitFor(() => expect(calls).toHaveLength(1));
  expect(calls[0]).toEqual({
    method: 'PATCH',
    path: '/api/people/p-authority',
    body: { name: 'Henrik Stonebridge', roles: ['administrator'] },
  });
});

test('deactivating needs a reason of some length, which survives leaving the dialog', async () => {
  const calls = serve(201, person({ active: false }));
  const { user } = renderView([ADMIN, person({})]);
  await user.click(press('Deactivate: Ada Quillfeather'));
  await user.type(screen.getByLabelText('Reason'), 'left');
  await user.click(press('Deactivate'));
  expect(screen.getByRole('alert').textContent).toContain('10 characters');
  await user.click(press('Leave it as it is'));
  await user.click(press('Deactivate: Ada Quillfeather'));
  const reason = screen.getByLabelText<HTMLTextAreaElement>('Reason');
  expect(reason.value).toBe('left');
  await user.type(reason, ' the office at the end of May');
  await user.click(press('Deactivate'));
  await waitFor(() => expect(calls).toHaveLength(1));
  expect(calls[0]).toEqual({
    method: 'POST',
    path: '/api/people/p-1/deactivation',
    body: { reason: 'left the office at the end of May' },
  });
  expect(await screen.findByText(/is inactive now/)).toBeTruthy();
});

test('an invitation that nobody took up is sent again as it was', async () => {
  const invited = person({ id: 'p-2', name: 'Wilma Hartfell', invited: true, lastSignIn: null });
  const calls = serve(201, invited);
  const { user, refetch } = renderView([ADMIN, invited]);
  await user.click(press('Send again: Wilma Hartfell'));
  await waitFor(() => expect(refetch).toHaveBeenCalled());
  expect(calls[0]?.body).toEqual({
    name: 'Wilma Hartfell',
    email: 'ada@office.example',
    roles: ['engineer'],
  });
  expect(screen.getByText(/The former link is void/)).toBeTruthy();
});
