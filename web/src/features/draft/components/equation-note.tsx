import type { LineSketch } from '@merestone/engine';
import { Equation } from '../../../shared/ui/equation';
import { MarginNote } from '../../../shared/ui/margin-note';
import type { LiveDraft } from '../hooks/use-draft-verdict';
import { DimensionWords } from './fields/expression-field';

/** The equations of the draft as they will be set, each with whether its dimensions close. */
export function EquationNote({ live }: { live: LiveDraft }) {
  const lines = [...live.sketch.values()].filter(({ tex }) => tex !== null);
  const equation = lines.filter(({ path }) => path.startsWith('parts'));
  const others = lines.filter(({ path }) => !path.startsWith('parts'));
  if (lines.length === 0)
    return (
      <MarginNote title="Equation">
        Stands here as soon as a group or an expression is written, with what is left over of its dimensions.
      </MarginNote>
    );
  return (
    <>
      {equation.length > 0 ? (
        <MarginNote title="Equation">
          <Lines lines={equation} />
        </MarginNote>
      ) : null}
      {others.length > 0 ? (
        <MarginNote
          title={others.every(({ path }) => path.startsWith('groups')) ? 'Groups' : 'Groups and steps'}
        >
          <Lines lines={others} />
        </MarginNote>
      ) : null}
    </>
  );
}

function Lines({ lines }: { lines: readonly LineSketch[] }) {
  return (
    <ul className="draft-lines">
      {lines.map((sketch) => (
        <li key={sketch.path}>
          <Equation tex={`${sketch.symbolTex} = ${sketch.tex ?? ''}`} />
          <DimensionWords sketch={sketch} />
        </li>
      ))}
    </ul>
  );
}
