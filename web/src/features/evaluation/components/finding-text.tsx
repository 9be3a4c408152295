import type { Finding } from '@merestone/engine';
import { Link } from 'react-router-dom';
import { firstSentence } from '../model/first-sentence';
import { paths } from '../../../shared/paths';
import { MarkedText } from '../../../shared/ui/marked-text';

interface FindingTextProps {
  finding: Finding;
  /** The reason on record for using the sheet there all the same. */
  deviation?: string | undefined;
}

/** A finding in its own words, with the sheets that are named as holding on the other side. */
export function FindingText({ finding, deviation }: FindingTextProps) {
  if (deviation !== undefined)
    return (
      <p>
        <MarkedText text={firstSentence(finding.message)} /> Used all the same under a deviation, for the
        reason on record: “{deviation}”
      </p>
    );
  return (
    <p>
      <MarkedText text={finding.message} />
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
