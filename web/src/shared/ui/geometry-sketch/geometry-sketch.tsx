import { createElement } from 'react';
import { sketchOf } from './sketch-of';
import { Flows, Surface } from './strokes';
import './geometry-sketch.css';

interface GeometrySketchProps {
  slug: string;
  /** Name of the geometry, for the text alternative. */
  name: string;
  /** The name stands right beside it: the drawing then needs no words of its own. */
  decorative?: boolean;
}

/** A line drawing of what a correlation was measured on: flow by arrows, the characteristic length by its symbol. */
export function GeometrySketch({ slug, name, decorative = false }: GeometrySketchProps) {
  const words = decorative
    ? { 'aria-hidden': true as const }
    : { role: 'img', 'aria-label': `Sketch: ${name}` };
  return (
    <svg className="sketch" viewBox="0 0 240 150" {...words}>
      {createElement(sketchOf(slug) ?? Plain)}
    </svg>
  );
}

/** A surface and a stream: all that is known of a geometry without a drawing. */
function Plain() {
  return (
    <>
      <Flows from={[56, 46]} to={[120, 46]} step={[0, 24]} count={2} />
      <Surface from={[40, 104]} to={[200, 104]} side="right" />
    </>
  );
}
