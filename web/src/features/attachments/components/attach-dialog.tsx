import { formatCitation, type Source } from '@merestone/engine';
import { useState } from 'react';
import type { Licence } from '../../../shared/api/types';
import { FormSummary } from '../../../shared/form/form-summary';
import { useFormAct } from '../../../shared/form/use-form-act';
import { ActDialog } from '../../../shared/ui/act-dialog';
import { ChoiceField } from '../../../shared/ui/fields/choice-field';
import { ChoiceList } from '../../../shared/ui/fields/choice-list';
import { describedBy, Field } from '../../../shared/ui/fields/field';
import type { NewDocument } from '../api/use-attachments';
import { fileError } from '../model/file-error';

const IDS = { file: 'attach-file', source: 'attach-source', licence: 'attach-licence' };

const LICENCES: readonly { value: Licence; label: string; hint: string }[] = [
  {
    value: 'office-only',
    label: 'It stays in the office',
    hint: 'the usual case for a bought article or book',
  },
  {
    value: 'may-leave',
    label: 'It may leave the office',
    hint: 'own, open or permitted; goes into evidence packs',
  },
];

interface AttachDialogProps {
  sources: readonly Source[];
  onAttach: (document: NewDocument) => Promise<void>;
  onLeave: () => void;
}

/** A file, the source it is of, and whether its licence lets it leave the office. */
export function AttachDialog({ sources, onAttach, onLeave }: AttachDialogProps) {
  const [file, setFile] = useState<File | null>(null);
  const [source, setSource] = useState('0');
  const [licence, setLicence] = useState<Licence | null>(null);
  const form = useFormAct({
    find: () => ({
      file: fileError(file),
      licence: licence === null ? 'Say whether it may leave the office.' : undefined,
    }),
    act: async () => {
      if (file && licence) await onAttach({ file, source: Number(source), licence });
    },
  });
  const { errors } = form;
  return (
    <ActDialog
      title="Attach a document"
      act="Attach it"
      leave="Leave it"
      working={form.working}
      onAct={form.send}
      onLeave={onLeave}
    >
      <FormSummary title="Nothing was attached yet" form={form} ids={IDS} />
      <Field
        id={IDS.file}
        label="File"
        hint="A PDF, a PNG or a JPEG of at most 15 MB. It is looked into, and kept with its hash."
        error={errors['file']}
      >
        <input
          id={IDS.file}
          type="file"
          className="file-input"
          accept=".pdf,.png,.jpg,.jpeg,application/pdf,image/png,image/jpeg"
          onChange={(event) => setFile(event.target.files?.[0] ?? null)}
          {...describedBy(IDS.file, { error: errors['file'], hint: true })}
        />
      </Field>
      {sources.length > 1 ? (
        <ChoiceField
          id={IDS.source}
          label="Of the source"
          value={source}
          choices={sources.map(({ csl }, i) => ({ value: String(i), label: formatCitation(csl).text }))}
          error={errors['source']}
          onChange={setSource}
        />
      ) : null}
      <ChoiceList
        id={IDS.licence}
        legend="By its licence"
        choices={LICENCES}
        value={licence}
        error={errors['licence']}
        onChange={setLicence}
      />
    </ActDialog>
  );
}
