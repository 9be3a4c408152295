import { cleanup, screen, waitFor, within } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { HASH, people, sampleComment, sampleReview } from '../testing/sample-review';
import { renderReview, serveActs } from '../testing/render-review';

beforeEach(() => window.localStorage.clear());
afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

const AT = '/api/correlations/gilliland-sherwood/revisions/2';
const press = (name: string | RegExp) => screen.getByRole('button', { name });
const row = (id: string) => {
  const found = document.getElementById(id);
  if (!found) throw new Error(`there is no row ${id}`);
  return within(found);
};
const STALE = {
  type: 'urn:merestone:problem:stale',
  title: 'The content has changed',
  status: 409,
  detail: 'It was read before somebody changed it.',
};

describe('how far a review has come', () => {
  it('is said as favourable reviews, what is missing, whose turn it is and what is open', () => {
    serveActs();
    renderReview(sampleReview());
    expect(screen.getByText(/^1 of 2 favourable reviews\. One more is needed/)).toBeTruthy();
    expect(screen.getByText('It is with its reviewers. One comment is open.')).toBeTruthy();
    expect(screen.getByRole('link', { name: 'Bound on Reynolds number' }).getAttribute('href')).toBe(
      '#field-bounds-0',
    );
  });

  it('says of a verdict on earlier content that it is void, and why', () => {
    serveActs();
    renderReview(sampleReview());
    const verdicts = within(screen.getByRole('region', { name: 'Verdicts' })).getAllByRole('listitem');
    expect(verdicts[0]?.textContent).toContain(
      'Void: it was given on iteration 1, and the content has changed since.',
    );
    expect(verdicts[1]?.textContent).not.toContain('Void');
  });

  it('takes a review from the desk', async () => {
    const asked = serveActs();
    const { user } = renderReview(sampleReview({}, { take: true }));
    await user.click(press('Take this review'));
    expect(asked).toEqual([{ method: 'POST', path: `${AT}/assignments`, body: null, ifMatch: null }]);
  });

  it('shows what each iteration changed and what was said when it was put forward', () => {
    serveActs();
    renderReview(sampleReview());
    expect(screen.getByText('what iteration 2 changed')).toBeTruthy();
    expect(screen.getByText('Exponent and range are those of the source again.')).toBeTruthy();
  });
});

describe('what the machine found', () => {
  it('counts errors, warnings and passes in words, and stands beside the field as well', () => {
    serveActs();
    renderReview(sampleReview());
    expect(screen.getByText(/^One error\. .*for a reviewer to judge; \d points? passed\.$/)).toBeTruthy();
    // The sample lists a property equation that the test's library does not have.
    expect(row('field-quantities-0').getByText(/no property equation "ideal-gas-dry-air"/)).toBeTruthy();
  });
});

describe('comments', () => {
  it('stand beside their field, an answered and resolved one folded', () => {
    serveActs();
    const answers = [{ id: 1, text: 'Put back.', by: people.originator, at: '2026-02-23T09:00:00Z' }];
    const settled = { resolved: { by: people.reviewer, at: '2026-02-24T09:00:00Z' }, answers };
    renderReview(
      sampleReview({ comments: [sampleComment(), sampleComment({ id: 8, field: 'groups[1]', ...settled })] }),
    );
    expect(row('field-bounds-0').getByText('The table goes to 27 000 only.')).toBeTruthy();
    expect(row('field-groups-1').getByText('One resolved comment')).toBeTruthy();
    expect(row('field-groups-1').getByText(/Resolved by Tomas Lindqvist/)).toBeTruthy();
  });

  it('on what the sheet no longer has stand with the sheet as a whole', () => {
    serveActs();
    renderReview(sampleReview({ comments: [sampleComment({ field: 'cautions[9]' })] }));
    expect(row('field-whole').getByText('The table goes to 27 000 only.')).toBeTruthy();
  });

  it('are sent with the path of their field', async () => {
    const asked = serveActs();
    const { user } = renderReview(sampleReview());
    await user.click(press('Comment on Gas side: result'));
    await user.type(screen.getByLabelText('Your comment on Gas side: result'), 'Is it 0.83?');
    await user.click(press('Send comment'));
    await waitFor(() => expect(screen.queryByLabelText('Your comment on Gas side: result')).toBeNull());
    expect(asked[0]).toMatchObject({
      path: `${AT}/comments`,
      body: { field: 'parts[0].result', text: 'Is it 0.83?' },
    });
  });

  it('keep what is typed when they are refused, and over a reload', async () => {
    serveActs(503, { type: 'urn:merestone:problem:busy', title: 'Busy', status: 503, detail: 'Try again.' });
    const { user, unmount } = renderReview(sampleReview());
    await user.click(press('Comment on Title'));
    await user.type(screen.getByLabelText('Your comment on Title'), 'Too long.');
    await user.click(press('Send comment'));
    await waitFor(() => expect(screen.getByText('Busy')).toBeTruthy());
    unmount();
    renderReview(sampleReview());
    expect(screen.getByLabelText('Your comment on Title')).toHaveProperty('value', 'Too long.');
  });

  it('are answered and resolved where the viewer may', async () => {
    const asked = serveActs();
    const { user } = renderReview(sampleReview());
    await user.click(press('Answer the comment by Tomas Lindqvist'));
    await user.type(screen.getByLabelText('Your answer to Tomas Lindqvist'), 'Right.');
    await user.click(press('Send answer'));
    await user.click(press('Resolve the comment by Tomas Lindqvist'));
    expect(asked.map(({ path }) => path)).toEqual([
      `${AT}/comments/7/answers`,
      `${AT}/comments/7/resolution`,
    ]);
  });

  it('offer no answer and no resolution where the viewer may not', () => {
    serveActs();
    const abilities = { answer: false, resolve: false };
    renderReview(sampleReview({ comments: [sampleComment({ abilities })] }, { comment: false }));
    expect(screen.queryByRole('button', { name: /Answer|Resolve|Comment/ })).toBeNull();
  });
});

