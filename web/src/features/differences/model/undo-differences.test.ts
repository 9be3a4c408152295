import { compareDefinitions, type CorrelationDefinition } from '@merestone/engine';
import { describe, expect, it } from 'vitest';
import { gillilandSherwood } from '../../../shared/samples/gilliland-sherwood';
import { wettedArea } from '../../../shared/samples/packing-sample';
import { iterationContents } from './iteration-contents';
import { pathSteps } from './path-steps';
import { undoDifferences } from './undo-differences';

const changed = (over: Partial<CorrelationDefinition>): CorrelationDefinition => ({
  ...gillilandSherwood,
  ...over,
});

describe('a path', () => {
  it('is read as steps into members and entries', () => {
    expect(pathSteps('bounds[Re].stretches[0].hi.value')).toEqual([
      { member: 'bounds' },
      { entry: 'Re' },
      { member: 'stretches' },
      { entry: '0' },
      { member: 'hi' },
      { member: 'value' },
    ]);
    expect(pathSteps('checks[Air, 25 °C (ex. 3.1)].tolerancePercent')?.[1]).toEqual({
      entry: 'Air, 25 °C (ex. 3.1)',
    });
  });

  it.each(['', '.', 'bounds[', 'bounds[Re', 'bounds]x', 'a b'])('that is none, %j, is not read', (path) => {
    expect(pathSteps(path)).toBeNull();
  });
});

describe('undoing the differences to a later definition', () => {
  const later: [string, CorrelationDefinition][] = [
    ['nothing', gillilandSherwood],
    ['a text', changed({ summary: 'Another summary.' })],
    [
      'a null that became something',
      changed({ year: null, accuracy: { valuePercent: 20, statistic: 'max', text: 'x' } }),
    ],
    ['an entry more', changed({ cautions: [...gillilandSherwood.cautions, 'One more.', 'And another.'] })],
    ['entries fewer', changed({ cautions: [] })],
    ['other symbols', changed({ groups: gillilandSherwood.groups.slice(1) })],
    ['another sheet altogether', wettedArea],
  ];

  it.each(later)('gives the earlier one back: %s', (_what, after) => {
    const differences = compareDefinitions(gillilandSherwood, after);
    const before = undoDifferences(after, differences);
    expect(before).not.toBeNull();
    // The order of named entries is no difference, so the comparison itself is the judge.
    expect(compareDefinitions(gillilandSherwood, before ?? after)).toEqual([]);
    expect(compareDefinitions(before ?? after, gillilandSherwood)).toEqual([]);
  });

  it('leaves the later one as it was', () => {
    const after = changed({ cautions: [] });
    const kept = structuredClone(after);
    undoDifferences(after, compareDefinitions(gillilandSherwood, after));
    expect(after).toEqual(kept);
  });

  it('is given up where a path leads nowhere', () => {
    const lost = {
      path: 'groups[Xx].name',
      section: 'groups',
      change: 'changed',
      before: 'a',
      after: 'b',
    } as const;
    expect(undoDifferences(gillilandSherwood, [lost])).toBeNull();
    const evil = {
      path: '__proto__.x',
      section: 'groups',
      change: 'changed',
      before: 'a',
      after: 'b',
    } as const;
    undoDifferences(gillilandSherwood, [evil]);
    expect(({} as { x?: string }).x).toBeUndefined();
  });
});

it('every iteration gets its contents, back from the present one', () => {
  const first = changed({ summary: 'First.' });
  const second = changed({ summary: 'Second.' });
  const contents = iterationContents(gillilandSherwood, [
    { number: 1, differences: [] },
    { number: 2, differences: compareDefinitions(first, second) },
    { number: 3, differences: compareDefinitions(second, gillilandSherwood) },
  ]);
  expect(contents.get(3)?.before?.summary).toBe('Second.');
  expect(contents.get(2)?.before?.summary).toBe('First.');
  expect(contents.get(2)?.after?.summary).toBe('Second.');
});
