import { memo, useState } from 'react';
import { BoundsNote } from './bounds-note';
import { EquationNote } from './equation-note';
import { FindingsNote } from './findings-note';
import { TryOutNote } from './try-out-note';
import type { LiveDraft } from '../hooks/use-draft-verdict';
import { tryOut, type TryOutInput } from '../model/try-out';

const NOTHING: TryOutInput = { typed: {}, rows: {} };

/** What follows from the form, beside it: equations, dimensions, findings, bounds, and numbers tried out. */
export const LiveMargin = memo(function LiveMargin({ live }: { live: LiveDraft }) {
  const [input, setInput] = useState(NOTHING);
  const { compiled } = live.verdict.working;
  const tried = compiled ? tryOut(compiled, live.library, input) : null;
  const findings = tried?.state === 'outcome' ? tried.outcome.findings : [];
  return (
    <div className="draft-margin">
      <FindingsNote live={live} />
      <EquationNote live={live} />
      <BoundsNote live={live} findings={findings} />
      <TryOutNote live={live} input={input} tried={tried} onChange={setInput} />
    </div>
  );
});
