import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import type { DeskItem, DeskSection } from '../../../shared/api/types';
import type { ListedCorrelation } from '../../../shared/api/types';
import { formatDay } from '../../../shared/format/format-date';
import { authorWords } from '../../../shared/format/author-words';
import { paths } from '../../../shared/paths';
import { MarkedText } from '../../../shared/ui/marked-text';
import { revisionOfHref } from '../model/revision-of-href';
import './reviews.css';

interface ReviewsViewProps {
  /** What of the desk is about reviews. */
  sections: readonly DeskSection[];
  inReview: readonly ListedCorrelation[];
  /** Draws where a correlation holds, small. */
  strip: (item: ListedCorrelation) => ReactNode;
}

/** Reviews by what they wait for, then what else is in review; each with where it holds. */
export function ReviewsView({ sections, inReview, strip }: ReviewsViewProps) {
  const waiting = new Set(sections.flatMap(({ items }) => items.map(({ href }) => href)));
  const others = inReview.filter(({ slug, revision }) => !waiting.has(paths.review(slug, revision)));
  return (
    <>
      {sections.map(({ key, title, empty, items }) => (
        <section key={key} className="reviews-section" aria-labelledby={`reviews-${key}`}>
          <h2 id={`reviews-${key}`}>{title}</h2>
          {items.length === 0 ? (
            <p className="reviews-empty">{empty}</p>
          ) : (
            <ul className="reviews-list">
              {items.map((item) => (
                <WaitingLine
                  key={`${item.href} ${item.line}`}
                  item={item}
                  inReview={inReview}
                  strip={strip}
                />
              ))}
            </ul>
          )}
        </section>
      ))}
      <section className="reviews-section" aria-labelledby="reviews-all">
        <h2 id="reviews-all">Also in review</h2>
        {others.length === 0 ? (
          <p className="reviews-empty">No other revision is in review.</p>
        ) : (
          <ul className="reviews-list">
            {others.map((item) => (
              <li key={item.slug} className="reviews-line">
                <div>
                  <Link to={paths.review(item.slug, item.revision)}>
                    <MarkedText text={item.title} />
                  </Link>
                  <p className="reviews-words">
                    {authorWords(item.authors)}, {item.geometryName.toLowerCase()}, rev {item.revision}
                  </p>
                </div>
                <div className="reviews-strip">{strip(item)}</div>
              </li>
            ))}
          </ul>
        )}
      </section>
    </>
  );
}

interface WaitingLineProps extends Pick<ReviewsViewProps, 'inReview' | 'strip'> {
  item: DeskItem;
}

function WaitingLine({ item: { title, line, href, at }, inReview, strip }: WaitingLineProps) {
  const revision = revisionOfHref(href);
  const listed = inReview.find((one) => one.slug === revision?.slug && one.revision === revision.number);
  return (
    <li className="reviews-line">
      <div>
        <Link to={href}>
          <MarkedText text={title} />
        </Link>
        <p className="reviews-words">
          <MarkedText text={line} />, since {formatDay(at)}
        </p>
      </div>
      <div className="reviews-strip">{listed ? strip(listed) : null}</div>
    </li>
  );
}
