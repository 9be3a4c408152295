import type { ReactNode } from 'react';
import type { Geometry } from '../../../shared/api/types';
import { GeometrySketch } from '../../../shared/ui/geometry-sketch/geometry-sketch';
import { MarginNote } from '../../../shared/ui/margin-note';
import { SheetPage } from '../../../shared/ui/sheet-page';
import './geometries.css';

interface GeometryPageProps {
  geometry: Geometry;
  /** The correlations measured on it. */
  children: ReactNode;
}

/** What a geometry means here: its sketch, its length, its velocity, and what to mind. */
export function GeometryPage({ geometry, children }: GeometryPageProps) {
  const { slug, name, summary, characteristicLength, velocity, cautions } = geometry;
  return (
    <SheetPage
      title={name}
      subtitle={summary}
      wide
      margin={cautions.map((caution) => (
        <MarginNote key={caution} title="Mind">
          {caution}
        </MarginNote>
      ))}
    >
      <div className="geometry-picture">
        <GeometrySketch slug={slug} name={`${name}, with the flow and the characteristic length`} />
        <dl>
          <dt>Characteristic length</dt>
          <dd>{characteristicLength}</dd>
          <dt>Velocity</dt>
          <dd>{velocity}</dd>
        </dl>
      </div>
      <h2>Correlations</h2>
      {children}
    </SheetPage>
  );
}
