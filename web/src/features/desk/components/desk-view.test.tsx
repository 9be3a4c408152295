import { cleanup, render, screen, within } from '@testing-library/react';
import { MemoryRouter } from 'react-router-dom';
import { afterEach, describe, expect, it } from 'vitest';
import type { DeskSection } from '../../../shared/api/types';
import { waitingWords } from '../model/waiting-words';
import { DeskView } from './desk-view';

afterEach(cleanup);

const item = (day: number) => ({
  title: `Sheet ${day}`,
  line: 'your verdict is missing',
  href: `/register/sheet-${day}/revisions/1/review`,
  at: `2026-03-${String(day).padStart(2, '0')}T09:00:00Z`,
});
const section = (over: Partial<DeskSection> = {}): DeskSection => ({
  key: 'to-review',
  title: 'To review',
  empty: 'No review waits for your verdict.',
  items: [],
  ...over,
});

function show(...sections: DeskSection[]) {
  render(
    <MemoryRouter>
      <DeskView sections={sections} />
    </MemoryRouter>,
  );
}

describe('the desk', () => {
  it('says in a sentence that a section is empty', () => {
    show(section());
    expect(
      within(screen.getByRole('region', { name: 'To review' })).getByText(/^No review waits/),
    ).toBeTruthy();
  });

  it('leads to what waits, the latest first', () => {
    show(section({ items: [item(1), item(2)] }));
    const links = screen.getAllByRole('link');
    expect(links.map((link) => link.textContent)).toEqual(['Sheet 2', 'Sheet 1']);
    expect(links[0]?.getAttribute('href')).toBe('/register/sheet-2/revisions/1/review');
  });

  it('keeps the order of what is due', () => {
    show(section({ key: 'due', items: [item(1), item(2)] }));
    expect(screen.getAllByRole('link').map((link) => link.textContent)).toEqual(['Sheet 1', 'Sheet 2']);
  });

  it('folds a long list, and leaves nothing out', () => {
    show(section({ items: Array.from({ length: 20 }, (_, i) => item(i + 1)) }));
    expect(screen.getByText('14 more')).toBeTruthy();
    expect(screen.getAllByRole('link').length).toBe(20);
  });

  it.each([
    [0, 'Nothing waits for you.'],
    [1, 'One thing waits for you.'],
    [2, '2 things wait for you.'],
  ])('of %d things says so', (count, words) => {
    expect(waitingWords([section({ items: Array.from({ length: count }, (_, i) => item(i + 1)) })])).toBe(
      words,
    );
  });
});
