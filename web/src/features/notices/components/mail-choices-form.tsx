import { Button } from 'antd';
import { useState } from 'react';
import type { MailChoices, NoticeKind } from '../../../shared/api/types';
import { FormSummary } from '../../../shared/form/form-summary';
import { useFormAct } from '../../../shared/form/use-form-act';
import { DoneNote } from '../../../shared/ui/done-note';
import { CheckList } from '../../../shared/ui/fields/check-list';
import { NOTICE_KINDS } from '../model/notice-kinds';
import './notices.css';

interface MailChoicesFormProps {
  choices: MailChoices;
  onChoose: (choices: MailChoices) => Promise<void>;
}

/** Which kinds of notices also come by mail; in the masthead all of them are told. */
export function MailChoicesForm({ choices, onChoose }: MailChoicesFormProps) {
  const [chosen, setChosen] = useState<NoticeKind[]>(() =>
    NOTICE_KINDS.map(({ kind }) => kind).filter((kind) => choices[kind]),
  );
  const [done, setDone] = useState('');
  const form = useFormAct({
    act: async () => {
      await onChoose(mailOf(chosen, choices));
      setDone('Your choice is kept.');
    },
  });
  return (
    <form
      className="mail-choices"
      onSubmit={(event) => {
        setDone('');
        form.send(event);
      }}
    >
      <FormSummary title="Your choice was not kept" form={form} ids={{}} />
      <CheckList
        id="mail-kinds"
        legend="By mail, too"
        choices={NOTICE_KINDS.map(({ kind, label, hint }) => ({ value: kind, label, hint }))}
        chosen={chosen}
        onChange={setChosen}
      />
      <Button htmlType="submit" loading={form.working}>
        Keep the choice
      </Button>
      <DoneNote words={done} />
    </form>
  );
}

function mailOf(chosen: readonly NoticeKind[], before: MailChoices): MailChoices {
  const mail = { ...before };
  for (const { kind } of NOTICE_KINDS) mail[kind] = chosen.includes(kind);
  return mail;
}
