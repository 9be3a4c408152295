import { cleanup, fireEvent, screen, waitFor, within } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { wettedArea } from '../../../shared/samples/packing-sample';
import { sampleSheet } from '../../../shared/samples/sheets';
import { AIR } from '../testing/duties';
import { field, fillIn, renderEvaluation, serveEvaluations } from '../testing/render-evaluation';

beforeEach(() => window.localStorage.clear());
afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

const TOO_FAST = { ...AIR, u: '32' };
const press = (name: string) => screen.getByRole('button', { name });

describe('the form', () => {
  it('asks in the order geometry, conditions, rest, each field with label, symbol and unit', () => {
    renderEvaluation();
    const names = screen.getAllByRole('textbox').map((box) => box.id);
    expect(names).toEqual(['d', 'T', 'P', 'u', 'rho', 'mu', 'D', 'p_BM'].map((s) => `duty-${s}`));
    expect(screen.getByRole('combobox', { name: 'Unit of Tube inside diameter' })).toHaveProperty(
      'value',
      'mm',
    );
  });

  it('offers to convert when the unit is changed under a number', async () => {
    const { user } = renderEvaluation();
    const unit = screen.getByRole('combobox', { name: 'Unit of Gas temperature' });
    expect(unit).toHaveProperty('value', 'degC');
    await user.type(field('T'), '25');
    await user.selectOptions(unit, 'K');
    await user.click(press('Convert 25 °C to 298.15 K'));
    expect(field('T').value).toBe('298.15');
    expect(document.activeElement).toBe(field('T'));
    expect(screen.queryByRole('button', { name: /Convert/ })).toBeNull();
  });

  it('keeps the number when asked to', async () => {
    const { user } = renderEvaluation();
    await user.type(field('d'), '25');
    await user.selectOptions(screen.getByRole('combobox', { name: 'Unit of Tube inside diameter' }), 'in');
    await user.click(press('Keep 25 in'));
    expect(field('d').value).toBe('25');
  });

  it('asks about a comma and takes the reading that is chosen', async () => {
    const { user } = renderEvaluation();
    await user.type(field('u'), '1,500');
    expect(screen.getByText('Do you mean 1.5 or 1500?')).toBeTruthy();
    await user.click(press('Use 1.5'));
    expect(field('u').value).toBe('1.5');
  });

  it('keeps the typed text to the letter and says what cannot be read once the field is left', async () => {
    const { user } = renderEvaluation();
    await user.type(field('d'), '3.20');
    await user.type(field('mu'), 'NaN');
    expect(screen.queryByText(/is not a number/)).toBeNull();
    await user.tab();
    expect(field('d').value).toBe('3.20');
    const error = screen.getByText(/“NaN” is not a number/);
    expect(field('mu').getAttribute('aria-describedby')).toContain(error.id);
    expect(field('mu').getAttribute('aria-invalid')).toBe('true');
  });

  it('sums up what is missing in an alert whose lines lead to the fields', async () => {
    const { user } = renderEvaluation();
    await user.type(field('d'), '0.025');
    await user.click(press('Evaluate and keep'));
    const alert = screen.getByRole('alert');
    const lines = within(alert).getAllByRole('link');
    expect(lines.length).toBe(4);
    await user.click(within(alert).getByRole('link', { name: /Gas density/ }));
    expect(document.activeElement).toBe(field('rho'));
  });

  it('loses nothing on a reload and forgets on starting anew', async () => {
    const { user, unmount } = renderEvaluation();
    await user.type(field('d'), ' 0.025');
    unmount();
    renderEvaluation();
    expect(field('d').value).toBe(' 0.025');
    await user.click(press('Start anew'));
    expect(field('d').value).toBe('');
  });

  it('fills a density by a property equation, in italics with its words', async () => {
    const { user } = renderEvaluation();
    await user.selectOptions(
      screen.getByRole('combobox', { name: 'Gas density: taken from' }),
      'ideal-gas-dry-air',
    );
    expect(
      screen.getByText(/Filled by “Dry air as an ideal gas”.*takes for granted: dry air, ideal gas/),
    ).toBeTruthy();
    fillIn({ T: '15', P: '101.325' });
    // U.S. Standard Atmosphere 1976: 1.2250 kg/m³
    await waitFor(() => expect(screen.getByText('1.225')).toBeTruthy());
  });

  it('says which fields a chosen property equation needs, until they are filled in', async () => {
    const { user } = renderEvaluation();
    const temperature = () => field('T').getAttribute('aria-describedby') ?? '';
    expect(temperature()).not.toContain('needed');
    await user.selectOptions(
      screen.getByRole('combobox', { name: 'Gas density: taken from' }),
      'ideal-gas-dry-air',
    );
    expect(screen.getAllByText('Needed now, for gas density.').length).toBe(2);
    expect(temperature()).toContain('duty-T-needed');
    fillIn({ T: '15' });
    expect(screen.getAllByText('Needed now, for gas density.').length).toBe(1);
  });

  it('takes the first listed equation for each empty property at one press, and takes it back', async () => {
    const { user } = renderEvaluation();
    const source = () => screen.getByRole('combobox', { name: 'Gas density: taken from' });
    expect(screen.getByText('Takes the first one listed for gas density.')).toBeTruthy();
    await user.click(press('Use property equations where listed'));
    expect(source()).toHaveProperty('value', 'ideal-gas-dry-air');
    expect(screen.queryByRole('button', { name: /where listed/ })).toBeNull();
    await user.click(press('Undo'));
    expect(source()).toHaveProperty('value', '');
  });

  it('leaves a typed property alone when the listed equations are taken', () => {
    renderEvaluation();
    fillIn({ rho: '1.2' });
    expect(screen.queryByRole('button', { name: /where listed/ })).toBeNull();
  });

  it('shows what a chosen packing gives and no longer asks for it', async () => {
    const { user } = renderEvaluation(sampleSheet(wettedArea, { slug: 'onda', equations: [] }));
    expect(screen.getAllByRole('textbox').length).toBe(6);
    await user.selectOptions(screen.getByRole('combobox', { name: 'Packing' }), 'pall-steel-25');
    expect(screen.getAllByRole('textbox').length).toBe(4);
    expect(
      screen.getByText((_t, node) => node?.tagName === 'LI' && node.textContent.includes('0.075')),
    ).toBeTruthy();
  });

  it('takes groups in place of quantities', async () => {
    const { user } = renderEvaluation();
    await user.click(screen.getByRole('radio', { name: 'I have Re and Sc' }));
    fillIn({ Re: '10000', Sc: '0.6' });
    // Sh = 0.023·10000^0.83·0.6^0.44 = 38.38
    await waitFor(() => expect(screen.getAllByText('38.38').length).toBeGreaterThan(0));
    expect(screen.getByText(/coefficient follows once these are given too: p_BM, D, P, d/)).toBeTruthy();
  });
});

