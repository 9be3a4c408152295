import { Link } from 'react-router-dom';
import type { OtherSheet } from '../../../shared/api/types';
import { withQuery } from '../../../shared/api/with-query';
import { useFocusWhenLost } from '../../../shared/hooks/use-focus-when-lost';
import { paths } from '../../../shared/paths';

interface AlternativesProps {
  items: readonly OtherSheet[];
  geometry: string;
}

/** The sheets of the register that cover the duty, or the word that none does. */
export function Alternatives({ items, geometry }: AlternativesProps) {
  const all = <Link to={withQuery(paths.register, { geometry })}>all sheets of this geometry</Link>;
  const box = useFocusWhenLost<HTMLDivElement>(items);
  if (items.length === 0)
    return (
      <div ref={box} tabIndex={-1}>
        No other sheet of the register covers this duty. See {all}.
      </div>
    );
  return (
    <div ref={box} tabIndex={-1} role="group" aria-label="Sheets that cover this duty">
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
