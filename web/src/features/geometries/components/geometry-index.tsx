import { Link } from 'react-router-dom';
import type { Geometry } from '../../../shared/api/types';
import { paths } from '../../../shared/paths';
import { GeometrySketch } from '../../../shared/ui/geometry-sketch/geometry-sketch';
import './geometries.css';

/** All geometries by their sketches, those with correlations first. */
export function GeometryIndex({ geometries }: { geometries: readonly Geometry[] }) {
  const used = geometries.filter(({ total }) => total > 0);
  const unused = geometries.filter(({ total }) => total === 0);
  return (
    <>
      <GeometryGrid geometries={used} />
      {unused.length > 0 ? (
        <section aria-labelledby="geometries-unused">
          <h2 id="geometries-unused">Described, but without a correlation yet</h2>
          <GeometryGrid geometries={unused} />
        </section>
      ) : null}
    </>
  );
}

function GeometryGrid({ geometries }: { geometries: readonly Geometry[] }) {
  return (
    <ul className="geometry-grid">
      {geometries.map((geometry) => (
        <li key={geometry.slug}>
          <GeometrySketch slug={geometry.slug} name={geometry.name} decorative />
          <Link to={paths.geometry(geometry.slug)}>{geometry.name}</Link>
          <p>{countWords(geometry)}</p>
        </li>
      ))}
    </ul>
  );
}

/** `4 correlations, 2 approved`. */
export function countWords({ total, approved }: Pick<Geometry, 'total' | 'approved'>): string {
  if (total === 0) return 'no correlation yet';
  const correlations = `${total} ${total === 1 ? 'correlation' : 'correlations'}`;
  if (approved === total) return `${correlations}, ${total === 1 ? 'approved' : 'all approved'}`;
  if (approved === 0) return `${correlations}, ${total === 1 ? 'not approved' : 'none approved'}`;
  return `${correlations}, ${approved} approved`;
}
