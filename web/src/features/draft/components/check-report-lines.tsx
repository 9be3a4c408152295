import type { CheckReport } from '@merestone/engine';
import { formatNumber } from '../../../shared/format/format-number';
import { Figure } from '../../../shared/ui/figure';
import { SymbolMark } from '../../../shared/ui/symbol-mark';

/** What the check comes to, told as it is typed: found, deviation, and whether it reproduces. */
export function CheckReportLines({ report }: { report: CheckReport | undefined }) {
  if (!report)
    return (
      <p className="draft-told" role="status">
        The check runs once the formulas hold and an input and an expected value are there.
      </p>
    );
  return (
    <div className="draft-check" role="status">
      <p>{report.passed ? 'Reproduces.' : <strong className="draft-open">Does not reproduce.</strong>}</p>
      <ul>
        {report.values
          .filter(({ found }) => found !== null)
          .map(({ symbol, expected, found, deviationPercent, unit }) => (
            <li key={symbol}>
              <SymbolMark symbol={symbol} />: found{' '}
              {found === null ? 'nothing' : <Figure value={found} unit={unit} />}, expected{' '}
              <Figure value={expected} unit={unit} exactly />
              {deviationPercent === null ? null : `, ${formatNumber(deviationPercent, 2)} % off`}
            </li>
          ))}
        {report.problems.map(({ message, field }) => (
          <li key={field + message}>{message}</li>
        ))}
        {report.findings.map(({ message }) => (
          <li key={message}>The example itself lies outside: {message}</li>
        ))}
      </ul>
    </div>
  );
}
