import type { ListedCorrelation } from '../../../shared/api/types';
import { StripAxisScale } from '../../../shared/ui/bound-strip/strip-axis-scale';
import { REYNOLDS_AXIS } from '../model/strip-of-row';
import { RegisterRow } from './register-row';

interface RegisterTableProps {
  items: readonly ListedCorrelation[];
  /** The list is out of date: newer filters are on their way. */
  stale: boolean;
  /** Off where all rows are of one geometry. */
  withGeometry?: boolean;
}

/** The register as a table; on a phone its rows fold into stacked lines, so roles are written out. */
export function RegisterTable({ items, stale, withGeometry = true }: RegisterTableProps) {
  return (
    <table className="register-table" role="table" aria-label="Correlations" data-stale={stale}>
      <thead role="rowgroup">
        <tr role="row">
          {withGeometry ? (
            <th role="columnheader" scope="col" className="register-geometry">
              Geometry
            </th>
          ) : null}
          <th role="columnheader" scope="col">
            Correlation
          </th>
          <th role="columnheader" scope="col" className="register-strip">
            Reynolds number
            <StripAxisScale axis={REYNOLDS_AXIS} labelled={[-3, 0, 3, 6]} />
          </th>
          <th role="columnheader" scope="col" className="register-standing">
            Standing
          </th>
        </tr>
      </thead>
      <tbody role="rowgroup">
        {items.map((item) => (
          <RegisterRow key={item.slug} item={item} withGeometry={withGeometry} />
        ))}
      </tbody>
    </table>
  );
}
