import { cleanup, fireEvent, render, screen, waitFor, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, expect, test, vi } from 'vitest';
import type { Appointment } from '../../../shared/api/types';
import { lastDayError } from '../model/last-day';
import { AppointmentsView } from './appointments-view';

afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
  window.localStorage.clear();
});

const appointment = (part: Partial<Appointment>): Appointment => ({
  id: 'a-1',
  person: { id: 'p-1', name: 'Nandi Brackenbury' },
  geometries: ['wetted-wall', 'sphere'],
  until: '2027-06-30',
  state: 'proposed',
  proposed: { at: '2026-11-30T08:00:00Z', by: { id: 'p-admin', name: 'Ruben Marlpit' } },
  confirmed: null,
  ended: null,
  endReason: null,
  abilities: { confirm: true, end: false },
  ...part,
});
const GEOMETRIES = [
  { slug: 'sphere', name: 'Sphere' },
  { slug: 'wetted-wall', name: 'Wetted wall' },
];
const CANDIDATES = [{ id: 'p-2', name: 'Tobias Fennimore', roles: ['reviewer' as const] }];

function serve(status: number, answer: unknown) {
  const calls: { path: string; body: unknown }[] = [];
  vi.stubGlobal('fetch', async (request: Request) => {
    if (request.method === 'GET') return new Response('{}', { status: 401 });
    calls.push({ path: new URL(request.url).pathname, body: JSON.parse(await request.text()) });
    return new Response(JSON.stringify(answer), { status });
  });
  return calls;
}

function renderView(appointments: Appointment[], mayPropose = true) {
  const refetch = vi.fn(() => Promise.resolve());
  render(
    <AppointmentsView
      appointments={appointments}
      geometries={GEOMETRIES}
      candidates={mayPropose ? CANDIDATES : null}
      refetch={refetch}
    />,
  );
  return { user: userEvent.setup(), refetch };
}

test('an appointment is a sentence: for what, until when, by whom', () => {
  renderView([
    appointment({}),
    appointment({
      id: 'a-2',
      geometries: 'all',
      state: 'ended',
      confirmed: { at: '2026-01-02T08:00:00Z', by: { id: 'p-3', name: 'Saoirse Larkmead' } },
      abilities: { confirm: false, end: false },
    }),
  ]);
  const [proposed, ended] = screen.getAllByRole('listitem');
  expect(proposed?.textContent).toContain('For Wetted wall and Sphere, until 30 June 2027.');
  expect(proposed?.textContent).toContain(
    'Proposed by Ruben Marlpit on 30 November 2026; waits to be confirmed.',
  );
  expect(ended?.textContent).toContain('For all geometries, and property equations');
  expect(ended?.textContent).toContain(
    'confirmed by Saoirse Larkmead on 2 January 2026; ended with its last day.',
  );
  expect(within(ended!).queryByRole('button')).toBeNull();
});

test('who may not propose is not asked to', () => {
  renderView([], false);
  expect(screen.queryByRole('button', { name: /Propose/ })).toBeNull();
  expect(screen.getByText('Nobody is appointed yet')).toBeTruthy();
});

test('a proposal needs a person, a scope and a day', async () => {
  const calls = serve(201, appointment({ person: { id: 'p-2', name: 'Tobias Fennimore' } }));
  const { user, refetch } = renderView([]);
  await user.click(screen.getByRole('button', { name: 'Propose a technical authority' }));
  await user.click(screen.getByRole('button', { name: 'Propose' }));
  expect(
    within(screen.getByRole('alert'))
      .getAllByRole('link')
      .map((line) => line.textContent),
  ).toEqual([
    'Choose whom to propose.',
    'Say whether it is for all geometries or for some.',
    'Say until which day.',
  ]);
  await user.selectOptions(screen.getByLabelText('Person'), 'Tobias Fennimore');
  await user.click(screen.getByLabelText('Only some geometries'));
  await user.click(screen.getByRole('button', { name: 'Propose' }));
  expect(screen.getByRole('alert').textContent).toContain('Choose at least one geometry.');
  await user.click(screen.getByLabelText('Sphere'));
  const until = `${new Date().getUTCFullYear() + 1}-06-30`;
  fireEvent.change(screen.getByLabelText('Last day'), { target: { value: until } });
  await user.click(screen.getByRole('button', { name: 'Propose' }));
  await waitFor(() => expect(refetch).toHaveBeenCalled());
  expect(calls).toEqual([
    { path: '/api/appointments', body: { person: 'p-2', geometries: ['sphere'], until } },
  ]);
  expect(screen.getByText(/A second person has to confirm it/)).toBeTruthy();
});

