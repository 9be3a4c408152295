import { useState } from 'react';
import type { Withdrawal } from '../../../shared/api/types';
import { ReasonDialog } from '../../../shared/form/reason-dialog';
import { authorWords } from '../../../shared/format/author-words';
import { ChoiceField } from '../../../shared/ui/fields/choice-field';
import { ChoiceList } from '../../../shared/ui/fields/choice-list';
import { withdraw, type RevisionKey } from '../api/review-calls';
import { useSheetsOfGeometry } from '../api/use-sheets-of-geometry';

interface WithdrawDialogProps {
  revisionKey: RevisionKey;
  geometry: string;
  onDone: () => Promise<void>;
  onClose: () => void;
}

type WithdrawalClass = Withdrawal['class'];

const CLASS = 'withdrawal-class';
const CLASSES: readonly { value: WithdrawalClass; label: string; hint: string }[] = [
  { value: 'error-in-sheet', label: 'Error in the sheet', hint: 'The source is right, the sheet is not.' },
  {
    value: 'error-in-source',
    label: 'Error in the source',
    hint: 'The published equation or range is wrong.',
  },
  { value: 'unsafe', label: 'Unsafe', hint: 'A design made with it may do harm.' },
];

/** Takes a revision out of use for good: reason, class, and what to use in its place. */
export function WithdrawDialog({ revisionKey, geometry, onDone, onClose }: WithdrawDialogProps) {
  const { slug, revision } = revisionKey;
  const [kind, setKind] = useState<WithdrawalClass | null>(null);
  const [missing, setMissing] = useState(false);
  const [successor, setSuccessor] = useState('');
  const others = useSheetsOfGeometry(geometry).filter((sheet) => sheet.slug !== slug);
  const lacking = kind === null ? 'Choose what is wrong.' : undefined;
  return (
    <ReasonDialog
      about={`withdrawal:${slug}/${revision}`}
      title={`Withdraw revision ${revision}`}
      act={`Withdraw revision ${revision}`}
      notDone="Nothing is withdrawn yet"
      ids={{ class: CLASS }}
      alsoFind={() => {
        setMissing(lacking !== undefined);
        return { class: lacking };
      }}
      onAct={async (reason) => {
        if (kind === null) return;
        await withdraw(revisionKey, { reason, class: kind, ...(successor === '' ? {} : { successor }) });
        await onDone();
      }}
      onLeave={onClose}
    >
      <p>
        Nothing may be checked or issued with it from then on; the sheet says so in large type and serves
        comparison only. <strong>This cannot be undone.</strong>
      </p>
      <ChoiceList
        id={CLASS}
        legend="What is wrong"
        choices={CLASSES}
        value={kind}
        error={missing ? lacking : undefined}
        onChange={setKind}
      />
      <ChoiceField
        label="To be used in its place"
        value={successor}
        choices={[
          { value: '', label: 'nothing is named' },
          ...others.map((sheet) => ({
            value: sheet.slug,
            label: `${authorWords(sheet.authors)}: ${sheet.title}`,
          })),
        ]}
        onChange={setSuccessor}
      />
    </ReasonDialog>
  );
}
