import { compareDefinitions, type CorrelationDefinition } from '@merestone/engine';
import { cleanup, render, screen, within } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { gillilandSherwood } from '../../../shared/samples/gilliland-sherwood';
import { countWords } from '../model/sections';
import { DifferenceList } from './difference-list';

afterEach(cleanup);

const before = gillilandSherwood;
const [part] = before.parts;
if (!part) throw new Error('the sample has a part');
const after: CorrelationDefinition = {
  ...before,
  summary: before.summary.replace('vertical', 'tall vertical'),
  averaging: 'local',
  parts: [{ ...part, result: { ...part.result, expression: '0.023*Re^0.8*Sc^0.44' } }],
  bounds: before.bounds.map((bound) =>
    bound.on === 'Re'
      ? {
          ...bound,
          basis: 'handbook',
          stretches: [{ lo: { value: 2000, nature: 'regime' }, hi: { value: 27000, nature: 'data' } }],
        }
      : bound,
  ),
  cautions: [...before.cautions, 'The film must not ripple.'],
  quantities: before.quantities.filter(({ symbol }) => symbol !== 'T'),
};

function show(from: CorrelationDefinition | null = before) {
  render(<DifferenceList differences={compareDefinitions(before, after)} before={from} after={after} />);
}
const item = (heading: RegExp) => {
  const found = screen.getByRole('heading', { name: heading }).closest('li');
  if (!found) throw new Error(`nothing is told under ${heading.source}`);
  return found;
};

describe('the differences of two definitions', () => {
  it('stand under the headings of a sheet', () => {
    show();
    expect(screen.getAllByRole('heading', { level: 2 }).map((one) => one.textContent)).toEqual([
      'What it is about',
      'Equations',
      'Where it holds',
      'Quantities',
      'Accuracy, restrictions and cautions',
    ]);
    expect(countWords(compareDefinitions(before, after))).toMatch(/^\d+ fields differ, in 5 sections\.$/);
  });

  it('set an equation typeset, before and after', () => {
    show();
    const sides = within(item(/^Gas side: result/)).getAllByRole('group', { name: 'Equation' });
    expect(sides.map((side) => side.querySelector('annotation')?.textContent)).toEqual([
      expect.stringContaining('0.83'),
      expect.stringContaining('0.8'),
    ]);
  });

  it('tell in words an expression that is only written otherwise', () => {
    const rewritten = {
      ...before,
      parts: [{ ...part, result: { ...part.result, expression: '0.0230*Re^0.83*Sc^0.44' } }],
    };
    render(
      <DifferenceList
        differences={compareDefinitions(before, rewritten)}
        before={before}
        after={rewritten}
      />,
    );
    expect(screen.queryByRole('group', { name: 'Equation' })).toBeNull();
    expect(item(/^Part “gas side”: result, expression/).textContent).toContain('0.0230');
  });

  it('draw a bound before and after in one picture, told in words as well', () => {
    show();
    const picture = screen.getByRole('img', { name: /Before: .*After: / });
    expect(picture.getAttribute('aria-label')?.replaceAll('\u00a0', ' ')).toBe(
      'Reynolds number, Re. Before: 2 000 to 35 000. After: 2 000 to 27 000.',
    );
    expect(picture.querySelector('rect.strip-before')).toBeTruthy();
    expect(picture.querySelector('line.strip-permitted')).toBeTruthy();
    expect(item(/^Reynolds number, Re: basis/).textContent).toContain('stated in the source');
    expect(item(/^Reynolds number, Re: basis/).textContent).toContain('from a handbook');
  });

  it('mark the changed words of a text, in words for who does not see the mark', () => {
    show();
    const put = item(/^Summary/).querySelector('ins');
    expect(put?.textContent).toBe('put in: tall ');
  });

  it('say a coded word plainly, what was added, and what was removed', () => {
    show();
    expect(item(/^Averaging/).textContent).toMatch(/mean over the surface.*local value/);
    expect(item(/^Caution 3/).textContent).toMatch(/added.*The film must not ripple/);
    expect(item(/^Gas temperature, T/).textContent).toContain('removed');
  });

  it('are told field by field where the earlier definition is not known', () => {
    show(null);
    expect(screen.queryByRole('img', { name: /Before: / })).toBeNull();
    expect(item(/^Reynolds number, Re: stretch 1, upper limit, value/).textContent).toContain('27');
  });
});
