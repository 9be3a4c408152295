import { Link } from 'react-router-dom';
import type { ListedPropertyEquation } from '../../../shared/api/types';
import { formatUnit } from '../../../shared/format/format-unit';
import { paths } from '../../../shared/paths';
import { StandingWord } from '../../../shared/ui/standing-word';
import { givenName } from '../model/given-name';
import './property-equations.css';

interface PropertyEquationListProps {
  equations: readonly ListedPropertyEquation[];
}

/**
 * Property equations by what they give; the quantity is named once for all that give it.
 * On a phone the rows fold into stacked lines, so roles are written out.
 */
export function PropertyEquationList({ equations }: PropertyEquationListProps) {
  const given = [...new Set(equations.map(({ gives }) => gives))].sort((a, b) =>
    givenName(a).localeCompare(givenName(b)),
  );
  return (
    <table className="property-table" role="table" aria-label="Property equations">
      <thead role="rowgroup">
        <tr role="row">
          {['Equation', 'Fluid', 'Unit', 'Standing'].map((head) => (
            <th key={head} role="columnheader" scope="col">
              {head}
            </th>
          ))}
        </tr>
      </thead>
      {given.map((gives) => (
        <tbody key={gives} role="rowgroup">
          <tr role="row" className="property-given">
            <th role="rowheader" scope="rowgroup" colSpan={4}>
              {givenName(gives)}
            </th>
          </tr>
          {equations
            .filter((equation) => equation.gives === gives)
            .map((equation) => (
              <EquationRow key={equation.slug} equation={equation} />
            ))}
        </tbody>
      ))}
    </table>
  );
}

function EquationRow({ equation }: { equation: ListedPropertyEquation }) {
  const { slug, title, fluid, unit, standing, revision } = equation;
  return (
    <tr role="row">
      <th role="rowheader" scope="row" className="property-name">
        <Link className="property-link" to={paths.propertyEquation(slug)}>
          {title}
        </Link>
      </th>
      <td role="cell" className="property-fluid">
        {fluid}
      </td>
      <td role="cell" className="property-unit">
        {formatUnit(unit) || 'none'}
      </td>
      <td role="cell" className="property-standing">
        <StandingWord standing={standing} /> <span className="property-revision">rev {revision}</span>
      </td>
    </tr>
  );
}
