import { cleanup, render, screen, within } from '@testing-library/react';
import { MemoryRouter } from 'react-router-dom';
import { afterEach, describe, expect, it } from 'vitest';
import type { Sheet } from '../../../shared/api/types';
import { gillilandSherwood } from '../../../shared/samples/gilliland-sherwood';
import { sampleSheet } from '../../../shared/samples/sheets';
import { NO_READINGS, type LiveReadings } from '../model/live-readings';
import { SheetArticle } from './sheet-article';

afterEach(cleanup);

function show(sheet: Sheet, live: LiveReadings = NO_READINGS) {
  render(
    <MemoryRouter>
      <SheetArticle sheet={sheet} live={live} duty={<p>the form</p>} outcome={(n) => <p>steps from {n}</p>} />
    </MemoryRouter>,
  );
}

describe('the sheet', () => {
  it('heads the page with geometry, authors, revision, standing and the start of the hash', () => {
    show(sampleSheet());
    const head = document.querySelector('.running-head')?.textContent ?? '';
    for (const part of ['Wetted wall', 'Gilliland and Sherwood', 'rev 2', 'approved', '7f3a'])
      expect(head).toContain(part);
  });

  it('numbers its equations and lets the steps go on from there', () => {
    show(sampleSheet());
    expect(screen.getByRole('group', { name: 'Equation 1' })).toBeTruthy();
    expect(screen.getByRole('group', { name: 'Equation 2' })).toBeTruthy();
    expect(screen.getByText('steps from 3')).toBeTruthy();
  });

  it('letters the pieces of an equation and says when each holds', () => {
    const [part] = gillilandSherwood.parts;
    if (!part) throw new Error('the sample has a part');
    const pieces = [
      { when: [{ on: 'Re', hi: 10000 }], expression: '0.023*Re^0.83*Sc^0.44' },
      { when: [{ on: 'Re', lo: 10000 }], expression: '0.03*Re^0.8*Sc^0.44' },
    ];
    const { expression: _one, ...result } = part.result;
    show(
      sampleSheet({ ...gillilandSherwood, checks: [], parts: [{ ...part, result: { ...result, pieces } }] }),
    );
    expect(screen.getByRole('group', { name: 'Equation 1a' })).toBeTruthy();
    expect(screen.getByRole('group', { name: 'Equation 1b' })).toBeTruthy();
  });

  it('says plainly how far it has been verified and who approved it for what', () => {
    show(sampleSheet());
    expect(screen.getByText('From memory, to be checked against the source.')).toBeTruthy();
    expect(screen.getByText(/by Ines Vauquelin on 3 March 2026.*Approved for gas-side design/)).toBeTruthy();
    expect(screen.getByText(/516–523; p\. 516/)).toBeTruthy();
  });

  it('draws each bound with its nature and basis in words, and the reading of the duty', () => {
    const reading = {
      symbol: 'Re',
      kind: 'outside',
      value: 52300,
      unit: '1',
      lo: 2000,
      hi: 35000,
      ratio: 1.494,
    } as const;
    const finding = { ...reading, loClosed: true, hiClosed: true, nature: 'data', basis: 'stated' } as const;
    show(sampleSheet(), {
      findings: [{ ...finding, deviable: true, beyond: [], message: '' }],
      values: { Re: { value: 52300, unit: '1' } },
    });
    expect(
      screen.getByText(/lower: change of regime; upper: where the data end; stated in the source/),
    ).toBeTruthy();
    expect(screen.getByText('1.49 × the upper bound')).toBeTruthy();
    expect(within(screen.getByRole('group', { name: 'Symbols' })).getByText('52 300')).toBeTruthy();
  });

  it('tells each worked check in words', () => {
    show(sampleSheet());
    const table = screen.getByRole('group', { name: 'Worked checks' });
    expect(within(table).getByText('reproduces')).toBeTruthy();
    expect(within(table).getByText('38.3808')).toBeTruthy();
    expect(screen.getByText('1 of 1 worked check reproduces. None is a published example.')).toBeTruthy();
  });

  it('says so where a check does not reproduce', () => {
    const wrong = gillilandSherwood.checks.map((check) => ({ ...check, expected: { Sh: { value: 40 } } }));
    show(sampleSheet({ ...gillilandSherwood, checks: wrong }));
    expect(screen.getByText('does not reproduce')).toBeTruthy();
  });

  it('puts a standing that stops use in large words, with its reason', () => {
    show(
      sampleSheet(undefined, {
        standing: 'withdrawn',
        standingNote: 'A constant was misprinted.',
        approval: null,
      }),
    );
    const note = screen.getByRole('note', { name: 'Standing' });
    expect(note.className).toContain('standing-notice-stop');
    expect(note.textContent).toContain('Withdrawn: it serves comparison only.');
    expect(note.textContent).toContain('A constant was misprinted.');
  });

  it('says of a sheet in review that it may not be used for design yet', () => {
    show(
      sampleSheet(undefined, {
        standing: 'in review',
        standingNote: 'The source has not been read.',
        approval: null,
      }),
    );
    expect(screen.getByRole('note', { name: 'Standing' }).textContent).toMatch(
      /may not be used for design before/,
    );
  });
});
