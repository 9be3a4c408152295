import { Button } from 'antd';
import { Link } from 'react-router-dom';
import { paths } from '../../../shared/paths';
import { EmptyState } from '../../../shared/ui/empty-state';
import { Loading } from '../../../shared/ui/loading';
import { ProblemNotice } from '../../../shared/ui/problem-notice';
import { useRegister } from '../api/use-register';
import { NO_FILTERS, isFiltered, type RegisterFilters } from '../model/register-filters';
import { MoreCorrelations } from './more-correlations';
import { RegisterFiltersForm } from './register-filters-form';
import { RegisterTable } from './register-table';
import './register.css';

interface RegisterViewProps {
  filters: RegisterFilters;
  onChange: (filters: RegisterFilters) => void;
}

/** Search, what it leaves, and more of it on request. */
export function RegisterView({ filters, onChange }: RegisterViewProps) {
  const register = useRegister(filters);
  const { items, total, problem } = register;
  return (
    <>
      <RegisterFiltersForm filters={filters} facets={register.facets} onChange={onChange} />
      <div className="register-count">
        <p role="status">{items && !register.fetching ? countWords(total, isFiltered(filters)) : ''}</p>
        {isFiltered(filters) ? (
          <Button type="link" size="small" onClick={() => onChange(NO_FILTERS)}>
            Show the whole register
          </Button>
        ) : null}
      </div>
      {problem ? <ProblemNotice problem={problem} onRetry={register.retry} /> : null}
      {!items && !problem ? <Loading what="the register" /> : null}
      {items?.length === 0 && !register.fetching ? <NothingFound filtered={isFiltered(filters)} /> : null}
      {items && items.length > 0 ? (
        <RegisterTable items={items} stale={register.fetching && !register.fetchingMore} />
      ) : null}
      <MoreCorrelations register={register} />
    </>
  );
}

function countWords(total: number, filtered: boolean): string {
  const correlations = `${total} ${total === 1 ? 'correlation' : 'correlations'}`;
  return filtered ? `${correlations} found.` : `${correlations}.`;
}

function NothingFound({ filtered }: { filtered: boolean }) {
  if (!filtered)
    return (
      <EmptyState title="The register is empty">
        <p>
          Correlations of this office would be listed here, each with its geometry, its bounds and its
          standing.
        </p>
      </EmptyState>
    );
  return (
    <EmptyState title="No correlation fits all of this">
      <p>
        Try fewer words, or another geometry. The <Link to={paths.geometries}>list of geometries</Link> says
        what each one means here.
      </p>
    </EmptyState>
  );
}
