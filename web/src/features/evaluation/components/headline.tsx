import {
  symbolTex,
  type CorrelationDefinition,
  type EvaluationRequest,
  type Numbers,
  type PartOutcome,
} from '@merestone/engine';
import { symbolText } from '../../../shared/format/symbol-parts';
import { Figure } from '../../../shared/ui/figure';
import { InlineEquation } from '../../../shared/ui/equation';
import { RESULT_MEANT, coefficientWords } from '../model/coefficient-words';
import { inCoherentUnit } from '../model/in-coherent-unit';
import { lackingForCoefficient } from '../model/lacking-for-coefficient';
import { CopyButton } from './copy-button';
import { Mark } from './mark';

interface HeadlineProps {
  numbers: Numbers;
  request: EvaluationRequest;
  mark: string | null;
  definition: CorrelationDefinition;
}

/** The coefficient, large; of a method each part's, the principal one last. */
export function Headline({ numbers, request, mark, definition }: HeadlineProps) {
  const lackingFor = (key: string) =>
    lackingForCoefficient(
      definition.parts.find((part) => part.key === key),
      definition.quantities,
      request,
      numbers,
    );
  return (
    <div className="headline">
      {numbers.parts.map((part) => (
        <PartLine
          key={part.key}
          part={part}
          mark={mark}
          definition={definition}
          titled={numbers.parts.length > 1}
          lacking={part.coefficient ? [] : lackingFor(part.key)}
        />
      ))}
    </div>
  );
}

interface PartLineProps {
  part: PartOutcome;
  mark: string | null;
  definition: CorrelationDefinition;
  titled: boolean;
  lacking: string[];
}

function PartLine({ part, mark, definition, titled, lacking }: PartLineProps) {
  const own = definition.parts.find(({ key }) => key === part.key);
  const { symbol, value, unit } = part.coefficient ?? part.result;
  const coherent = inCoherentUnit(value, unit);
  const words = part.coefficient
    ? coefficientWords(part.coefficient)
    : RESULT_MEANT[own?.result.kind ?? 'Sherwood'];
  const tex = symbolTex(symbol, part.coefficient ? own?.coefficient?.tex : own?.result.tex);
  return (
    <div className="headline-part">
      {titled ? <h3>{part.title}</h3> : null}
      <p className="headline-number">
        <InlineEquation tex={tex} /> = <Figure value={value} unit={unit} />
        {coherent ? (
          <>
            {' '}
            = <Figure value={coherent.value} unit={coherent.unit} />
          </>
        ) : null}{' '}
        <Mark words={mark} />
        <CopyButton
          quiet
          text={() => `${value} ${unit === '1' ? '' : unit}${mark ? ` (${mark})` : ''}`.trim()}
        >
          Copy value
        </CopyButton>
      </p>
      {words ? <p className="headline-words">{words}</p> : null}
      {lacking.length > 0 ? (
        <p className="headline-words">
          The coefficient follows once these are given too: {lacking.map(symbolText).join(', ')}.
        </p>
      ) : null}
    </div>
  );
}
