import { Link } from 'react-router-dom';
import type { DeskItem, DeskSection } from '../../../shared/api/types';
import { formatDay } from '../../../shared/format/format-date';
import { MarkedText } from '../../../shared/ui/marked-text';
import './desk.css';

/** The desk's sections in the order in which they matter to the person; an empty one says so in a sentence. */
export function DeskView({ sections }: { sections: readonly DeskSection[] }) {
  return sections.map((section) => (
    <section key={section.key} className="desk-section" aria-labelledby={`desk-${section.key}`}>
      <h2 id={`desk-${section.key}`}>{section.title}</h2>
      {section.items.length === 0 ? (
        <p className="desk-empty">{section.empty}</p>
      ) : (
        <ul className="desk-items">
          {section.items.map((item) => (
            <DeskLine key={`${item.href} ${item.title} ${item.at}`} item={item} />
          ))}
        </ul>
      )}
    </section>
  ));
}

function DeskLine({ item: { title, line, href, at } }: { item: DeskItem }) {
  return (
    <li className="desk-item">
      <Link to={href}>
        <MarkedText text={title} />
      </Link>
      <time dateTime={at} className="desk-at">
        {formatDay(at)}
      </time>
      {line ? (
        <p className="desk-line">
          <MarkedText text={line} />
        </p>
      ) : null}
    </li>
  );
}
