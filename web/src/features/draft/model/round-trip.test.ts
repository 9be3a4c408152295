import { readdirSync, readFileSync } from 'node:fs';
import { resolve } from 'node:path';
import type { CorrelationDefinition } from '@merestone/engine';
import { describe, expect, test } from 'vitest';
import { parse } from 'yaml';
import { definitionOfForm } from './definition-of-form';
import { formOfDefinition } from './form-of-definition';

const FOLDER = resolve(import.meta.dirname, '../../../../../fixtures/correlations');
const sheets = readdirSync(FOLDER, { recursive: true })
  .map(String)
  .filter((name) => name.endsWith('.yaml'));

describe('every sheet of the library goes through the form and comes back the same', () => {
  test('there are sheets', () => {
    expect(sheets.length).toBeGreaterThan(80);
  });

  test.each(sheets)('%s', (name) => {
    const definition = parse(readFileSync(`${FOLDER}/${name}`, 'utf8')) as CorrelationDefinition;
    const read = definitionOfForm(formOfDefinition(definition, ''));
    expect(read.problems).toEqual([]);
    expect(read.value).toStrictEqual(definition);
  });
});
