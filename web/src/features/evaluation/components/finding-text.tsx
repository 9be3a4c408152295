import type { Finding } from '@merestone/engine';
import { Link } from 'react-router-dom';
import { firstSentence } from '../model/first-sentence';
import { useSheetTitle } from '../../../shared/api/use-sheet-title';
import { paths } from '../../../shared/paths';
import { MarkedText } from '../../../shared/ui/marked-text';
import { FindingSymbol } from './finding-symbol';

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
        <FindingWords finding={finding} text={firstSentence(finding.message)} /> Used all the same under a
        deviation, for the reason on record: “{deviation}”
      </p>
    );
  return (
    <p>
      <FindingWords finding={finding} text={finding.message} />
      {finding.beyond.length > 0 ? (
        <>
          {' '}
          On the other side:{' '}
          {finding.beyond.map((slug, i) => (
            <span key={slug}>
              {i > 0 ? '; ' : ''}
              <OtherSide slug={slug} />
            </span>
          ))}
          .
        </>
      ) : null}
    </p>
  );
}

/** The message with the symbol it begins with set as a symbol. */
function FindingWords({ finding: { symbol }, text }: { finding: Finding; text: string }) {
  if (!text.startsWith(`${symbol} `)) return <MarkedText text={text} />;
  return (
    <>
      <FindingSymbol symbol={symbol} />
      <MarkedText text={text.slice(symbol.length)} />
    </>
  );
}

/** A sheet that holds on the other side, by its title; one that is not open to the reader is only named. */
function OtherSide({ slug }: { slug: string }) {
  const { title, closed } = useSheetTitle(slug);
  const name = title ?? slug.replaceAll('-', ' ');
  return closed ? <>{name} (not approved so far)</> : <Link to={paths.sheet(slug)}>{name}</Link>;
}
