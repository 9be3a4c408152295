import type { LineTex } from '@merestone/engine';
import { EquationLine } from '../../../shared/ui/on-sheet/equation-line';
import { MarkedText } from '../../../shared/ui/marked-text';
import { formatUnit } from '../../../shared/format/format-unit';
import type { LineChange } from '../model/line-changes';

/** An equation before and after, typeset side by side; on a phone one under the other. */
export function LineChangeView({ change: { title, before, after } }: { change: LineChange }) {
  return (
    <li className="field-change">
      <h3>
        <MarkedText text={title} /> <span className="change-word">{wordOf(before, after)}</span>
      </h3>
      <dl className="before-after">
        <Side name="Before" line={before} />
        <Side name="After" line={after} />
      </dl>
    </li>
  );
}

function wordOf(before: LineTex | null, after: LineTex | null): string {
  if (before === null) return 'added';
  return after === null ? 'removed' : 'changed';
}

function Side({ name, line }: { name: string; line: LineTex | null }) {
  const unit = line ? formatUnit(line.unit) : '';
  return (
    <div>
      <dt>{name}</dt>
      <dd>
        {line ? <EquationLine line={line} /> : <span className="value-none">none</span>}
        {unit ? <span className="line-unit">in {unit}</span> : null}
      </dd>
    </div>
  );
}
