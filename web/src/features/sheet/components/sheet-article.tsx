import { compileCorrelation, definitionTex } from '@merestone/engine';
import { useMemo, type ReactNode } from 'react';
import { Link } from 'react-router-dom';
import type { Sheet } from '../../../shared/api/types';
import { inWords } from '../../../shared/format/in-words';
import { paths } from '../../../shared/paths';
import { RunningHead } from '../../../shared/ui/running-head';
import { SheetPage } from '../../../shared/ui/sheet-page';
import type { LiveReadings } from '../model/live-readings';
import { numberedLines } from '../../../shared/format/numbered-lines';
import { BoundsSection } from './bounds-section';
import { ChecksSection } from './checks-section';
import { EquationsSection } from './equations-section';
import { HistorySection } from './history-section';
import { PropertyEquationsSection } from './property-equations-section';
import { StandingNotice } from './standing-notice';
import { SymbolsSection } from './symbols-section';
import './sheet-article.css';

interface SheetArticleProps {
  sheet: Sheet;
  live: LiveReadings;
  /** Ways on from the sheet as a whole. */
  links?: ReactNode;
  /** The form for a duty. */
  duty: ReactNode;
  /** What the duty comes to; told the number of its first equation. */
  outcome: (firstNumber: number) => ReactNode;
  /** The documents behind its sources. */
  documents?: ReactNode;
  /** Problems that were reported with it. */
  reports?: ReactNode;
}

/** A sheet as a handbook page: equation, where it holds, the duty and its result, then everything behind it. */
export function SheetArticle({ sheet, live, links, duty, outcome, documents, reports }: SheetArticleProps) {
  const { definition } = sheet;
  const tex = useMemo(() => {
    const compilation = compileCorrelation(definition);
    return compilation.ok ? definitionTex(compilation.compiled) : null;
  }, [definition]);
  const equations = tex ? numberedLines(tex).length : 0;
  return (
    <SheetPage
      title={sheet.title}
      subtitle={definition.summary}
      runningHead={
        <RunningHead
          geometry={<Link to={paths.geometry(sheet.geometry)}>{sheet.geometryName}</Link>}
          correlation={inWords(definition.authors)}
          printed={`${sheet.geometryName} · ${inWords(definition.authors)}`}
          revision={sheet.revision}
          standing={sheet.standing}
          hash={sheet.hash}
        />
      }
    >
      <StandingNotice sheet={sheet} />
      {links}
      <p className="sheet-jump">
        <a href="#your-duty">To your duty and its result</a>
      </p>
      <EquationsSection sheet={sheet} tex={tex} />
      <BoundsSection sheet={sheet} live={live} />
      <section aria-labelledby="your-duty">
        <h2 id="your-duty">Your duty</h2>
        {duty}
      </section>
      {outcome(equations + 1)}
      <SymbolsSection definition={definition} tex={tex} live={live} />
      <PropertyEquationsSection equations={sheet.equations} />
      <ChecksSection sheet={sheet} />
      {documents}
      {reports}
      <HistorySection sheet={sheet} />
      <p className="sheet-caution">{sheet.caution}</p>
    </SheetPage>
  );
}
