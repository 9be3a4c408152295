import { memo } from 'react';
import { VERIFICATIONS } from '../model/choices';
import type { DraftForm } from '../model/draft-form';
import { useDraftTools } from './draft-context';
import { DraftSection } from './draft-section';
import { LongTextField } from './fields/long-text-field';
import { PickField } from './fields/pick-field';

/** How sure the originator is of what is written here. */
export const VerificationSection = memo(function VerificationSection({
  verification,
}: Pick<DraftForm, 'verification'>) {
  const { change } = useDraftTools();
  return (
    <DraftSection section="verification">
      <PickField
        path="verification.status"
        label="How the expression was verified"
        value={verification.status}
        choices={VERIFICATIONS}
        onChange={(status) => change({ do: 'edit-verification', patch: { status } })}
      />
      <LongTextField
        path="verification.note"
        label="In words"
        value={verification.note}
        onChange={(note) => change({ do: 'edit-verification', patch: { note } })}
        hint="What was held against what, and what could not be."
      />
    </DraftSection>
  );
});
