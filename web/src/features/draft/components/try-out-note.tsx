import { symbolTex, type Outcome } from '@merestone/engine';
import { Figure } from '../../../shared/ui/figure';
import { InlineEquation } from '../../../shared/ui/equation';
import { MarginNote } from '../../../shared/ui/margin-note';
import { QuantityField } from '../../../shared/ui/quantity-field/quantity-field';
import type { LiveDraft } from '../hooks/use-draft-verdict';
import { inputOfCheck, tryOutFields, type TriedOut, type TryOutInput } from '../model/try-out';
import { RowAct } from './row-list';

interface TryOutNoteProps {
  live: LiveDraft;
  input: TryOutInput;
  /** Null while the formulas do not run. */
  tried: TriedOut | null;
  onChange: (input: TryOutInput) => void;
}

/** The draft with numbers put in, to see whether they come out as expected. */
export function TryOutNote({ live, input, tried, onChange }: TryOutNoteProps) {
  const { compiled } = live.verdict.working;
  if (!compiled || !tried)
    return (
      <MarginNote title="Try it out">
        Numbers can be put in here once every symbol has its unit and the formulas hold together.
      </MarginNote>
    );
  const check = live.form.checks.find(({ inputs }) => inputs.some(({ value }) => value.trim() !== ''));
  return (
    <MarginNote title="Try it out">
      {check ? (
        <p>
          <RowAct
            what="Take the numbers of the worked check"
            onClick={() => onChange(inputOfCheck(check, compiled))}
          >
            take the numbers of the worked check
          </RowAct>
        </p>
      ) : null}
      {(compiled.definition.tables ?? []).map(({ name, title, rows }) => (
        <label key={name} className="draft-try-row">
          {title}
          <select
            className="choice"
            value={input.rows[name] ?? ''}
            onChange={(event) => onChange({ ...input, rows: { ...input.rows, [name]: event.target.value } })}
          >
            <option value="">none</option>
            {rows.map(({ key, label }) => (
              <option key={key} value={key}>
                {label}
              </option>
            ))}
          </select>
        </label>
      ))}
      {tryOutFields(compiled, input).map(({ symbol, label, tex, unit, units, optional }) => (
        <QuantityField
          key={symbol}
          id={`draft-try-${symbol}`}
          label={label}
          symbol={<InlineEquation tex={tex} />}
          typed={input.typed[symbol] ?? { text: '', unit }}
          units={units}
          optional={optional}
          onChange={(typed) => onChange({ ...input, typed: { ...input.typed, [symbol]: typed } })}
        />
      ))}
      <TriedOutLines tried={tried} />
    </MarginNote>
  );
}

function TriedOutLines({ tried }: { tried: TriedOut }) {
  if (tried.state === 'empty') return <p role="status">The result follows as you type; nothing is kept.</p>;
  if (tried.state === 'problems')
    return (
      <ul role="status">
        {tried.messages.map((message) => (
          <li key={message}>{message}</li>
        ))}
      </ul>
    );
  return (
    <div role="status">
      <OutcomeLines outcome={tried.outcome} />
    </div>
  );
}

function OutcomeLines({ outcome }: { outcome: Outcome }) {
  if (outcome.outcome === 'refused') return <p className="draft-open">{outcome.message}</p>;
  const groups = Object.entries(outcome.groups);
  return (
    <>
      <ul className="draft-figures">
        {groups.map(([symbol, value]) => (
          <li key={symbol}>
            <InlineEquation tex={symbolTex(symbol)} /> = <Figure value={value} />
          </li>
        ))}
        {outcome.parts.flatMap(({ key, result, coefficient }) =>
          [result, ...(coefficient ? [coefficient] : [])].map(({ symbol, value, unit }) => (
            <li key={`${key} ${symbol}`}>
              <strong>
                <InlineEquation tex={symbolTex(symbol)} /> = <Figure value={value} unit={unit} />
              </strong>
            </li>
          )),
        )}
      </ul>
      <p className="draft-about">Of a draft: for a look only, nothing is kept.</p>
    </>
  );
}
