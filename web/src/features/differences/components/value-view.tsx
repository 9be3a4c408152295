import { memberWords } from '../../../shared/format/member-words';
import { Figure } from '../../../shared/ui/figure';
import { MarkedText } from '../../../shared/ui/marked-text';
import { valueWords } from '../model/field-words';

interface ValueViewProps {
  value: unknown;
  /** Where it stands, so that a coded word can be said plainly. */
  path: string;
}

/** A value of a definition as it is read: figures set, coded words said, an entry as its members one by one. */
export function ValueView({ value, path }: ValueViewProps) {
  if (value === null || value === undefined) return <span className="value-none">nothing</span>;
  if (typeof value === 'number') return <NumberView value={value} path={path} />;
  if (typeof value === 'boolean') return value ? 'yes' : 'no';
  if (typeof value === 'string') return <MarkedText text={valueWords(path, value)} />;
  if (Array.isArray(value)) return <ListView values={value} path={path} />;
  if (typeof value === 'object')
    return (
      <dl className="value-members">
        {Object.entries(value as Readonly<Record<string, unknown>>).map(([member, one]) => (
          <div key={member}>
            <dt>{memberWords(member)}</dt>
            <dd>
              <ValueView value={one} path={`${path}.${member}`} />
            </dd>
          </div>
        ))}
      </dl>
    );
  return null;
}

function NumberView({ value, path }: { value: number; path: string }) {
  return path.endsWith('year') || path.includes('date-parts') ? value : <Figure value={value} exactly />;
}

function ListView({ values, path }: { values: readonly unknown[]; path: string }) {
  if (values.length === 0) return <span className="value-none">none</span>;
  if (values.every((value) => typeof value === 'string')) return values.join(', ');
  return (
    <ul className="value-list">
      {values.map((value, i) => (
        <li key={i}>
          <ValueView value={value} path={`${path}[${i}]`} />
        </li>
      ))}
    </ul>
  );
}
