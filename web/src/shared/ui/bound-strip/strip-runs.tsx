import type { StripRun } from '@merestone/engine';
import type { StripMeasures } from './strip-measures';

interface StripRunsProps {
  runs: readonly StripRun[];
  measures: StripMeasures;
}

/** Ground thin, permitted stretch thick, open sides dotted, what lies past a stone hatched. */
export function StripRuns({ runs, measures }: StripRunsProps) {
  return runs.map((run) => {
    const key = `${run.kind}${run.from}`;
    const x1 = measures.x(run.from);
    const x2 = measures.x(run.to);
    if (run.kind === 'hatched') return <Hatching key={key} x1={x1} x2={x2} measures={measures} />;
    return (
      <line
        key={key}
        className={`strip-run strip-${run.kind}`}
        // The axis ends half a stone inside the picture; its outermost ground does not.
        x1={run.from === 0 ? 1 : x1}
        x2={run.to === 1 ? measures.width - 1 : x2}
        y1={measures.ground}
        y2={measures.ground}
      />
    );
  });
}

const SPACING = 5;
const SLANT = 6;

function Hatching({
  x1,
  x2,
  measures: { ground, size },
}: {
  x1: number;
  x2: number;
  measures: StripMeasures;
}) {
  const height = size === 'large' ? 9 : 6;
  const count = Math.max(1, Math.floor((x2 - x1 - SLANT) / SPACING) + 1);
  const left = x1 + Math.max(0, x2 - x1 - SLANT - (count - 1) * SPACING) / 2;
  return (
    <g className="strip-hatched">
      {Array.from({ length: count }, (_, index) => (
        <line
          key={index}
          x1={left + index * SPACING}
          y1={ground}
          x2={Math.min(left + index * SPACING + SLANT, Math.max(x2, left + 1))}
          y2={ground - height}
        />
      ))}
    </g>
  );
}
