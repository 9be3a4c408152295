import { Button } from 'antd';
import { useState } from 'react';
import { inWords } from '../../../shared/format/in-words';
import { lowerFirst } from '../../../shared/format/lower-first';
import type { EvaluationState } from '../hooks/use-evaluation';
import { listedEquations } from '../model/listed-equations';

/** One press for all empty properties: each takes the first equation that the sheet lists for it; can be undone. */
export function EquationOffer({ evaluation }: { evaluation: EvaluationState }) {
  const { sections, duty, change } = evaluation;
  const [set, setSet] = useState<Readonly<Record<string, string>>>({});
  const open = listedEquations(sections, duty);
  const standing = Object.entries(set).filter(([key, slug]) => duty.equations[key] === slug);
  const use = () => {
    const equations = Object.fromEntries(open.map(({ field, slug }) => [field.key, slug]));
    setSet({ ...set, ...equations });
    change({ do: 'choose-equations', equations });
  };
  const undo = () => {
    change({ do: 'drop-equations', equations: set });
    setSet({});
  };
  return (
    <div className="equation-offer" role="group" aria-label="Property equations">
      {open.length > 0 ? (
        <>
          <Button size="small" onClick={use}>
            Use property equations where listed
          </Button>
          <span>
            Takes the first one listed for {inWords(open.map(({ field }) => lowerFirst(field.label)))}.
          </span>
        </>
      ) : null}
      <span role="status">
        {standing.length > 0
          ? `${standing.length === 1 ? 'One quantity is' : `${standing.length} quantities are`} filled by the first equation listed. Read below what each takes for granted.`
          : ''}
      </span>
      {standing.length > 0 ? (
        <Button size="small" onClick={undo}>
          Undo
        </Button>
      ) : null}
    </div>
  );
}
