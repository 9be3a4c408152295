import { cleanup, fireEvent, screen, waitFor, within } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { HASH, sampleReview } from '../testing/sample-review';
import { renderReview, serveActs } from '../testing/render-review';

beforeEach(() => window.localStorage.clear());
afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

const AT = '/api/correlations/gilliland-sherwood/revisions/2';
const press = (name: string) => screen.getByRole('button', { name });
const field = (name: string) => screen.getByLabelText<HTMLInputElement>(name);
const ready = () =>
  sampleReview({ approvals: { favourable: 2, needed: 2 } }, { approve: true, decline: true });

describe('an approval', () => {
  it('says what the signature means, that it cannot be undone, and which content it is about', () => {
    serveActs();
    renderReview(ready());
    const form = screen.getByRole('heading', { name: 'Approve revision 2' }).closest('form');
    expect(form?.textContent).toMatch(/your name, the time, its meaning and the hash/);
    expect(form?.textContent).toContain('this cannot be undone');
    expect(form?.textContent).toContain('aa7b 4f1d f527'.replaceAll(' ', '\u00a0'));
    expect(screen.getByText(/It waits for the decision of a technical authority/)).toBeTruthy();
  });

  it('is not sent without a password, nor with days that cannot be', async () => {
    const asked = serveActs();
    const { user } = renderReview(ready());
    fireEvent.change(field('It holds from'), { target: { value: '2020-01-01' } });
    fireEvent.change(field('To be looked at again by'), { target: { value: '2019-01-01' } });
    await user.click(press('Sign and approve revision 2'));
    const lines = within(screen.getByRole('alert'))
      .getAllByRole('link')
      .map((link) => link.textContent);
    expect(lines).toEqual([
      'Choose today or a later day: no approval reaches back.',
      'Choose a day after the one it holds from.',
      'Write your password: it signs the approval.',
    ]);
    expect(asked).toEqual([]);
  });

  it('sends meaning, hash, days and password, and forgets the password', async () => {
    const asked = serveActs();
    const { user } = renderReview(ready());
    fireEvent.change(field('It holds from'), { target: { value: '2199-01-01' } });
    await user.type(field('Your password, once more'), 'correct horse');
    await user.click(press('Sign and approve revision 2'));
    await waitFor(() => expect(asked.length).toBe(1));
    expect(asked[0]).toMatchObject({
      path: `${AT}/approval`,
      body: {
        password: 'correct horse',
        meaning: 'Approved by this office for design within the stated bounds.',
        hash: HASH,
        effectiveFrom: '2199-01-01',
      },
    });
    await waitFor(() => expect(field('Your password, once more').value).toBe(''));
  });

  it('with a wrong password says so at the field', async () => {
    const fields = [{ field: 'password', code: 'wrong', message: 'This is not your password.' }];
    serveActs(403, {
      type: 'urn:merestone:problem:wrong-password',
      title: 'Not signed',
      detail: 'The password is wrong.',
      status: 403,
      fields,
    });
    const { user } = renderReview(ready());
    await user.type(field('Your password, once more'), 'nope');
    await user.click(press('Sign and approve revision 2'));
    await waitFor(() => expect(screen.getByText('This is not your password.')).toBeTruthy());
    expect(field('Your password, once more').getAttribute('aria-describedby')).toBe(
      'approval-password-error',
    );
  });

  it('on content that has changed meanwhile is not signed, and the page offers the present content', async () => {
    serveActs(409, { type: 'urn:merestone:problem:stale', title: 'Stale', status: 409, detail: 'Changed.' });
    const { user } = renderReview(ready());
    await user.type(field('Your password, once more'), 'correct horse');
    await user.click(press('Sign and approve revision 2'));
    await waitFor(() => expect(press('Load the present content')).toBeTruthy());
  });
});

describe('a decision against a revision', () => {
  it('is declined with a reason, which is kept while the dialog is closed', async () => {
    const asked = serveActs();
    const { user } = renderReview(ready());
    await user.click(press('Decline revision 2'));
    const dialog = () => within(screen.getByRole('dialog', { name: 'Decline revision 2' }));
    await user.type(dialog().getByLabelText('Reason'), 'too short');
    await user.click(dialog().getByRole('button', { name: 'Decline revision 2' }));
    expect(asked).toEqual([]);
    await user.click(dialog().getByRole('button', { name: 'Leave it as it is' }));
    expect(screen.queryByRole('dialog')).toBeNull();
    await user.click(press('Decline revision 2'));
    await user.type(dialog().getByLabelText('Reason'), ' to be of use');
    await user.click(dialog().getByRole('button', { name: 'Decline revision 2' }));
    await waitFor(() => expect(screen.queryByRole('dialog')).toBeNull());
    expect(asked[0]).toMatchObject({ path: `${AT}/decline`, body: { reason: 'too short to be of use' } });
  });

  it('is withdrawn with a reason and what is wrong', async () => {
    const asked = serveActs();
    const { user } = renderReview(sampleReview({ standing: 'approved' }, { withdraw: true, suspend: true }));
    await user.click(press('Withdraw revision 2'));
    const dialog = within(screen.getByRole('dialog', { name: 'Withdraw revision 2' }));
    expect(dialog.getByText('This cannot be undone.')).toBeTruthy();
    await user.type(dialog.getByLabelText('Reason'), 'A constant is misprinted.');
    await user.click(dialog.getByRole('button', { name: 'Withdraw revision 2' }));
    expect(dialog.getAllByText('Choose what is wrong.').length).toBeGreaterThan(0);
    await user.click(dialog.getByRole('radio', { name: /^Error in the source/ }));
    await user.click(dialog.getByRole('button', { name: 'Withdraw revision 2' }));
    await waitFor(() => expect(asked.length).toBe(1));
    expect(asked[0]).toMatchObject({
      path: `${AT}/withdrawal`,
      body: { reason: 'A constant is misprinted.', class: 'error-in-source' },
    });
  });
});
