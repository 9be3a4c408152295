import type { CorrelationDefinition, Difference } from '@merestone/engine';
import { useMemo } from 'react';
import { boundChanges } from '../model/bound-changes';
import { lineChanges } from '../model/line-changes';
import { sectionsOf, type DifferenceSection } from '../model/sections';
import { BoundChangeView } from './bound-change-view';
import { FieldChange } from './field-change';
import { LineChangeView } from './line-change-view';
import './differences.css';

interface DifferenceListProps {
  differences: readonly Difference[];
  /** Null where it is not known: then everything is told field by field. */
  before: CorrelationDefinition | null;
  after: CorrelationDefinition;
  /** Level of the sections' headings. */
  level?: 2 | 3;
}

/** What differs, under the headings of a sheet. */
export function DifferenceList({ differences, before, after, level = 2 }: DifferenceListProps) {
  const sections = useMemo(() => sectionsOf(differences), [differences]);
  const Heading = level === 2 ? 'h2' : 'h3';
  return sections.map((section) => (
    <section key={section.title} className="difference-section">
      <Heading>{section.title}</Heading>
      <ul className="changes">
        <Changes section={section} before={before} after={after} />
      </ul>
    </section>
  ));
}

interface ChangesProps extends Pick<DifferenceListProps, 'before' | 'after'> {
  section: DifferenceSection;
}

function Changes({ section: { differences }, before, after }: ChangesProps) {
  const { lines, rest: notTypeset } = useMemo(
    () => lineChanges(differences, before, after),
    [differences, before, after],
  );
  const { bounds, rest } = boundChanges(notTypeset, before, after);
  return (
    <>
      {lines.map((change) => (
        <LineChangeView key={change.id} change={change} />
      ))}
      {bounds.map((change) => (
        <BoundChangeView key={change.on} change={change} />
      ))}
      {rest.map((difference) => (
        <FieldChange
          key={difference.path}
          difference={difference}
          definition={difference.change === 'removed' && before ? before : after}
        />
      ))}
    </>
  );
}
