import { act, cleanup, configure, fireEvent, screen, waitFor, within } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, test, vi } from 'vitest';
import { openNew, openRevise } from '../model/opening';
import { draftKey, readStoredDraft } from '../model/stored-draft';
import { DraftServer, draftSheet } from '../testing/draft-server';
import { button, control, renderDraft } from '../testing/render-draft';

// The whole form is drawn, and saving waits for typing to settle.
vi.setConfig({ testTimeout: 30_000 });
configure({ asyncUtilTimeout: 6000 });

beforeEach(() => window.localStorage.clear());
afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

const type = (path: string, value: string) => fireEvent.change(control(path), { target: { value } });
const says = (words: string | RegExp) =>
  waitFor(() => expect(document.querySelector('.draft-bar')?.textContent).toMatch(words));
const stored = (storeAs: string) => readStoredDraft(window.localStorage, draftKey('p-engineer', storeAs));
const editing = (server: DraftServer) => openRevise(null, { sheet: server.sheet, open: server.sheet });

describe('writing a sheet', () => {
  test('what is typed is kept in this browser at once, and the open places are counted', async () => {
    new DraftServer();
    renderDraft(openNew(null, null));
    type('title', 'Wetted wall, turbulent');
    expect(control('slug').value).toBe('wetted-wall-turbulent');
    await waitFor(() => expect(stored('new')?.form.head.title).toBe('Wetted wall, turbulent'));
    await says(/Kept in this browser only: \d+ places still to be filled in/);
  });

  test('leaving the page keeps the last letter', () => {
    new DraftServer();
    const { unmount } = renderDraft(openNew(null, null));
    type('summary', 'Half a sen');
    unmount();
    expect(stored('new')?.form.head.summary).toBe('Half a sen');
  });

  test('rows are added, moved and removed by keyboard', async () => {
    new DraftServer();
    const { user } = renderDraft(editing(new DraftServer()));
    control('groups[0].symbol').focus();
    await user.keyboard('{Enter}');
    await waitFor(() => expect(document.activeElement?.id).toBe('draft-groups-1-symbol'));
    await user.keyboard('We');
    expect(control('groups[1].symbol').value).toBe('We');
    await user.keyboard('{Alt>}{ArrowUp}{/Alt}');
    expect(control('groups[0].symbol').value).toBe('We');
    await user.click(button('Remove group We'));
    expect(control('groups[0].symbol').value).toBe('Re');
    await user.click(button('Put the removed row back'));
    expect(control('groups[0].symbol').value).toBe('We');
  });

  test('a quantity is found by words of its title and brings symbol and unit along', async () => {
    new DraftServer();
    const { user } = renderDraft(openNew(null, null));
    await user.type(control('quantities[0].is'), 'gas dens');
    const list = screen.getByRole('listbox', { name: 'Choices' });
    expect(within(list).getAllByRole('option')[0]?.textContent).toMatch(/^Gas density/);
    await user.keyboard('{Enter}');
    expect(control('quantities[0].is').value).toBe('Gas density');
    expect(control('quantities[0].symbol').value).toBe('rho');
    expect(control('quantities[0].unit').value).toBe('kg/m^3');
    await user.type(control('quantities[0].is'), 'tube{Escape}');
    expect(control('quantities[0].is').value).toBe('Gas density');
  });

  test('a named group comes with the symbols of the sheet', async () => {
    new DraftServer();
    const { user } = renderDraft(editing(new DraftServer()));
    await user.type(screen.getByRole('combobox', { name: 'Pick a named group' }), 'peclet{Enter}');
    expect(control('groups[2].expression').value).toBe('u*d/D');
    await user.type(screen.getByRole('combobox', { name: 'Pick a named group' }), 'weber{Enter}');
    expect(screen.getByText(/The sheet has no surface tension: sigma stands in its place/)).toBeTruthy();
  });

  test('what is left over of a group’s dimensions is said beside it and among the findings', async () => {
    const server = new DraftServer();
    renderDraft(editing(server));
    type('groups[0].expression', 'rho*u*d^2/mu');
    await waitFor(() => expect(screen.getAllByText('m is left over').length).toBe(2));
    const findings = document.getElementById('draft-findings');
    expect(findings?.textContent).toContain('Group Re, expression: Re is not dimensionless: m is left over.');
    fireEvent.click(within(findings!).getByRole('link', { name: 'Group Re, expression' }));
    expect(document.activeElement).toBe(control('groups[0].expression'));
    type('groups[0].expression', 'rho*u*/mu');
    expect(await screen.findByText(/Not read at character 7/)).toBeTruthy();
    expect(server.writes()).toEqual([]);
  });

  test('a worked check says what it comes to as it is typed', async () => {
    renderDraft(editing(new DraftServer()));
    expect(await screen.findByText('Reproduces.')).toBeTruthy();
    type('parts[0].result.expression', '0.03*Re^0.83*Sc^0.44');
    expect(await screen.findByText('Does not reproduce.')).toBeTruthy();
    expect(document.getElementById('draft-findings')?.textContent).toMatch(/Stops a submission \(1\)/);
  });
});

