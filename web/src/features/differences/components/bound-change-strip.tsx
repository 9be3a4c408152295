import { stripGeometry, type Stretch, type StripRun, type StripStone } from '@merestone/engine';
import { carvedLabels } from '../../../shared/ui/bound-strip/carved-labels';
import { FigureLabels } from '../../../shared/ui/bound-strip/figure-labels';
import { measuresOf, type StripMeasures } from '../../../shared/ui/bound-strip/strip-measures';
import { StripRuns } from '../../../shared/ui/bound-strip/strip-runs';
import { StripStones } from '../../../shared/ui/bound-strip/strip-stones';
import { rangeWords } from '../../../shared/ui/bound-strip/strip-words';
import '../../../shared/ui/bound-strip/strip-view.css';
import './bound-change-strip.css';

interface BoundChangeStripProps {
  /** What it is about, in words: begins the text alternative. */
  label: string;
  before: readonly Stretch[];
  after: readonly Stretch[];
  unit: string;
  width: number;
}

/** Two ranges of one symbol on one axis: before as an outline with its figures above, after solid with its stones. */
export function BoundChangeStrip({ label, before, after, unit, width }: BoundChangeStripProps) {
  const { axis } = stripGeometry({ stretches: inOrder([...before, ...after]) });
  const [was, is] = [stripGeometry({ stretches: before, axis }), stripGeometry({ stretches: after, axis })];
  const plain = measuresOf('large', width);
  const above = carvedLabels(was.stones, unit, plain);
  const rowsAbove = rowsOf(above);
  const measures: StripMeasures = { ...plain, ground: plain.ground + (rowsAbove - 1) * plain.labelRow };
  const below = carvedLabels(is.stones, unit, measures);
  const height = measures.ground + 21 + (rowsOf(below) - 1) * measures.labelRow;
  return (
    <svg
      className="strip strip-large"
      width={width}
      height={height}
      viewBox={`0 0 ${width} ${height}`}
      role="img"
      aria-label={`${label}. Before: ${rangeWords(before, unit)}. After: ${rangeWords(after, unit)}.`}
    >
      <StripRuns runs={is.runs} measures={measures} />
      <Before runs={was.runs} stones={was.stones} measures={measures} />
      <StripStones stones={is.stones} measures={measures} />
      <FigureLabels labels={below} measures={measures} />
      {above.map(({ text, at, row, stoneAt }) => (
        <text
          key={`${stoneAt}${text}`}
          className="strip-figure-before"
          x={at}
          y={12 + row * measures.labelRow}
          fontSize={measures.figure}
          textAnchor="middle"
        >
          {text}
        </text>
      ))}
    </svg>
  );
}

function inOrder(stretches: readonly Stretch[]): Stretch[] {
  const start = ({ lo }: Stretch) => lo?.value ?? -Infinity;
  const end = ({ hi }: Stretch) => hi?.value ?? Infinity;
  return [...stretches].sort((a, b) => start(a) - start(b) || end(a) - end(b));
}

function rowsOf(labels: readonly { row: number }[]): number {
  return Math.max(1, ...labels.map(({ row }) => row + 1));
}

interface BeforeProps {
  runs: readonly StripRun[];
  stones: readonly StripStone[];
  measures: StripMeasures;
}

const HALF = 5;

/** The earlier range as a thin outline about the ground line, with a mark up to the figure at each limit. */
function Before({ runs, stones, measures: { x, ground } }: BeforeProps) {
  return (
    <>
      {runs.map(({ kind, from, to }) =>
        kind === 'permitted' ? (
          <rect
            key={from}
            className="strip-before"
            x={x(from)}
            y={ground - HALF}
            width={Math.max(1, x(to) - x(from))}
            height={2 * HALF}
          />
        ) : null,
      )}
      {stones.map(({ at, value, side }) => (
        <line
          key={`${side}${value}`}
          className="strip-before"
          x1={x(at)}
          x2={x(at)}
          y1={ground - HALF}
          y2={ground - 26}
        />
      ))}
    </>
  );
}
