import { QUANTITIES } from '@merestone/engine';
import { memo } from 'react';
import { Link } from 'react-router-dom';
import type { SheetEquation } from '../../../shared/api/types';
import { paths } from '../../../shared/paths';
import { Citation } from './source-notes';

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
            {definition.assumes ? `; takes for granted: ${definition.assumes.replace(/\.$/, '')}` : ''}.
            {definition.sources[0] ? (
              <span className="symbol-note">
                <Citation source={definition.sources[0]} />
              </span>
            ) : null}
          </li>
        ))}
      </ul>
    </section>
  );
});