describe('the result', () => {
  it('previews while typing, then keeps what the server computed, with its steps', async () => {
    const asked = serveEvaluations();
    const { user } = renderEvaluation();
    fillIn(AIR);
    await waitFor(() => expect(screen.getByText('Preview')).toBeTruthy());
    await waitFor(() => expect(screen.queryByText(/follows once/)).toBeNull());
    const preview = document.querySelector('.headline data')?.getAttribute('value');
    await user.click(press('Evaluate and keep'));
    await waitFor(() => expect(screen.getByText('ev-0001')).toBeTruthy());
    expect(document.querySelector('.headline data')?.getAttribute('value')).toBe(preview);
    expect(asked[0]?.revision).toBe(2);
    expect(asked[0]?.inputs.u).toEqual({ value: 5.5, unit: 'm/s' });
    const steps = within(screen.getByRole('list', { name: 'Steps' })).getAllByRole('listitem');
    expect(steps.length).toBeGreaterThanOrEqual(4);
    expect(screen.getByRole('group', { name: 'Equation 3' })).toBeTruthy();
    expect(screen.getByText('Accuracy of the sheet:').parentElement?.textContent).toContain(
      'No accuracy is on record.',
    );
  });

  it('goes back to a preview when the duty is changed', async () => {
    serveEvaluations();
    const { user } = renderEvaluation();
    fillIn(AIR);
    await user.click(press('Evaluate and keep'));
    await waitFor(() => expect(screen.getByText('ev-0001')).toBeTruthy());
    fillIn({ u: '6' });
    await waitFor(() => expect(screen.getByText('Preview')).toBeTruthy());
    expect(screen.queryByText('ev-0001')).toBeNull();
  });

  it('is not kept where the revision is not in use', async () => {
    renderEvaluation(sampleSheet(undefined, { standing: 'withdrawn' }), 'This revision is withdrawn.');
    expect(press('Evaluate and keep')).toHaveProperty('disabled', true);
    expect(screen.getByText('This revision is withdrawn.')).toBeTruthy();
  });
});

