import 'katex/dist/katex.min.css';
import { memo, type ReactNode } from 'react';
import { BlockMath, InlineMath } from 'react-katex';
import './equation.css';

interface EquationProps {
  /** TeX made by the engine from a parsed expression; never text a person typed. */
  tex: string;
  /** The handbook's number at the right: `(1)`. */
  number?: number | string;
  /** Words after the equation, such as the condition of a piece. */
  children?: ReactNode;
  id?: string;
}

/** A displayed equation with its number; wide ones scroll inside themselves, reachable by keyboard. */
export const Equation = memo(function Equation({ tex, number, children, id }: EquationProps) {
  return (
    <div className="equation" id={id}>
      <div
        className="equation-body"
        tabIndex={0}
        role="group"
        aria-label={number ? `Equation ${number}` : 'Equation'}
      >
        <BlockMath math={withBreaks(tex)} renderError={() => <code>{tex}</code>} />
      </div>
      {number === undefined ? null : <span className="equation-number">({number})</span>}
      {children ? <div className="equation-words">{children}</div> : null}
    </div>
  );
});

/** Mathematics in a line of text. Typesetting is dear beside a keystroke, so it is done once for each text. */
export const InlineEquation = memo(function InlineEquation({ tex }: { tex: string }) {
  return <InlineMath math={tex} renderError={() => <code>{tex}</code>} />;
});

/** Lets a long product go on in a second line where the column is narrow. */
function withBreaks(tex: string): string {
  return tex.replaceAll('\\,', '\\,\\allowbreak ');
}