test('confirming is a signature: it says what it means and takes the password as it is', async () => {
  const calls = serve(201, appointment({ state: 'current' }));
  const { user, refetch } = renderView([appointment({})]);
  await user.click(screen.getByRole('button', { name: 'Confirm the appointment of Nandi Brackenbury' }));
  const dialog = within(screen.getByRole('dialog'));
  expect(dialog.getByText(/may approve, suspend and withdraw sheets within that/)).toBeTruthy();
  await user.click(dialog.getByRole('button', { name: 'Sign and confirm' }));
  expect(dialog.getByRole('alert').textContent).toContain('Write your password.');
  const password = dialog.getByLabelText<HTMLInputElement>('Password');
  expect([password.type, password.autocomplete]).toEqual(['password', 'current-password']);
  await user.click(password);
  await user.paste(' four wet grey stones ');
  await user.click(dialog.getByRole('button', { name: 'Sign and confirm' }));
  await waitFor(() => expect(refetch).toHaveBeenCalled());
  expect(calls).toEqual([
    { path: '/api/appointments/a-1/confirmation', body: { password: ' four wet grey stones ' } },
  ]);
});

test('a refused password is said beside it', async () => {
  serve(403, {
    type: 'urn:merestone:problem:password-refused',
    title: 'The password was refused',
    status: 403,
    detail: 'The password is not right; nothing was confirmed.',
    fields: [{ field: 'password', code: 'password-refused', message: 'The password is not right.' }],
  });
  const { user } = renderView([appointment({})]);
  await user.click(screen.getByRole('button', { name: /^Confirm the appointment/ }));
  await user.type(screen.getByLabelText('Password'), 'wrong');
  await user.click(screen.getByRole('button', { name: 'Sign and confirm' }));
  expect((await screen.findByRole('alert')).textContent).toContain('The password is not right.');
  expect(screen.getByLabelText('Password').getAttribute('aria-invalid')).toBe('true');
});

test('taking a proposal back and ending an appointment are told apart', async () => {
  const calls = serve(201, appointment({ state: 'ended' }));
  const { user } = renderView([
    appointment({ abilities: { confirm: false, end: true } }),
    appointment({ id: 'a-2', state: 'current', abilities: { confirm: false, end: true } }),
  ]);
  expect(screen.getByRole('button', { name: 'End the appointment of Nandi Brackenbury' })).toBeTruthy();
  await user.click(screen.getByRole('button', { name: 'Take back the proposal of Nandi Brackenbury' }));
  await user.type(screen.getByLabelText('Reason'), 'Another office asked for her.');
  await user.click(screen.getByRole('button', { name: 'Take it back' }));
  await waitFor(() => expect(calls).toHaveLength(1));
  expect(calls[0]).toEqual({
    path: '/api/appointments/a-1/end',
    body: { reason: 'Another office asked for her.' },
  });
});

const NOW = new Date('2026-12-01T12:00:00Z');
test.each([
  ['', 'Say until which day.'],
  ['2026-12-01', 'The last day must be after today.'],
  ['2026-12-02', undefined],
  ['2036-12-01', undefined],
  ['2036-12-02', 'An appointment is for 10 years at most.'],
])('of the last day %s is said: %s', (until, words) => {
  expect(lastDayError(until, NOW)).toBe(words);
});
