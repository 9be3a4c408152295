import { Button } from 'antd';
import { formatUnit } from '../../format/format-unit';
import { parseTypedNumber } from './parse-typed-number';
import { commaQuestion, convertedText, type TypedQuantity } from './typed-quantity';

interface QuantityQuestionProps {
  label: string;
  typed: TypedQuantity;
  inputId: string;
  onChange: (typed: TypedQuantity) => void;
}

/** What has to be answered before the number counts: how a comma is meant, or what a new unit means for it. */
export function QuantityQuestion({ label, typed, inputId, onChange }: QuantityQuestionProps) {
  const answer = (next: TypedQuantity) => {
    onChange(next);
    // The buttons go with the question; the focus stays at its field.
    document.getElementById(inputId)?.focus();
  };
  return (
    <div
      role="status"
      id={`${inputId}-question`}
      className="quantity-question"
      aria-label={`Question about ${label}`}
    >
      {questionOf(typed, answer)}
    </div>
  );
}

function questionOf(typed: TypedQuantity, answer: (next: TypedQuantity) => void) {
  const parsed = parseTypedNumber(typed.text);
  if (parsed.kind === 'ask')
    return (
      <>
        <span>{commaQuestion(parsed.readings.map((reading) => reading.text))}</span>
        {parsed.readings.map(({ text }) => (
          <Button key={text} size="small" onClick={() => answer({ ...typed, text })}>
            Use {text}
          </Button>
        ))}
      </>
    );
  const converted = convertedText(typed);
  if (typed.unitBefore === undefined || converted === null) return null;
  const { text, unit } = typed;
  return (
    <>
      <span>The unit was {formatUnit(typed.unitBefore)}.</span>
      <Button size="small" onClick={() => answer({ text: converted, unit })}>
        Convert {text.trim()} {formatUnit(typed.unitBefore)} to {converted} {formatUnit(unit)}
      </Button>
      <Button size="small" onClick={() => answer({ text, unit })}>
        Keep {text.trim()} {formatUnit(unit)}
      </Button>
    </>
  );
}
