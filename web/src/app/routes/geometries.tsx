import { GeometryIndex } from '../../features/geometries/components/geometry-index';
import { useGeometries } from '../../features/geometries/api/use-geometries';
import { EmptyState } from '../../shared/ui/empty-state';
import { Loading } from '../../shared/ui/loading';
import { ProblemNotice } from '../../shared/ui/problem-notice';
import { SheetPage } from '../../shared/ui/sheet-page';

export function GeometriesRoute() {
  const { geometries, problem, retry } = useGeometries();
  return (
    <SheetPage
      title="Geometries"
      subtitle="What a correlation was measured on, with the length and the velocity that belong to it."
      wide
    >
      {problem ? <ProblemNotice problem={problem} onRetry={retry} /> : null}
      {!geometries && !problem ? <Loading what="the geometries" /> : null}
      {geometries?.length === 0 ? (
        <EmptyState title="No geometry is described yet">
          <p>Each would stand here with its sketch. They come with the library of the office.</p>
        </EmptyState>
      ) : null}
      {geometries && geometries.length > 0 ? <GeometryIndex geometries={geometries} /> : null}
    </SheetPage>
  );
}
