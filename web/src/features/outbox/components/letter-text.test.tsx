import { cleanup, render, screen } from '@testing-library/react';
import { MemoryRouter } from 'react-router-dom';
import { afterEach, expect, test } from 'vitest';
import type { Letter } from '../../../shared/api/types';
import { letterState } from '../model/letter-state';
import { LetterList } from './letter-list';
import { LetterText } from './letter-text';

afterEach(cleanup);

const letter = (part: Partial<Letter>): Letter => ({
  id: 'l-1',
  to: 'wilma@office.example',
  subject: 'Merestone: your invitation',
  body: 'Good day,\n\nhere it is:\n\n',
  at: '2026-12-01T08:00:00Z',
  state: 'local',
  tries: 0,
  lastError: null,
  ...part,
});

function renderLetter(part: Partial<Letter>) {
  render(
    <MemoryRouter>
      <LetterText letter={letter(part)} />
    </MemoryRouter>,
  );
}

test("a letter's own address can be followed, any other is only text", () => {
  renderLetter({
    body: `See ${window.location.origin}/invitation/abc or https://evil.example/<b>x</b>`,
  });
  const links = screen.getAllByRole('link');
  expect(links.map((link) => link.getAttribute('href'))).toEqual(['/invitation/abc']);
  expect(screen.getByText(/https:\/\/evil.example/)).toBeTruthy();
  expect(document.querySelector('b')).toBeNull();
});

test('what a mail server last said is shown', () => {
  renderLetter({ state: 'waiting', tries: 2, lastError: '451 try later' });
  expect(screen.getByText('451 try later')).toBeTruthy();
  expect(screen.getByText(/waiting after 2 tries/)).toBeTruthy();
});

test.each([
  [{ state: 'local', tries: 0 }, 'kept here'],
  [{ state: 'waiting', tries: 0 }, 'about to be sent'],
  [{ state: 'sent', tries: 1 }, 'sent'],
  [{ state: 'failed', tries: 1 }, 'given up after 1 try'],
] as const)('%j is told as %s', (state, words) => {
  expect(letterState(state)).toBe(words);
});

test('each letter of the list leads to its text', () => {
  render(
    <MemoryRouter>
      <LetterList letters={[letter({})]} />
    </MemoryRouter>,
  );
  const link = screen.getByRole('link', { name: 'Merestone: your invitation' });
  expect(link.getAttribute('href')).toBe('/office/outbox/l-1');
});
