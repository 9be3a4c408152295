import type { ReactNode } from 'react';
import { useKeptText } from '../hooks/use-kept-text';
import { ActDialog } from '../ui/act-dialog';
import { describedBy, Field } from '../ui/fields/field';
import { TextArea } from '../ui/fields/text-area';
import { FormSummary } from './form-summary';
import { reasonError } from './reason-error';
import { useFormAct, type FieldErrors } from './use-form-act';

const REASON = 'act-reason';
const LONGEST = 4000;

interface ReasonDialogProps {
  title: string;
  act: string;
  leave?: string;
  /** What the act is about, for keeping a half-written reason: `deactivate:<id>`. */
  about: string;
  /** What has not happened yet: `Nobody was shut out yet`. */
  notDone: string;
  /** What the act brings with it, and what else it asks for. */
  children: ReactNode;
  /** What is wrong with what else it asks for, and the controls it is asked with. */
  alsoFind?: () => FieldErrors;
  ids?: Readonly<Record<string, string>>;
  onAct: (reason: string) => Promise<void>;
  onLeave: () => void;
}

/** An act of the office that needs a reason, which stands on record. */
export function ReasonDialog({
  title,
  act,
  leave,
  about,
  notDone,
  children,
  alsoFind,
  ids = {},
  onAct,
  onLeave,
}: ReasonDialogProps) {
  const { text, change, clear } = useKeptText(about);
  const form = useFormAct({
    find: () => ({ ...alsoFind?.(), reason: reasonError(text) }),
    act: async () => {
      await onAct(text.trim());
      clear();
    },
  });
  const error = form.errors['reason'];
  return (
    <ActDialog
      title={title}
      act={act}
      {...(leave === undefined ? {} : { leave })}
      working={form.working}
      onAct={form.send}
      onLeave={onLeave}
    >
      {children}
      <FormSummary title={notDone} form={form} ids={{ ...ids, reason: REASON }} />
      <Field id={REASON} label="Reason" hint="It stands on record with your name." error={error}>
        <TextArea
          id={REASON}
          value={text}
          maxLength={LONGEST}
          onChange={change}
          {...describedBy(REASON, { error, hint: true })}
        />
      </Field>
    </ActDialog>
  );
}
