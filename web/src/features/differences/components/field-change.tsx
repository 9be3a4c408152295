import type { CorrelationDefinition, Difference } from '@merestone/engine';
import { MarkedText } from '../../../shared/ui/marked-text';
import { fieldWords } from '../model/field-words';
import { TextChange } from './text-change';
import { ValueView } from './value-view';

interface FieldChangeProps {
  difference: Difference;
  definition: CorrelationDefinition;
}

const LONG = 32;
const CHANGES = { added: 'added', removed: 'removed', changed: 'changed' } as const;

/** One field: what it is called, what became of it, and its value before and after. */
export function FieldChange({ difference, definition }: FieldChangeProps) {
  const { path, change } = difference;
  return (
    <li className="field-change">
      <h3>
        <MarkedText text={fieldWords(path, definition)} />{' '}
        <span className="change-word">{CHANGES[change]}</span>
      </h3>
      <Values difference={difference} />
    </li>
  );
}

function Values({ difference: { path, change, before, after } }: { difference: Difference }) {
  if (change === 'added') return <ValueView value={after} path={path} />;
  if (change === 'removed')
    return (
      <div className="value-removed">
        <ValueView value={before} path={path} />
      </div>
    );
  if (typeof before === 'string' && typeof after === 'string' && Math.max(before.length, after.length) > LONG)
    return <TextChange before={before} after={after} />;
  return (
    <p>
      <ValueView value={before} path={path} />
      <span className="value-arrow" aria-hidden="true">
        {' '}
        →{' '}
      </span>
      <span className="heard-only"> became </span>
      <strong>
        <ValueView value={after} path={path} />
      </strong>
    </p>
  );
}
