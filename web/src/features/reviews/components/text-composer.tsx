import { Button } from 'antd';
import { useId, useState } from 'react';
import { useAct } from '../../../shared/hooks/use-act';
import { useKeptText } from '../../../shared/hooks/use-kept-text';
import { Field, describedBy } from '../../../shared/ui/fields/field';
import { TextArea } from '../../../shared/ui/fields/text-area';
import { ProblemNotice } from '../../../shared/ui/problem-notice';

interface TextComposerProps {
  /** Names the text while it is kept. */
  name: string;
  /** On the button that opens it, heard with what it is about. */
  open: string;
  about: string;
  label: string;
  /** On the button that sends it. */
  send: string;
  onSend: (text: string) => Promise<unknown>;
}

/** A line that opens into a text to write; what is typed is kept until it is sent or cleared away. */
export function TextComposer({ name, open, about, label, send, onSend }: TextComposerProps) {
  const { text, change, clear } = useKeptText(name);
  const [opened, setOpened] = useState(text !== '');
  const [empty, setEmpty] = useState(false);
  const { working, problem, run } = useAct();
  const id = useId();
  if (!opened)
    return (
      <button type="button" className="composer-open" onClick={() => setOpened(true)}>
        {open}
        <span className="heard-only"> {about}</span>
      </button>
    );
  const error = empty && text.trim() === '' ? 'Nothing is written yet.' : undefined;
  const submit = async () => {
    setEmpty(true);
    if (text.trim() === '' || !(await run(() => onSend(text.trim())))) return;
    clear();
    setEmpty(false);
    setOpened(false);
  };
  return (
    <form
      className="composer"
      noValidate
      onSubmit={(event) => {
        event.preventDefault();
        void submit();
      }}
    >
      {problem ? <ProblemNotice problem={problem} /> : null}
      <Field id={id} label={label} error={error}>
        <TextArea
          id={id}
          value={text}
          maxLength={4000}
          autoFocus={text === ''}
          onChange={change}
          {...describedBy(id, { error })}
        />
      </Field>
      <p className="composer-acts">
        <Button type="primary" size="small" htmlType="submit" loading={working}>
          {send}
        </Button>
        <Button
          size="small"
          onClick={() => {
            clear();
            setEmpty(false);
            setOpened(false);
          }}
        >
          {text === '' ? 'Close' : 'Discard the text'}
        </Button>
      </p>
    </form>
  );
}