describe('entering a sheet', () => {
  test('what is missing is listed once it was asked for, each line leading to its field', async () => {
    const server = new DraftServer();
    const { user, onEntered } = renderDraft(openNew(null, server.sheet));
    await user.click(button('Enter as a draft'));
    const summary = await screen.findByRole('alert');
    await user.click(within(summary).getByRole('link', { name: 'Title: Still empty.' }));
    expect(document.activeElement).toBe(control('title'));
    expect(onEntered).not.toHaveBeenCalled();
    expect(server.writes()).toEqual([]);
  });

  test('a whole sheet goes to the register under its name, and is no longer kept as new', async () => {
    const server = new DraftServer();
    const { user, onEntered, unmount } = renderDraft(openNew(null, server.sheet));
    type('title', 'After a pattern');
    type('verification.status', 'from-memory');
    type('verification.note', 'Not yet.');
    await waitFor(() => expect(stored('after:gilliland-sherwood')).not.toBeNull());
    await user.click(button('Enter as a draft'));
    await waitFor(() => expect(onEntered).toHaveBeenCalled());
    expect(server.writes()).toMatchObject([
      { method: 'POST', path: '/api/correlations', body: { slug: 'after-a-pattern' } },
    ]);
    unmount();
    expect(stored('after:gilliland-sherwood')).toBeNull();
  });

  test('a name that is taken is told, and nothing is lost', async () => {
    const server = new DraftServer();
    server.refuse = ({ method }) =>
      method === 'POST'
        ? {
            status: 409,
            body: { type: 'urn:merestone:problem:conflict', title: 'Taken', detail: 'The name is taken.' },
          }
        : null;
    const { user } = renderDraft(openNew(null, server.sheet));
    type('title', 'Twice');
    type('verification.status', 'from-memory');
    type('verification.note', 'Not yet.');
    await user.click(button('Enter as a draft'));
    expect(await screen.findByText('The name is taken.')).toBeTruthy();
    await waitFor(() => expect(stored('after:gilliland-sherwood')?.form.head.title).toBe('Twice'));
  });
});

describe('saving a draft', () => {
  test('each change is saved with the hash of the content that it was made on', async () => {
    const server = new DraftServer();
    const before = server.sheet.hash;
    renderDraft(editing(server));
    await says('As it is in the register');
    type('title', 'First');
    await says(/Saved \d\d:\d\d/);
    type('title', 'Second');
    await waitFor(() => expect(server.sheet.title).toBe('Second'));
    expect(server.writes().map(({ ifMatch }) => ifMatch)).toEqual([
      `"${before}"`,
      `"${'1'.padStart(64, '0')}"`,
    ]);
    await waitFor(() => expect(stored('revise:gilliland-sherwood')?.unsaved).toBe(false));
  });

  test('a sheet that is not whole waits in this browser and says why', async () => {
    const server = new DraftServer();
    renderDraft(editing(server));
    type('title', '');
    await says('Kept in this browser only: 1 place still to be filled in');
    type('title', 'Whole again');
    await says(/Saved/);
    expect(server.writes()).toHaveLength(1);
  });

  test('a server that cannot be reached is told and asked again', async () => {
    const server = new DraftServer();
    server.refuse = ({ method }) =>
      method === 'PUT'
        ? {
            status: 503,
            body: { type: 'urn:merestone:problem:busy', title: 'The server is busy', detail: 'Not now.' },
          }
        : null;
    renderDraft(editing(server));
    type('title', 'While it is away');
    await says('Kept in this browser only: the server is busy; it is asked again');
    expect(stored('revise:gilliland-sherwood')?.form.head.title).toBe('While it is away');
  });

  test('a revision in review is changed only after that was said', async () => {
    const server = new DraftServer(draftSheet({ standing: 'in review' }));
    const { user } = renderDraft(editing(server));
    type('title', 'Changed in review');
    await says('Kept in this browser only: the revision is in review');
    expect(server.writes()).toEqual([]);
    await user.click(button(/verdicts so far no longer count/));
    await says(/Saved/);
  });
});

