import { Button } from 'antd';
import type { Review } from '../../../shared/api/types';
import { useAct } from '../../../shared/hooks/use-act';
import { useKeptText } from '../../../shared/hooks/use-kept-text';
import { Field, describedBy } from '../../../shared/ui/fields/field';
import { TextArea } from '../../../shared/ui/fields/text-area';
import { ProblemNotice } from '../../../shared/ui/problem-notice';

interface PutForwardFormProps {
  review: Review;
  onPutForward: (note: string) => Promise<unknown>;
}

const ID = 'put-forward-note';

/** The originator hands the revision back to its reviewers. */
export function PutForwardForm({ review, onPutForward }: PutForwardFormProps) {
  const { text, change, clear } = useKeptText(`put-forward:${review.slug}/${review.revision}`);
  const { working, problem, run } = useAct();
  const send = async () => {
    if (await run(() => onPutForward(text.trim()))) clear();
  };
  return (
    <section className="verdict-form" aria-labelledby="put-forward">
      <h2 id="put-forward">Put it forward again</h2>
      <p>
        Answer the comments, edit what has to be edited, then hand revision {review.revision} back to its
        reviewers. They are told, and give their verdicts on the content as it is then.
      </p>
      {problem ? <ProblemNotice problem={problem} /> : null}
      <Field id={ID} label="What you changed, or why not" hint="Goes to the reviewers.">
        <TextArea
          id={ID}
          value={text}
          maxLength={4000}
          onChange={change}
          {...describedBy(ID, { hint: true })}
        />
      </Field>
      <p className="act-line">
        <Button type="primary" loading={working} onClick={() => void send()}>
          Put revision {review.revision} forward again
        </Button>
      </p>
    </section>
  );
}
