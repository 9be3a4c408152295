import { useEffect, type ReactNode } from 'react';
import './print.css';
import './sheet-page.css';

interface SheetPageProps {
  /** Also the document's title. */
  title: string;
  /** The title as it is set, where it holds more than plain words. */
  heading?: ReactNode;
  subtitle?: ReactNode;
  runningHead?: ReactNode;
  /** Notes that belong to the page as a whole; others stand in `MarginRow`s beside their lines. */
  margin?: ReactNode;
  /** For pages that are mostly a table. */
  wide?: boolean;
  children: ReactNode;
}

/** A page as a printed handbook has it: the text in a main column, and a margin for what belongs beside it. */
export function SheetPage({
  title,
  heading,
  subtitle,
  runningHead,
  margin,
  wide = false,
  children,
}: SheetPageProps) {
  useEffect(() => {
    document.title = `${title} · Merestone`;
  }, [title]);
  return (
    <article className={wide ? 'sheet sheet-wide' : 'sheet'}>
      {runningHead}
      <div className="sheet-columns">
        <header className="sheet-head">
          <h1>{heading ?? title}</h1>
          {subtitle ? <p className="sheet-subtitle">{subtitle}</p> : null}
        </header>
        <div className="sheet-main">{children}</div>
        {margin ? <aside className="sheet-margin">{margin}</aside> : null}
      </div>
    </article>
  );
}

interface MarginRowProps {
  /** Stands over the notes' first line as well, so that it is read before them. */
  heading?: ReactNode;
  notes?: ReactNode;
  children: ReactNode;
}

/** A stretch of the main column with its own notes beside it; on a phone they fold in under it. */
export function MarginRow({ heading, notes, children }: MarginRowProps) {
  return (
    <div className="margin-row">
      {heading}
      {notes ? <div className="margin-row-notes">{notes}</div> : null}
      <div className="margin-row-main">{children}</div>
    </div>
  );
}
