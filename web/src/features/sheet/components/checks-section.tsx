import { memo } from 'react';
import type { CheckReport, Sheet } from '../../../shared/api/types';
import { formatNumber } from '../../../shared/format/format-number';
import { Figure } from '../../../shared/ui/figure';
import { MarkedText } from '../../../shared/ui/marked-text';
import { MarginNote } from '../../../shared/ui/margin-note';
import { SetTable } from '../../../shared/ui/set-table';
import { MarginRow } from '../../../shared/ui/sheet-page';
import { SymbolMark } from '../../../shared/ui/symbol-mark';
import '../../../shared/ui/on-sheet/symbol-note.css';

/** The worked checks that every start of the machine recomputes. */
export const ChecksSection = memo(function ChecksSection({ sheet }: { sheet: Pick<Sheet, 'checks'> }) {
  const { checks } = sheet;
  return (
    <MarginRow
      heading={<h2>Worked checks</h2>}
      notes={<MarginNote title="Checks">{summaryOf(checks)}</MarginNote>}
    >
      <CheckTable checks={checks} label="Worked checks" />
    </MarginRow>
  );
});

/** Worked checks with what each expects and what was found. */
export function CheckTable({ checks, label }: { checks: readonly CheckReport[]; label: string }) {
  return (
    <SetTable label={label}>
      <thead>
        <tr>
          <th scope="col">Check</th>
          <th scope="col" className="number">
            Expected
          </th>
          <th scope="col" className="number">
            Found
          </th>
          <th scope="col" className="number">
            Deviation
          </th>
          <th scope="col">Outcome</th>
        </tr>
      </thead>
      {checks.map((check) => (
        <CheckRows key={check.title} check={check} />
      ))}
    </SetTable>
  );
}

function CheckRows({ check }: { check: CheckReport }) {
  return (
    <tbody>
      <tr className="check-title">
        <th scope="rowgroup" colSpan={4}>
          <MarkedText text={check.title} />
          <span className="symbol-note">
            <MarkedText text={wordsOf(check)} />
          </span>
        </th>
        <td>{check.passed ? 'reproduces' : <strong className="check-fails">does not reproduce</strong>}</td>
      </tr>
      {check.values.map(({ symbol, expected, found, deviationPercent, unit, passed }) => (
        <tr key={symbol}>
          <th scope="row">
            <SymbolMark symbol={symbol} />
          </th>
          <td className="number">
            <Figure value={expected} unit={unit} exactly />
          </td>
          <td className="number">{found === null ? 'none' : <Figure value={found} unit={unit} />}</td>
          <td className="number">{deviationPercent === null ? '' : deviationText(deviationPercent)}</td>
          <td>{passed ? 'within' : 'outside'}</td>
        </tr>
      ))}
      {check.problems.map(({ message }) => (
        <tr key={message}>
          <td colSpan={5}>{message}</td>
        </tr>
      ))}
      {check.findings.map(({ message }) => (
        <tr key={message}>
          <td colSpan={5} className="symbol-note">
            The example itself lies outside: {message}
          </td>
        </tr>
      ))}
    </tbody>
  );
}

function wordsOf({ kind, source, tolerancePercent, note }: CheckReport): string {
  const origin = kind === 'published' ? 'Published example' : 'Computed by us';
  const from = source ?? (kind === 'published' ? '' : 'guards against slips only');
  const told = from === '' ? origin : `${origin}: ${from.replace(/\.$/, '')}`;
  return `${told}; within ${tolerancePercent} %.${note ? ` ${note}` : ''}`;
}

/** Below this a deviation is the rounding of what was expected. */
const NOTHING_PERCENT = 0.001;

function deviationText(percent: number): string {
  return Math.abs(percent) < NOTHING_PERCENT
    ? `< ${formatNumber(NOTHING_PERCENT, 1)} %`
    : `${formatNumber(percent, 2)} %`;
}

function summaryOf(checks: readonly CheckReport[]): string {
  const good = checks.filter((check) => check.passed).length;
  const published = checks.filter((check) => check.kind === 'published').length;
  const kinds =
    published === 0
      ? 'None is a published example.'
      : `${published === 1 ? 'One is a published example' : `${published} are published examples`}.`;
  return `${good} of ${checks.length} worked ${checks.length === 1 ? 'check reproduces' : 'checks reproduce'}. ${kinds}`;
}
