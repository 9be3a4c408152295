import { useEffect, useId, useState } from 'react';
import type { CorrelationPage, FacetCount } from '../../../shared/api/types';
import { ChoiceField, type Choice } from '../../../shared/ui/fields/choice-field';
import { Field } from '../../../shared/ui/fields/field';
import { TextInput } from '../../../shared/ui/fields/text-input';
import { readFilters, type RegisterFilters } from '../model/register-filters';

interface RegisterFiltersFormProps {
  filters: RegisterFilters;
  facets: CorrelationPage['facets'] | undefined;
  onChange: (filters: RegisterFilters) => void;
}

/** Search words at once as they are typed, three choices with the number of sheets behind each. */
export function RegisterFiltersForm({ filters, facets, onChange }: RegisterFiltersFormProps) {
  const choose = (name: 'geometry' | 'phase' | 'standing') => (value: string) =>
    onChange(readFilters(new URLSearchParams({ ...filters, [name]: value })));
  return (
    <form className="register-filters" role="search" onSubmit={(event) => event.preventDefault()}>
      <SearchField q={filters.q} onSearch={(q) => onChange({ ...filters, q })} />
      <ChoiceField
        label="Geometry"
        value={filters.geometry}
        choices={choices(facets?.geometry, filters.geometry)}
        onChange={choose('geometry')}
      />
      <ChoiceField
        label="Phase"
        value={filters.phase}
        choices={choices(facets?.phase, filters.phase)}
        onChange={choose('phase')}
      />
      <ChoiceField
        label="Standing"
        value={filters.standing}
        choices={choices(facets?.standing, filters.standing)}
        onChange={choose('standing')}
      />
    </form>
  );
}

/** A chosen value stays in the list even where nothing is left behind it. */
function choices(counts: readonly FacetCount[] | undefined, chosen: string): Choice[] {
  const listed = (counts ?? [])
    .filter(({ count, value }) => count > 0 || value === chosen)
    .map(({ value, label, count }) => ({ value, label: `${label} (${count})` }));
  if (chosen && !listed.some(({ value }) => value === chosen))
    listed.unshift({ value: chosen, label: chosen.replaceAll('-', ' ') });
  return [{ value: '', label: 'any' }, ...listed];
}

const PAUSE = 250;

function SearchField({ q, onSearch }: { q: string; onSearch: (q: string) => void }) {
  const id = useId();
  const [typed, setTyped] = useState(q);
  const [known, setKnown] = useState(q);
  // The address bar may change under the field: back button, cleared filters.
  if (known !== q) {
    setKnown(q);
    if (typed.trim() !== q.trim()) setTyped(q);
  }

  useEffect(() => {
    if (typed.trim() === q.trim()) return;
    const timer = setTimeout(() => onSearch(typed), PAUSE);
    return () => clearTimeout(timer);
  }, [typed, q, onSearch]);

  return (
    <Field id={id} label="Search words, authors, symbols">
      <TextInput
        id={id}
        type="search"
        value={typed}
        maxLength={200}
        autoComplete="off"
        onChange={setTyped}
        onKeyDown={(event) => {
          if (event.key === 'Enter') onSearch(typed);
        }}
      />
    </Field>
  );
}
