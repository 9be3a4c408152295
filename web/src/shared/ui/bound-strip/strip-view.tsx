import { stripGeometry, type StripAxis, type StripGeometry, type Stretch } from '@merestone/engine';
import { carvedLabels } from './carved-labels';
import { FigureLabels } from './figure-labels';
import { PlumbLine } from './plumb-line';
import { measuresOf, type StripSize } from './strip-measures';
import { stripText, type Reading } from './strip-words';
import { StripRuns } from './strip-runs';
import { StripStones } from './strip-stones';
import './strip-view.css';

export interface StripViewProps {
  stretches: readonly Stretch[];
  /** What the strip is about, in words: begins the text alternative. */
  label: string;
  /** Unit of limits and value. */
  unit?: string;
  /** The present value as held against the bound; none draws no plumb line. */
  reading?: Reading | null;
  size: StripSize;
  /** Width in pixels. */
  width: number;
  /** Fix the axis so that several strips can be compared. */
  axis?: StripAxis;
}

/** The picture of a bound: ground line, thick permitted stretch, a stone at each limit, a plumb line at the value. */
export function StripView({
  stretches,
  label,
  unit = '1',
  reading = null,
  size,
  width,
  axis,
}: StripViewProps) {
  const measures = measuresOf(size, width);
  const geometry = stripGeometry({
    stretches,
    value: reading?.value ?? null,
    ...(reading ? { state: reading.kind } : {}),
    ...(axis ? { axis } : {}),
  });
  const large = size === 'large';
  const labels = large ? carvedLabels(geometry.stones, unit, measures) : [];
  const rows = Math.max(1, ...labels.map((label) => label.row + 1));
  const height = measures.height + (rows - 1) * measures.labelRow;
  return (
    <svg
      className={`strip strip-${size}`}
      width={width}
      height={height}
      viewBox={`0 0 ${width} ${height}`}
      role="img"
      aria-label={stripText(label, stretches, unit, reading)}
    >
      {large || axis ? <Decades decades={geometry.decades} measures={measures} /> : null}
      <StripRuns runs={geometry.runs} measures={measures} />
      <StripStones stones={geometry.stones} measures={measures} />
      <FigureLabels labels={labels} measures={measures} />
      {geometry.plumb ? (
        <PlumbLine plumb={geometry.plumb} value={reading?.value ?? null} unit={unit} measures={measures} />
      ) : null}
    </svg>
  );
}

interface DecadesProps {
  decades: StripGeometry['decades'];
  measures: ReturnType<typeof measuresOf>;
}

/** Powers of ten as faint ticks under the ground. */
function Decades({ decades, measures: { x, ground } }: DecadesProps) {
  if (decades.length > 16) return null;
  return decades.map(({ at, exponent }) => (
    <line key={exponent} className="strip-decade" x1={x(at)} x2={x(at)} y1={ground} y2={ground + 3.5} />
  ));
}
