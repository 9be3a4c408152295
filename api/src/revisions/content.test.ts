import { createHash } from 'node:crypto';
import { describe, expect, test } from 'vitest';
import { contentOf } from './content.js';

describe('contentOf', () => {
  test('writes names in order and numbers as RFC 8785 does', () => {
    // Figures of RFC 8785, section 3.2.2: 333333333.33333329 → 333333333.3333333, 1E30 → 1e+30, 4.50 → 4.5.
    const definition = { format: 'x', b: [333333333.33333329, 1e30, 4.5, 2e-3], a: '\u20ac$' };
    expect(contentOf(definition).text).toBe(
      '{"a":"€$","b":[333333333.3333333,1e+30,4.5,0.002],"format":"x"}',
    );
  });

  test('hashes exactly the text, in UTF-8', () => {
    const definition = { format: 'x', title: 'Benítez ≥ 1' };
    const { text, hash } = contentOf(definition);
    expect(hash).toBe(createHash('sha256').update(Buffer.from(text, 'utf8')).digest('hex'));
  });

  test('does not depend on the order in which a definition was written', () => {
    expect(contentOf({ format: 'x', ...{ p: 1, q: 2 } }).hash).toBe(
      contentOf({ ...{ q: 2, p: 1 }, format: 'x' }).hash,
    );
  });
});
