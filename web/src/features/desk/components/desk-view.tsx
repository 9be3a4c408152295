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
        <DeskItems items={inOrder(section)} />
      )}
    </section>
  ));
}

/** What fell to the person last stands first; what is due, by its day. */
function inOrder({ key, items }: DeskSection): DeskItem[] {
  return key === 'due' ? items : items.toSorted((a, b) => b.at.localeCompare(a.at));
}

const SHOWN = 6;

/** The first few; a long list is folded from there on. */
function DeskItems({ items }: { items: readonly DeskItem[] }) {
  const first = items.length > SHOWN + 1 ? items.slice(0, SHOWN) : items;
  const others = items.slice(first.length);
  return (
    <div>
      <ul className="desk-items">{first.map(line)}</ul>
      {others.length > 0 ? (
        <details className="desk-more">
          <summary>{others.length} more</summary>
          <ul className="desk-items">{others.map(line)}</ul>
        </details>
      ) : null}
    </div>
  );
}

function line(item: DeskItem) {
  return <DeskLine key={`${item.href} ${item.title} ${item.at}`} item={item} />;
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