describe('the refusal', () => {
  it('gives no number, says how far out, and lists what covers the duty', async () => {
    serveEvaluations();
    const { user } = renderEvaluation();
    fillIn(TOO_FAST);
    await waitFor(() => expect(screen.getByText('No number is given here.')).toBeTruthy());
    expect(document.querySelector('.headline')).toBeNull();
    expect(document.querySelector('.refusal')?.textContent).toMatch(/1\.47 × the upper bound/);
    await user.click(press('See what covers this duty'));
    await waitFor(() => expect(screen.getByRole('link', { name: 'Pipe, turbulent' })).toBeTruthy());
  });

  it('asks for a reason of 20 characters, then marks the number in words wherever it stands', async () => {
    const asked = serveEvaluations();
    const { user } = renderEvaluation();
    const copied = vi.spyOn(navigator.clipboard, 'writeText');
    fillIn(TOO_FAST);
    await waitFor(() => expect(screen.getByText('No number is given here.')).toBeTruthy());
    await user.click(press('Record a deviation'));
    const reason = screen.getByRole('textbox', { name: /Why may Re be outside/ });
    fireEvent.change(reason, { target: { value: 'too short' } });
    expect(screen.getByText('9 of at least 20 characters')).toBeTruthy();
    await user.click(press('Record deviation and evaluate'));
    expect(screen.getByRole('alert').textContent).toMatch(/needs 11 more characters/);
    expect(asked.length).toBe(0);
    fireEvent.change(reason, {
      target: { value: 'Only a first estimate of the blower, to be measured later.' },
    });
    await user.click(press('Record deviation and evaluate'));
    await waitFor(() => expect(screen.getByText('ev-0001')).toBeTruthy());
    expect(asked[0]?.deviations).toEqual([
      { symbol: 'Re', reason: 'Only a first estimate of the blower, to be measured later.' },
    ]);
    const headline = document.querySelector('.headline')?.textContent ?? '';
    expect(headline).toContain('provisional, not for design');
    expect(screen.getByRole('list', { name: 'Steps' }).textContent).toContain('provisional, not for design');
    await user.click(press('Copy as text'));
    const text = copied.mock.calls[0]?.[0] ?? '';
    expect(text).toContain('PROVISIONAL, NOT FOR DESIGN');
    expect(text).toMatch(/k_c = [\d.]+ m\/s {2}\[provisional, not for design\]/);
    expect(text).toContain('Deviation on Re: Only a first estimate');
    expect(text).toContain('An estimate from a published correlation.');
  });

  it('offers no deviation across a regime, says why, and names the other side', async () => {
    vi.stubGlobal('fetch', () =>
      Promise.resolve(new Response(JSON.stringify({ title: 'Laminar flow in a pipe' }))),
    );
    renderEvaluation();
    fillIn({ ...AIR, u: '0.5' });
    await waitFor(() => expect(screen.getByText('No number is given here.')).toBeTruthy());
    expect(screen.queryByRole('button', { name: 'Record a deviation' })).toBeNull();
    expect(document.querySelector('.refusal')?.textContent).toMatch(
      /change of regime: no deviation is possible/,
    );
    await waitFor(() => expect(screen.getByRole('link', { name: 'Laminar flow in a pipe' })).toBeTruthy());
  });

  it('says so past the reach of a deviation', async () => {
    renderEvaluation();
    fillIn({ ...AIR, u: '60' });
    await waitFor(() => expect(screen.getByText('No number is given here.')).toBeTruthy());
    expect(screen.queryByRole('button', { name: 'Record a deviation' })).toBeNull();
    expect(document.querySelector('.refusal')?.textContent).toMatch(/a deviation reaches to 70.?000 at most/);
  });
});
