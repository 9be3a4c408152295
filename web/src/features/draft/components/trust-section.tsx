import { memo } from 'react';
import { STATISTICS } from '../model/choices';
import type { AccuracyForm, SentenceRow } from '../model/draft-form';
import { useDraftTools } from './draft-context';
import { DraftSection } from './draft-section';
import { LongTextField } from './fields/long-text-field';
import { PickField } from './fields/pick-field';
import { TextField } from './fields/text-field';
import { TickField } from './fields/tick-field';
import { RowList } from './row-list';

interface TrustSectionProps {
  accuracy: AccuracyForm;
  restrictions: readonly SentenceRow[];
  cautions: readonly SentenceRow[];
}

/** How far the numbers can be trusted, for what only, and what people slip on. */
export const TrustSection = memo(function TrustSection(props: TrustSectionProps) {
  const { accuracy, restrictions, cautions } = props;
  return (
    <DraftSection section="trust">
      <AccuracyFields accuracy={accuracy} />
      <h3 className="draft-subheading">Only for</h3>
      <RowList list="restrictions" rows={restrictions} noun="restriction" first="">
        {(row, at, path) => (
          <Sentence list="restrictions" row={row} at={at} path={path} label={`Restriction ${at + 1}`} />
        )}
      </RowList>
      <h3 className="draft-subheading">Mind</h3>
      <RowList
        list="cautions"
        rows={cautions}
        noun="caution"
        first=""
        empty="Where books differ, which length or velocity is easily mixed up, and hazards of the substances: exposure limits and ignition under local rules."
      >
        {(row, at, path) => (
          <Sentence list="cautions" row={row} at={at} path={path} label={`Caution ${at + 1}`} />
        )}
      </RowList>
    </DraftSection>
  );
});

function AccuracyFields({ accuracy }: { accuracy: AccuracyForm }) {
  const { change } = useDraftTools();
  const edit = (patch: Partial<AccuracyForm>) => change({ do: 'edit-accuracy', patch });
  return (
    <>
      <TickField
        path="accuracy.present"
        label="An accuracy is on record"
        checked={accuracy.present}
        onChange={(present) => edit({ present })}
      />
      {accuracy.present ? (
        <>
          <div className="draft-grid">
            <TextField
              path="accuracy.valuePercent"
              label="Figure, ± % (optional)"
              value={accuracy.valuePercent}
              onChange={(valuePercent) => edit({ valuePercent })}
              number
            />
            <PickField
              path="accuracy.statistic"
              label="As what statistic"
              value={accuracy.statistic}
              choices={STATISTICS}
              onChange={(statistic) => edit({ statistic })}
            />
          </div>
          <TextField
            path="accuracy.of"
            label="Of what (optional)"
            value={accuracy.of}
            onChange={(of) => edit({ of })}
            hint="Sh, against the data of the authors."
          />
          <LongTextField
            path="accuracy.text"
            label="In words"
            value={accuracy.text}
            onChange={(text) => edit({ text })}
          />
        </>
      ) : null}
    </>
  );
}

interface SentenceProps {
  list: 'restrictions' | 'cautions';
  row: SentenceRow;
  at: number;
  path: string;
  label: string;
}

const Sentence = memo(function Sentence({ list, row, at, path, label }: SentenceProps) {
  const { change } = useDraftTools();
  return (
    <LongTextField
      path={path}
      label={label}
      value={row.text}
      onChange={(text) => change({ do: 'edit-row', list, at, patch: { text } })}
    />
  );
});
