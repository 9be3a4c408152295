import { Link, useParams } from 'react-router-dom';
import { useGeometries } from '../../features/geometries/api/use-geometries';
import { GeometryPage } from '../../features/geometries/components/geometry-page';
import { CorrelationsOfGeometry } from '../../features/register/components/correlations-of-geometry';
import { paths } from '../../shared/paths';
import { Loading } from '../../shared/ui/loading';
import { ProblemNotice } from '../../shared/ui/problem-notice';
import { SheetPage } from '../../shared/ui/sheet-page';

export function GeometryRoute() {
  const { slug = '' } = useParams();
  const { geometries, problem, retry } = useGeometries();
  const geometry = geometries?.find((candidate) => candidate.slug === slug);
  if (geometry)
    return (
      <GeometryPage geometry={geometry}>
        <CorrelationsOfGeometry slug={geometry.slug} />
      </GeometryPage>
    );
  return (
    <SheetPage title={geometries ? 'No such geometry' : 'Geometry'}>
      {problem ? <ProblemNotice problem={problem} onRetry={retry} /> : null}
      {!geometries && !problem ? <Loading what="the geometry" /> : null}
      {geometries ? (
        <p>
          This office describes no geometry under that name.{' '}
          <Link to={paths.geometries}>See all geometries</Link>.
        </p>
      ) : null}
    </SheetPage>
  );
}
