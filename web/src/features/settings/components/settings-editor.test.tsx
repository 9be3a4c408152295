import { cleanup, render, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, expect, test, vi } from 'vitest';
import { SettingsEditor } from './settings-editor';

afterEach(cleanup);

const SETTINGS = {
  officeName: 'Larkmead & Stonebridge',
  reviewsNeeded: 2,
  principal: { id: 'p-3', name: 'Saoirse Larkmead' },
  reviewDueMonths: 36,
};
const CANDIDATES = [
  { id: 'p-3', name: 'Saoirse Larkmead', roles: ['reviewer' as const] },
  { id: 'p-4', name: 'Imogen Vale', roles: ['auditor' as const] },
];

function renderEditor() {
  const onChange = vi.fn(() => Promise.resolve());
  render(<SettingsEditor settings={SETTINGS} candidates={CANDIDATES} onChange={onChange} />);
  return { user: userEvent.setup(), onChange };
}
const keep = () => screen.getByRole('button', { name: 'Keep the settings' });

test.each(['', '0', '121', '3.5', 'three'])('%j is no number of months', async (text) => {
  const { user, onChange } = renderEditor();
  const months = screen.getByLabelText<HTMLInputElement>(/^Months/);
  await user.clear(months);
  if (text) await user.type(months, text);
  await user.click(keep());
  expect(screen.getByRole('alert').textContent).toContain('from 1 to 120');
  expect(months.value).toBe(text);
  expect(onChange).not.toHaveBeenCalled();
});

test('the whole of the settings is kept, nobody as principal included', async () => {
  const { user, onChange } = renderEditor();
  await user.selectOptions(screen.getByLabelText(/^Favourable/), '3');
  await user.selectOptions(screen.getByLabelText(/^Principal/), 'nobody');
  await user.click(keep());
  await waitFor(() =>
    expect(onChange).toHaveBeenCalledWith({
      officeName: 'Larkmead & Stonebridge',
      reviewsNeeded: 3,
      principal: null,
      reviewDueMonths: 36,
    }),
  );
  expect(screen.getByRole('status').textContent).toContain('The settings are kept.');
});
