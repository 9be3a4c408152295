import type { LineSketch } from '@merestone/engine';
import type { ReactNode } from 'react';
import { Equation } from '../../../../shared/ui/equation';
import { useDraftTools } from '../draft-context';
import { TextField } from './text-field';

interface ExpressionFieldProps {
  path: string;
  label: ReactNode;
  value: string;
  onChange: (value: string) => void;
  hint?: ReactNode;
}

/** An expression as it is typed, and under it the same typeset with what is left over of its dimensions. */
export function ExpressionField({ path, label, value, onChange, hint }: ExpressionFieldProps) {
  const { live, problemAt } = useDraftTools();
  const sketch = live.sketch.get(path);
  const problem = problemAt(path);
  // What the sketch says of dimensions is said under the field already.
  const told =
    problem?.code === 'dimension' && sketch?.dimension.state === 'open' ? undefined : problem?.message;
  return (
    <div className="draft-expression">
      <TextField
        path={path}
        label={label}
        value={value}
        onChange={onChange}
        hint={hint}
        error={sketchFault(sketch) ?? told}
        code
      />
      {sketch?.tex ? (
        <div className="draft-typeset">
          <Equation tex={`${sketch.symbolTex} = ${sketch.tex}`} />
          <DimensionWords sketch={sketch} />
        </div>
      ) : null}
    </div>
  );
}

/** Whether a line's dimensions close, in words. */
export function DimensionWords({ sketch: { dimension } }: { sketch: LineSketch }) {
  switch (dimension.state) {
    case 'closes':
      return <span className="draft-closes">closes</span>;
    case 'open':
      return <strong className="draft-open">{unitWords(dimension.leftOver)} is left over</strong>;
    case 'wrong':
      return <strong className="draft-open">does not close: {dimension.reason}</strong>;
    case 'not-proved':
      return <span className="draft-closes">{dimension.reason}</span>;
  }
}

function unitWords(unit: string): ReactNode {
  return unit
    .split(/(\^-?[\d.]+)/)
    .map((part, i) =>
      part.startsWith('^') ? <sup key={i}>{part.slice(1).replace('-', '\u2212')}</sup> : part,
    );
}

function sketchFault(sketch: LineSketch | undefined): string | undefined {
  if (!sketch) return undefined;
  if (sketch.fault !== null) {
    const { at, reason } = sketch.fault;
    return `Not read${at === null ? '' : ` at character ${at}`}: ${reason}.`;
  }
  if (sketch.unknown.length === 0) return undefined;
  return sketch.unknown.length === 1
    ? `The sheet has no symbol ${sketch.unknown[0] ?? ''} yet.`
    : `The sheet has no symbols ${sketch.unknown.join(', ')} yet.`;
}
