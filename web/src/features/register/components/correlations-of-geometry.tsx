import { EmptyState } from '../../../shared/ui/empty-state';
import { Loading } from '../../../shared/ui/loading';
import { ProblemNotice } from '../../../shared/ui/problem-notice';
import { useRegister } from '../api/use-register';
import { NO_FILTERS } from '../model/register-filters';
import { MoreCorrelations } from './more-correlations';
import { RegisterTable } from './register-table';
import './register.css';

/** The register's rows for one geometry. */
export function CorrelationsOfGeometry({ slug }: { slug: string }) {
  const register = useRegister({ ...NO_FILTERS, geometry: slug });
  if (register.problem) return <ProblemNotice problem={register.problem} onRetry={register.retry} />;
  if (!register.items) return <Loading what="its correlations" />;
  if (register.items.length === 0)
    return (
      <EmptyState title="No correlation of this geometry is registered yet">
        <p>Sheets that were measured on it would be listed here with their bounds.</p>
      </EmptyState>
    );
  return (
    <>
      <RegisterTable items={register.items} stale={false} withGeometry={false} />
      <MoreCorrelations register={register} />
    </>
  );
}
