import { Button } from 'antd';
import type { ReviewComment } from '../../../shared/api/types';
import { formatDay } from '../../../shared/format/format-date';
import { useAct } from '../../../shared/hooks/use-act';
import { ProblemNotice } from '../../../shared/ui/problem-notice';
import type { Talk } from '../model/talk';
import { TextComposer } from './text-composer';

interface CommentThreadProps {
  /** Path the thread is anchored to; empty: the sheet as a whole. */
  field: string;
  label: string;
  comments: readonly ReviewComment[];
  talk: Talk;
}

/** What was said about one field, beside it: open comments first in full, settled ones folded. */
export function CommentThread({ field, label, comments, talk }: CommentThreadProps) {
  const open = comments.filter(({ resolved }) => resolved === null);
  const settled = comments.filter(({ resolved }) => resolved !== null);
  return (
    <div className="thread">
      {open.map((comment) => (
        <CommentView key={comment.id} comment={comment} field={field} talk={talk} />
      ))}
      {settled.length > 0 ? (
        <details className="thread-settled">
          <summary>
            {settled.length === 1 ? 'One resolved comment' : `${settled.length} resolved comments`}
          </summary>
          {settled.map((comment) => (
            <CommentView key={comment.id} comment={comment} field={field} talk={talk} />
          ))}
        </details>
      ) : null}
      {talk.mayComment ? (
        <TextComposer
          name={`comment:${talk.name}:${field}`}
          open="Comment"
          about={`on ${label}`}
          label={`Your comment on ${label}`}
          send="Send comment"
          onSend={(text) => talk.comment(field, text)}
        />
      ) : null}
    </div>
  );
}

interface CommentViewProps {
  comment: ReviewComment;
  field: string;
  talk: Talk;
}

function CommentView({ comment, field, talk }: CommentViewProps) {
  const { id, by, at, iteration, text, answers, resolved, abilities } = comment;
  const { working, problem, run } = useAct();
  return (
    <article className="comment" aria-label={`Comment by ${by.name}`}>
      <p className="comment-who">
        {by.name}, {formatDay(at)}, iteration {iteration}
        {comment.field === field ? '' : ` (on ${comment.field})`}
      </p>
      <p className="comment-text">{text}</p>
      {answers.map((answer) => (
        <div key={answer.id} className="comment-answer">
          <p className="comment-who">
            {answer.by.name} answers, {formatDay(answer.at)}
          </p>
          <p className="comment-text">{answer.text}</p>
        </div>
      ))}
      {resolved ? (
        <p className="comment-who">
          Resolved by {resolved.by.name}, {formatDay(resolved.at)}
        </p>
      ) : null}
      {problem ? <ProblemNotice problem={problem} /> : null}
      <div className="comment-acts">
        {abilities.answer ? (
          <TextComposer
            name={`answer:${talk.name}:${id}`}
            open="Answer"
            about={`the comment by ${by.name}`}
            label={`Your answer to ${by.name}`}
            send="Send answer"
            onSend={(answer) => talk.answer(comment, answer)}
          />
        ) : null}
        {abilities.resolve ? (
          <Button
            type="link"
            size="small"
            loading={working}
            onClick={() => void run(() => talk.resolve(comment))}
          >
            Resolve
            <span className="heard-only"> the comment by {by.name}</span>
          </Button>
        ) : null}
      </div>
    </article>
  );
}
