import { INSPECTION_TOPICS, type InspectionReport, type Remark } from '@merestone/engine';
import { MarkedText } from '../../../shared/ui/marked-text';
import { rowId, rowOf } from '../model/field-rows';
import { TOPIC_WORDS, reportSummary } from '../model/report-words';

interface MachineReportProps {
  inspection: InspectionReport | null;
  /** The rows of the page, to which remarks lead. */
  rows: readonly string[];
}

/** What the machine found when the revision was submitted: what needs a look in full, what passed folded. */
export function MachineReport({ inspection, rows }: MachineReportProps) {
  return (
    <section aria-labelledby="machine-report">
      <h2 id="machine-report">What the machine found</h2>
      {inspection ? (
        <Report inspection={inspection} rows={rows} />
      ) : (
        <p className="field-note">The machine’s check is kept once the revision is submitted.</p>
      )}
    </section>
  );
}

function Report({ inspection, rows }: { inspection: InspectionReport; rows: readonly string[] }) {
  const having = (verdict: Remark['verdict']) =>
    inspection.remarks.filter((remark) => remark.verdict === verdict);
  const passed = having('passed');
  return (
    <>
      <p>{reportSummary(inspection)}</p>
      <Remarks title="Errors" remarks={having('error')} rows={rows} />
      <Remarks title="Warnings" remarks={having('warning')} rows={rows} />
      {passed.length > 0 ? (
        <details className="report-passed">
          <summary>{passed.length === 1 ? 'What passed' : `What passed, ${passed.length} points`}</summary>
          <ul className="remarks">
            {passed.map(({ topic, message }) => (
              <li key={message}>
                <span className="remark-topic">{TOPIC_WORDS[topic]}</span> <MarkedText text={message} />
              </li>
            ))}
          </ul>
        </details>
      ) : null}
    </>
  );
}

interface RemarksProps {
  title: string;
  remarks: readonly Remark[];
  rows: readonly string[];
}

function Remarks({ title, remarks, rows }: RemarksProps) {
  if (remarks.length === 0) return null;
  return (
    <>
      <h3 className="remarks-title">{title}</h3>
      <ul className="remarks">
        {INSPECTION_TOPICS.flatMap((topic) => remarks.filter((remark) => remark.topic === topic)).map(
          ({ topic, field, message }) => {
            const row = rowOf(field, rows);
            return (
              <li key={`${field}${message}`}>
                <span className="remark-topic">{TOPIC_WORDS[topic]}</span> <MarkedText text={message} />{' '}
                {row ? <a href={`#${rowId(row)}`}>See the field</a> : null}
              </li>
            );
          },
        )}
      </ul>
    </>
  );
}
