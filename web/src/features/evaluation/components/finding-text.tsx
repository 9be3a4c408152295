import type { Finding } from '@merestone/engine';
import { Link } from 'react-router-dom';
import { paths } from '../../../shared/paths';

/** A finding in its own words, with the sheets that are named as holding on the other side. */
export function FindingText({ finding }: { finding: Finding }) {
  return (
    <p>
      {finding.message}
      {finding.beyond.length > 0 ? (
        <>
          {' '}
          On the other side:{' '}
          {finding.beyond.map((slug, i) => (
            <span key={slug}>
              {i > 0 ? ', ' : ''}
              <Link to={paths.sheet(slug)}>{slug.replaceAll('-', ' ')}</Link>
            </span>
          ))}
          .
        </>
      ) : null}
    </p>
  );
}
