import { shareKept, wordChanges } from '../model/word-changes';

/** A text whose changed words are marked and said; one that was written anew stands before and after. */
export function TextChange({ before, after }: { before: string; after: string }) {
  const changes = wordChanges(before, after);
  if (shareKept(changes) < 0.35)
    return (
      <dl className="before-after">
        <div>
          <dt>Before</dt>
          <dd>{before}</dd>
        </div>
        <div>
          <dt>After</dt>
          <dd>{after}</dd>
        </div>
      </dl>
    );
  return (
    <p className="text-change">
      {changes.map(({ kind, text }, i) => {
        if (kind === 'same') return <span key={i}>{text}</span>;
        return kind === 'out' ? (
          <del key={i}>
            <span className="heard-only">taken out: </span>
            <Marked text={text} />
          </del>
        ) : (
          <ins key={i}>
            <span className="heard-only">put in: </span>
            <Marked text={text} />
          </ins>
        );
      })}
    </p>
  );
}

/** The space after the last word stays outside the mark's line. */
function Marked({ text }: { text: string }) {
  const words = text.trimEnd();
  return (
    <>
      <span className="marked-words">{words}</span>
      {text.slice(words.length)}
    </>
  );
}