describe('two people at one draft', () => {
  async function conflict() {
    const server = new DraftServer();
    const drawn = renderDraft(editing(server));
    server.changeElsewhere({ title: 'Theirs' });
    type('title', 'Mine');
    expect(await screen.findByText(/Somebody has changed this draft/)).toBeTruthy();
    expect(server.sheet.title).toBe('Theirs');
    return { server, ...drawn };
  }

  test('theirs is taken, mine is set aside and comes back when asked for', async () => {
    const { user, server } = await conflict();
    await user.click(button('Take theirs, set mine aside'));
    expect(control('title').value).toBe('Theirs');
    expect(screen.queryByText(/Somebody has changed this draft/)).toBeNull();
    await user.click(button('Bring mine back into the form'));
    expect(control('title').value).toBe('Mine');
    await waitFor(() => expect(server.sheet.title).toBe('Mine'));
  });

  test('mine is kept as the next save, on top of theirs', async () => {
    const { user, server } = await conflict();
    await user.click(button('Keep mine as the next save'));
    await waitFor(() => expect(server.sheet.title).toBe('Mine'));
    expect(server.sheet.iteration).toBe(3);
  });
});

describe('submitting', () => {
  test('goes with the reviewers that were named', async () => {
    const server = new DraftServer();
    const { user, onSubmitted } = renderDraft(editing(server));
    await user.click(await screen.findByRole('checkbox', { name: 'Tomas Lindqvist' }));
    expect(screen.queryByRole('checkbox', { name: 'Edda Krantz' })).toBeNull();
    await user.click(button('Submit for review'));
    await waitFor(() => expect(onSubmitted).toHaveBeenCalled());
    expect(server.writes()).toMatchObject([
      {
        path: expect.stringMatching(/revisions\/3\/submission$/) as string,
        body: { reviewers: ['p-reviewer'] },
      },
    ]);
  });

  test('saves first what is not saved yet', async () => {
    const server = new DraftServer();
    const { user, onSubmitted } = renderDraft(editing(server));
    type('title', 'At the last moment');
    await act(() => Promise.resolve());
    await user.click(button('Submit for review'));
    await waitFor(() => expect(onSubmitted).toHaveBeenCalled());
    expect(server.writes().map(({ method }) => method)).toEqual(['PUT', 'POST']);
  });

  test('an error of the machine keeps the button shut and says where to look', async () => {
    const server = new DraftServer();
    renderDraft(editing(server));
    type('parts[0].result.expression', '0.03*Re^0.83*Sc^0.44');
    expect(await screen.findByText('The machine finds an error; see the findings.')).toBeTruthy();
    await waitFor(() => expect(button('Submit for review').disabled).toBe(true));
  });

  test('what the server’s machine stops is shown at its place', async () => {
    const server = new DraftServer();
    server.refuse = ({ path }) =>
      path.endsWith('/submission')
        ? {
            status: 422,
            body: {
              type: 'urn:merestone:problem:machine-check',
              title: 'The machine check found errors',
              detail: 'One error.',
              fields: [
                { field: 'definition.checks[0]', code: 'check-failed', message: 'It does not reproduce.' },
              ],
            },
          }
        : null;
    const { user, onSubmitted } = renderDraft(editing(server));
    await screen.findByText(/Nothing stands in its way|will travel along/);
    await user.click(button('Submit for review'));
    expect(await screen.findByText('Check 1: It does not reproduce.')).toBeTruthy();
    expect(onSubmitted).not.toHaveBeenCalled();
  });
});
