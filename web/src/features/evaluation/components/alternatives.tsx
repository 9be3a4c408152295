import { Link } from 'react-router-dom';
import type { OtherSheet } from '../../../shared/api/types';
import { withQuery } from '../../../shared/api/http';
import { paths } from '../../../shared/paths';

interface AlternativesProps {
  items: readonly OtherSheet[];
  geometry: string;
}

/** The sheets of the register that cover the duty, or the word that none does. */
export function Alternatives({ items, geometry }: AlternativesProps) {
  const all = <Link to={withQuery(paths.register, { geometry })}>all sheets of this geometry</Link>;
  if (items.length === 0) return <p>No other sheet of the register covers this duty. See {all}.</p>;
  return (
    <div role="group" aria-label="Sheets that cover this duty">
      <p>
        {items.length === 1
          ? 'One sheet of the register covers it:'
          : 'These sheets of the register cover it:'}
      </p>
      <ul className="refusal-others">
        {items.map(({ slug, title }) => (
          <li key={slug}>
            <Link to={paths.sheet(slug)}>{title}</Link>
          </li>
        ))}
      </ul>
      <p>See also {all}.</p>
    </div>
  );
}
