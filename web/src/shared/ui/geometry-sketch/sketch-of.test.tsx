import { cleanup, render, screen } from '@testing-library/react';
import { readFileSync } from 'node:fs';
import { afterEach, expect, test } from 'vitest';
import { GeometrySketch } from './geometry-sketch';
import { sketchOf } from './sketch-of';

afterEach(cleanup);

const library = readFileSync('fixtures/geometries.yaml', 'utf8');
const slugs = [...library.matchAll(/^- slug: (\S+)$/gm)].map(([, slug]) => slug ?? '');

test('the library names geometries', () => {
  expect(slugs.length).toBeGreaterThan(20);
});

test.each(slugs)('%s has a drawing of its own', (slug) => {
  expect(sketchOf(slug)).toBeDefined();
  const { container } = render(<GeometrySketch slug={slug} name={slug} />);
  expect(container.querySelectorAll('path, line, circle, ellipse, rect').length).toBeGreaterThan(2);
  expect(container.innerHTML).not.toMatch(/NaN|undefined/);
});

test.each(['unknown', 'constructor', '__proto__'])('%s gets the plain drawing', (slug) => {
  expect(sketchOf(slug)).toBeUndefined();
  render(<GeometrySketch slug={slug} name="Something new" />);
  expect(screen.getByRole('img', { name: 'Sketch: Something new' })).toBeTruthy();
});
