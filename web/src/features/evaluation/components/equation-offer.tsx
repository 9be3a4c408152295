import { Button } from 'antd';
import { useState } from 'react';
import { inWords } from '../../../shared/format/in-words';
import { lowerFirst } from '../../../shared/format/lower-first';
import type { EvaluationState } from '../hooks/use-evaluation';
import { equationSets, type EquationSet } from '../model/listed-equations';

/** One press for all empty properties: each takes the first equation that the sheet lists for it; can be undone. */
export function EquationOffer({ evaluation }: { evaluation: EvaluationState }) {
  const { sections, duty, change } = evaluation;
  const [chosen, setChosen] = useState<Readonly<Record<string, string>>>({});
  const sets = equationSets(sections, duty);
  const standing = Object.entries(chosen).filter(([key, slug]) => duty.equations[key] === slug).length;
  const use = ({ equations }: EquationSet) => {
    setChosen({ ...chosen, ...equations });
    change({ do: 'choose-equations', equations });
  };
  const undo = () => {
    change({ do: 'drop-equations', equations: chosen });
    setChosen({});
  };
  return (
    <div className="equation-offer" role="group" aria-label="Property equations">
      {sets.map((set) => (
        <Button key={set.phase ?? ''} size="small" onClick={() => use(set)}>
          {set.phase === null
            ? 'Use property equations where listed'
            : `Use property equations listed for a ${set.phase}`}
        </Button>
      ))}
      {sets[0] ? <span>{offerWords(sets[0])}</span> : null}
      <span role="status">{standing > 0 ? chosenWords(standing) : ''}</span>
      {standing > 0 ? (
        <Button size="small" onClick={undo}>
          Undo
        </Button>
      ) : null}
    </div>
  );
}

function offerWords({ fields }: EquationSet): string {
  return `Takes the first one listed for ${inWords(fields.map(({ label }) => lowerFirst(label.split(', ')[0] ?? label)))}.`;
}

function chosenWords(count: number): string {
  const filled = count === 1 ? 'One quantity is' : `${count} quantities are`;
  return `${filled} filled by the first equation listed; what each takes for granted stands under it.`;
}