describe('a verdict', () => {
  it('is favourable only once every point was checked, and names the content it is about', async () => {
    const asked = serveActs();
    const { user } = renderReview(sampleReview({}, { verdict: true }));
    await user.click(screen.getByRole('checkbox', { name: /^The ranges are/ }));
    await user.click(press('Recommend revision 2'));
    expect(within(screen.getByRole('alert')).getAllByRole('link').length).toBe(5);
    expect(asked).toEqual([]);
    for (const point of screen.getAllByRole<HTMLInputElement>('checkbox'))
      if (!point.checked) await user.click(point);
    await user.click(press('Recommend revision 2'));
    await waitFor(() => expect(asked.length).toBe(1));
    expect(asked[0]).toMatchObject({
      path: `${AT}/reviews`,
      ifMatch: `"${HASH}"`,
      body: { verdict: 'recommend', checklist: { ranges: true, duplicates: true } },
    });
  });

  it('that asks for changes needs a note, and says what it brings before it is given', async () => {
    const asked = serveActs();
    const { user } = renderReview(sampleReview({}, { verdict: true }));
    await user.click(press('Ask for changes'));
    expect(screen.getByRole('alert').textContent).toContain('Write in the note what is wrong.');
    await user.type(screen.getByRole('textbox', { name: /^Note to/ }), 'The exponent.');
    await user.click(press('Ask for changes'));
    const dialog = within(screen.getByRole('dialog', { name: 'Ask for changes: revision 2' }));
    expect(dialog.getByText(/verdicts given before it no longer count/)).toBeTruthy();
    await user.click(dialog.getByRole('button', { name: 'Ask for changes' }));
    await waitFor(() =>
      expect(asked[0]?.body).toMatchObject({ verdict: 'ask-for-changes', note: 'The exponent.' }),
    );
  });

  it('on content that has changed is not lost: it says so and keeps the note', async () => {
    serveActs(409, STALE);
    const { user } = renderReview(sampleReview({}, { verdict: true }));
    await user.type(screen.getByRole('textbox', { name: /^Note to/ }), 'The exponent.');
    await user.click(press('Decline revision 2'));
    await user.click(within(screen.getByRole('dialog')).getByRole('button', { name: 'Decline revision 2' }));
    await waitFor(() =>
      expect(screen.getByText('The sheet has changed since you opened this page')).toBeTruthy(),
    );
    expect(screen.getByRole('textbox', { name: /^Note to/ })).toHaveProperty('value', 'The exponent.');
    expect(press('Load the present content')).toBeTruthy();
  });

  it('is not asked of those who may not give one', () => {
    serveActs();
    renderReview(sampleReview());
    expect(screen.queryByRole('heading', { name: 'Your verdict' })).toBeNull();
    expect(screen.queryByRole('heading', { name: 'Decision' })).toBeNull();
  });
});
