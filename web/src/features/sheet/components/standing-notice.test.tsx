import { cleanup, render, screen } from '@testing-library/react';
import { MemoryRouter } from 'react-router-dom';
import { afterEach, describe, expect, it } from 'vitest';
import type { Sheet } from '../../../shared/api/types';
import { sampleSheet } from '../../../shared/samples/sheets';
import { StandingNotice } from './standing-notice';

afterEach(cleanup);

const by = { id: 'p-authority', name: 'Ines Vauquelin' };
const at = '2026-03-05T09:00:00Z';
function noticeOf(over: Partial<Sheet>): HTMLElement | null {
  render(
    <MemoryRouter>
      <StandingNotice sheet={sampleSheet(undefined, over)} />
    </MemoryRouter>,
  );
  return screen.queryByRole('note', { name: 'Standing' });
}

describe('what must be known of a sheet before it is used', () => {
  it('is nothing where it is approved and its review not due', () => {
    expect(noticeOf({ reviewDue: '2199-01-01T00:00:00Z' })).toBeNull();
  });

  it('is the day from which it holds, where that has not come', () => {
    const notice = noticeOf({ inForce: false, effectiveFrom: '2199-01-01T00:00:00Z' });
    expect(notice?.textContent).toContain('Approved from 1 January 2199: until then it is not in use.');
    expect(screen.getByRole('link', { name: 'The revision in use now' })).toBeTruthy();
  });

  it('is that its review is overdue', () => {
    expect(noticeOf({ reviewDue: '2020-01-01T00:00:00Z' })?.textContent).toContain(
      'Due to be looked at again since 1 January 2020.',
    );
  });

  it('is why it was withdrawn, what is wrong, and what to use instead, in large type', () => {
    const notice = noticeOf({
      standing: 'withdrawn',
      withdrawal: { reason: 'A constant is misprinted.', class: 'error-in-source', by, at },
      successor: { slug: 'linton-sherwood', revision: 3, title: 'Pipe, turbulent' },
    });
    expect(notice?.className).toContain('standing-notice-stop');
    expect(notice?.textContent).toContain('A constant is misprinted.');
    expect(notice?.textContent).toContain('What is wrong: an error in the source.');
    expect(screen.getByRole('link', { name: 'Pipe, turbulent, rev 3' }).getAttribute('href')).toBe(
      '/register/linton-sherwood/revisions/3',
    );
  });

  it('is why it is suspended', () => {
    const suspension = { reason: 'The range of Sc is doubted.', by, at, problemReport: null };
    expect(noticeOf({ standing: 'suspended', suspension })?.textContent).toContain(
      'The range of Sc is doubted.',
    );
  });

  it('is the revision that took its place', () => {
    noticeOf({
      standing: 'superseded',
      successor: { slug: 'gilliland-sherwood', revision: 3, title: 'The same sheet' },
    });
    expect(screen.getByRole('link', { name: 'rev 3' }).getAttribute('href')).toBe(
      '/register/gilliland-sherwood/revisions/3',
    );
  });
});
