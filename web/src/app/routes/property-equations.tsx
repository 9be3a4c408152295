import { usePropertyEquations } from '../../features/property-equations/api/use-property-equations';
import { PropertyEquationList } from '../../features/property-equations/components/property-equation-list';
import { EmptyState } from '../../shared/ui/empty-state';
import { Loading } from '../../shared/ui/loading';
import { MarginNote } from '../../shared/ui/margin-note';
import { ProblemNotice } from '../../shared/ui/problem-notice';
import { SheetPage } from '../../shared/ui/sheet-page';

export function PropertyEquationsRoute() {
  const { equations, problem, retry } = usePropertyEquations();
  return (
    <SheetPage
      title="Property equations"
      subtitle="Published equations for fluid properties, for what a duty does not state."
      wide
      margin={
        <MarginNote title="When they are used">
          Only where a sheet names them and you choose one. The value then says which equation gave it, and
          the equation’s own bounds hold for it too.
        </MarginNote>
      }
    >
      {problem ? <ProblemNotice problem={problem} onRetry={retry} /> : null}
      {!equations && !problem ? <Loading what="the property equations" /> : null}
      {equations?.length === 0 ? (
        <EmptyState title="No property equation is kept yet">
          <p>
            Densities, viscosities and diffusivities would be listed here, each with its range and its source.
          </p>
        </EmptyState>
      ) : null}
      {equations && equations.length > 0 ? <PropertyEquationList equations={equations} /> : null}
    </SheetPage>
  );
}
