import type { Remark } from '@merestone/engine';
import type { ReviewComment } from '../../../shared/api/types';
import { MarkedText } from '../../../shared/ui/marked-text';
import { byRow, rowId } from '../model/field-rows';
import type { Talk } from '../model/talk';
import { CommentThread } from './comment-thread';
import type { FieldGroup, SheetField } from './sheet-field';

interface FieldRowsProps {
  groups: readonly FieldGroup[];
  comments: readonly ReviewComment[];
  /** The machine's remarks that are no pass. */
  remarks: readonly Remark[];
  talk: Talk;
}

/** The sheet field by field; beside each in the margin what was said about it. */
export function FieldRows({ groups, comments, remarks, talk }: FieldRowsProps) {
  const paths = groups.flatMap(({ fields }) => fields.map(({ path }) => path));
  const said = byRow(comments, paths);
  const found = byRow(remarks, paths);
  return (
    <>
      {groups.map(({ title, fields }) => (
        <section key={title} className="review-group">
          <h2>{title}</h2>
          {fields.map((field) => (
            <FieldRow
              key={field.path}
              field={field}
              comments={said.get(field.path) ?? []}
              remarks={found.get(field.path) ?? []}
              talk={talk}
            />
          ))}
        </section>
      ))}
      <section className="review-group">
        <h2>The sheet as a whole</h2>
        <FieldRow
          field={{
            path: '',
            label: 'the sheet as a whole',
            content: <p className="field-note">What belongs to no single field is said here.</p>,
          }}
          comments={said.get('') ?? []}
          remarks={[]}
          talk={talk}
        />
      </section>
    </>
  );
}

interface FieldRowProps {
  field: SheetField;
  comments: readonly ReviewComment[];
  remarks: readonly Remark[];
  talk: Talk;
}

function FieldRow({
  field: { path, label, ownLabel = false, content },
  comments,
  remarks,
  talk,
}: FieldRowProps) {
  return (
    <div className="review-row" id={rowId(path)} tabIndex={-1}>
      <div className="review-row-field">
        {path === '' ? null : <h3 className={ownLabel ? 'heard-only' : 'review-row-label'}>{label}</h3>}
        {content}
      </div>
      <div className="review-row-margin">
        {remarks.map(({ message, verdict }) => (
          <p key={message} className="machine-remark">
            <i>{verdict === 'error' ? 'Machine check, error' : 'Machine check'}</i>
            <MarkedText text={message} />
          </p>
        ))}
        <CommentThread field={path} label={label} comments={comments} talk={talk} />
      </div>
    </div>
  );
}
