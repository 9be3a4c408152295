import { QUANTITIES } from '@merestone/engine';
import { memo } from 'react';
import { Link } from 'react-router-dom';
import type { SheetEquation } from '../../../shared/api/types';
import { lowerFirst } from '../../../shared/format/lower-first';
import { paths } from '../../../shared/paths';

/** The published property equations that may fill a quantity of the sheet. */
export const PropertyEquationsSection = memo(function PropertyEquationsSection({
  equations,
}: {
  equations: readonly SheetEquation[];
}) {
  if (equations.length === 0) return null;
  return (
    <section>
      <h2>Property equations it may use</h2>
      <ul className="property-equations">
        {equations.map(({ slug, revision, definition }) => (
          <li key={slug}>
            <Link to={paths.propertyEquation(slug)}>{definition.title}</Link>, rev {revision}, for{' '}
            {(QUANTITIES[definition.gives]?.title ?? definition.gives.replaceAll('-', ' ')).toLowerCase()}
            {definition.assumes
              ? `; takes for granted: ${lowerFirst(definition.assumes).replace(/\.$/, '')}`
              : ''}
            .
          </li>
        ))}
      </ul>
    </section>
  );
});
