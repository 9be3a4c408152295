import type { Stretch } from '@merestone/engine';
import { cleanup, render, screen } from '@testing-library/react';
import { afterEach, describe, expect, test } from 'vitest';
import { BoundStrip, SmallBoundStrip } from './bound-strip';
import { StripView, type StripViewProps } from './strip-view';

afterEach(cleanup);

const turbulent: Stretch[] = [
  { lo: { value: 2000, nature: 'regime' }, hi: { value: 35000, nature: 'data' } },
];

function draw(props: Partial<StripViewProps>) {
  const { container } = render(
    <StripView stretches={turbulent} label="Re" size="large" width={400} {...props} />,
  );
  return {
    count: (selector: string) => container.querySelectorAll(selector).length,
    texts: () =>
      [...container.querySelectorAll('text')].map((text) => text.textContent.replaceAll('\u00a0', ' ')),
    one: (selector: string) => container.querySelector(selector),
  };
}

describe('a strip without a value', () => {
  test('has a stone with its value under it at each bound and no plumb line', () => {
    const strip = draw({});
    expect(strip.count('.strip-stone')).toBe(2);
    expect(strip.texts()).toEqual(['2 000', '35 000']);
    expect(strip.count('.strip-plumb')).toBe(0);
  });

  test('runs out dotted on a side without a bound', () => {
    const strip = draw({ stretches: [{ hi: { value: 2100, nature: 'regime', closed: false } }] });
    expect(strip.count('.strip-dotted')).toBe(1);
    expect(strip.texts()).toEqual(['< 2 100']);
  });

  test('is all dotted where nothing is stated', () => {
    const strip = draw({ stretches: [] });
    expect([strip.count('.strip-dotted'), strip.count('.strip-stone')]).toEqual([1, 0]);
    expect(screen.getByRole('img', { name: 'Re: no bound stated.' })).toBeTruthy();
  });
});

describe('a strip with a value', () => {
  test('hangs the plumb line with its figure above', () => {
    const strip = draw({ reading: { kind: 'within', value: 9000, lo: 2000, hi: 35000, ratio: null } });
    expect(strip.count('.strip-plumb-within')).toBe(1);
    expect(strip.texts()).toContain('9 000');
    expect(strip.count('.strip-hatched')).toBe(0);
  });

  test('hatches what lies past the stone and says how far', () => {
    const strip = draw({ reading: { kind: 'outside', value: 52300, lo: 2000, hi: 35000, ratio: 1.494 } });
    expect(strip.count('.strip-hatched line')).toBeGreaterThan(0);
    expect(screen.getByRole('img').getAttribute('aria-label')).toMatch(/1\.49 × the upper bound/);
  });

  test('hatches from the nearer stone between two stretches', () => {
    const stretches: Stretch[] = [
      { lo: { value: 0.6, nature: 'data' }, hi: { value: 2.5, nature: 'data' } },
      { lo: { value: 1000, nature: 'data' }, hi: { value: 3000, nature: 'data' } },
    ];
    const strip = draw({
      stretches,
      reading: { kind: 'between', value: 50, lo: 2.5, hi: 1000, ratio: null },
    });
    expect(strip.count('.strip-stone')).toBe(4);
    expect(strip.count('.strip-hatched')).toBe(1);
  });

  test('points off the edge where the value has no place on the axis', () => {
    const strip = draw({ reading: { kind: 'outside', value: 0, lo: 2000, hi: 35000, ratio: null } });
    expect(strip.one('.strip-plumb path')?.getAttribute('d')).not.toMatch(/A/);
  });

  test('sets its figure left of the line where the right has no room', () => {
    const strip = draw({
      reading: { kind: 'past-reach', value: 1.234e9, lo: 2000, hi: 35000, ratio: 28571 },
    });
    expect(strip.one('.strip-plumb text')?.getAttribute('text-anchor')).toBe('end');
  });
});

describe('BoundStrip', () => {
  test.each([
    ['near', 34500, null, 'near bound'],
    ['outside', 52300, 1.494, '1.49 × the upper bound'],
    ['within', 9000, null, 'in bounds'],
  ] as const)('says %s in words beside the picture, not by colour alone', (kind, value, ratio, words) => {
    render(
      <BoundStrip
        symbol="Re"
        label="Re"
        stretches={turbulent}
        reading={{ kind, value, lo: 2000, hi: 35000, ratio }}
      />,
    );
    expect(screen.getByText(words)).toBeTruthy();
  });
});

test('small strips share an axis, and point where a bound lies beyond it', () => {
  const { container } = render(
    <SmallBoundStrip
      label="Re"
      stretches={[{ lo: { value: 2000, nature: 'data' }, hi: { value: 1e9, nature: 'data' } }]}
      axis={{ from: 1e-3, to: 1e7 }}
    />,
  );
  expect(container.querySelectorAll('.strip-stone')).toHaveLength(1);
  expect(container.querySelectorAll('.strip-off-axis')).toHaveLength(1);
  expect(container.querySelectorAll('text')).toHaveLength(0);
});
