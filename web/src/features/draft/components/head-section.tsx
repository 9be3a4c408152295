import { memo } from 'react';
import { AVERAGING, DRIVING_FORCES, PHASES, PROPERTY_STATES, WALLS } from '../model/choices';
import type { DraftHead } from '../model/draft-form';
import { draftFieldId } from '../model/field-id';
import { useDraftTools } from './draft-context';
import { DraftSection } from './draft-section';
import { LongTextField } from './fields/long-text-field';
import { PickField } from './fields/pick-field';
import { SearchField } from './fields/search-field';
import { TextField } from './fields/text-field';

interface HeadSectionProps {
  head: DraftHead;
  slug: string;
  /** Whether name and geometry are settled, because the register has the sheet. */
  settled: boolean;
}

/** What the correlation is: title, authors, and what exactly was measured. */
export const HeadSection = memo(function HeadSection({ head, slug, settled }: HeadSectionProps) {
  const { change, geometries, problemAt } = useDraftTools();
  const edit = (member: keyof DraftHead) => (value: string) =>
    change({ do: 'edit-head', patch: { [member]: value } });
  return (
    <DraftSection section="head">
      <TextField
        path="title"
        label="Title"
        value={head.title}
        onChange={edit('title')}
        hint="What it gives and on what, with the authors where several are in use: Turbulent pipe flow (Linton and Sherwood)."
      />
      <TextField
        path="slug"
        label="Name in the register"
        value={slug}
        onChange={(name) => change({ do: 'name-slug', slug: name })}
        disabled={settled}
        code
        hint={
          settled
            ? 'The register knows the sheet by this name; it stays.'
            : 'Made from the title until you write your own. It is final once the sheet is entered in the register.'
        }
      />
      <div className="draft-grid draft-grid-wide">
        <TextField
          path="authors"
          label="Authors"
          value={head.authors}
          onChange={edit('authors')}
          hint="Surnames, separated by commas."
        />
        <TextField
          path="year"
          label="Year (optional)"
          value={head.year}
          onChange={edit('year')}
          number
          hint="Of the publication."
        />
      </div>
      <div className="draft-grid">
        {settled ? (
          <PickField
            path="geometry"
            label="Geometry"
            value={head.geometry}
            choices={geometries.map(({ slug: value, name }) => ({ value, label: name }))}
            onChange={edit('geometry')}
            disabled
            hint="A correlation keeps its geometry."
          />
        ) : (
          <SearchField
            id={draftFieldId('geometry')}
            label="Geometry"
            value={head.geometry}
            choices={geometries.map(({ slug: value, name, characteristicLength, velocity }) => ({
              value,
              label: name,
              detail: `${characteristicLength}; ${velocity}`,
            }))}
            onChoose={edit('geometry')}
            error={problemAt('geometry')?.message}
            hint="Type words of it; arrow keys choose."
          />
        )}
        <PickField path="phase" label="Phase" value={head.phase} choices={PHASES} onChange={edit('phase')} />
      </div>
      <LongTextField
        path="summary"
        label="Summary"
        value={head.summary}
        onChange={edit('summary')}
        rows={3}
        hint="What exactly was measured: flow direction, condition at the boundary, which side, mean or local."
      />
      <div className="draft-grid">
        <PickField
          path="averaging"
          label="Averaging"
          value={head.averaging}
          choices={AVERAGING}
          onChange={edit('averaging')}
        />
        <PickField
          path="wall"
          label="Condition at the wall"
          value={head.wall}
          choices={WALLS}
          onChange={edit('wall')}
        />
        <PickField
          path="drivingForce"
          label="Driving force of the data"
          value={head.drivingForce}
          choices={DRIVING_FORCES}
          onChange={edit('drivingForce')}
          hint="What the authors reduced their data with."
        />
        <PickField
          path="propertyState"
          label="Properties are taken at"
          value={head.propertyState}
          choices={PROPERTY_STATES}
          onChange={edit('propertyState')}
        />
      </div>
    </DraftSection>
  );
});
