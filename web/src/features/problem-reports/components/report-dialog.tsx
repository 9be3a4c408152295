import { useState } from 'react';
import { useAct } from '../../../shared/hooks/use-act';
import { useKeptText } from '../../../shared/hooks/use-kept-text';
import { ActDialog } from '../../../shared/ui/act-dialog';
import { ChoiceList } from '../../../shared/ui/fields/choice-list';
import { Field, describedBy } from '../../../shared/ui/fields/field';
import { TextArea } from '../../../shared/ui/fields/text-area';
import { ProblemNotice } from '../../../shared/ui/problem-notice';
import { wordsFault } from '../model/report-words';

interface ReportDialogProps<T extends string> {
  /** Names the text while it is kept; also ids on the page are made of it. */
  name: string;
  title: string;
  act: string;
  words: string;
  legend: string;
  choices: readonly { value: T; label: string; hint: string }[];
  textLabel: string;
  onAct: (choice: T, text: string) => Promise<unknown>;
  onClose: () => void;
}

/** A choice and a text about a problem: to report it, or to answer a report. */
export function ReportDialog<T extends string>(props: ReportDialogProps<T>) {
  const { name, title, act, words, legend, choices, textLabel, onAct, onClose } = props;
  const text = useKeptText(`report:${name}`);
  const [choice, setChoice] = useState<T | null>(null);
  const [pressed, setPressed] = useState(false);
  const { working, problem, run } = useAct();
  const id = `report-${name.replace(/[^a-z0-9]+/gi, '-')}`;
  const textError = pressed ? wordsFault(text.text) : undefined;
  const send = async () => {
    setPressed(true);
    if (choice === null) return document.getElementById(`${id}-kind`)?.focus();
    if (wordsFault(text.text) !== undefined) return document.getElementById(id)?.focus();
    if (!(await run(() => onAct(choice, text.text.trim())))) return;
    text.clear();
    onClose();
  };
  return (
    <ActDialog
      title={title}
      act={act}
      leave="Not now"
      working={working}
      onAct={() => void send()}
      onLeave={onClose}
    >
      <p>{words}</p>
      {problem ? <ProblemNotice problem={problem} /> : null}
      <ChoiceList
        id={`${id}-kind`}
        legend={legend}
        choices={choices}
        value={choice}
        error={pressed && choice === null ? 'Choose one.' : undefined}
        onChange={setChoice}
      />
      <Field id={id} label={textLabel} error={textError}>
        <TextArea
          id={id}
          rows={4}
          maxLength={4000}
          value={text.text}
          onChange={text.change}
          {...describedBy(id, { error: textError })}
        />
      </Field>
    </ActDialog>
  );
}
