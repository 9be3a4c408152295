import type { CarvedLabel } from './carved-labels';
import type { StripMeasures } from './strip-measures';

interface FigureLabelsProps {
  labels: readonly CarvedLabel[];
  measures: StripMeasures;
}

/** The limits' values under their stones; one that had to move has a fine line back to its stone. */
export function FigureLabels({ labels, measures: { ground, figure, labelRow } }: FigureLabelsProps) {
  return labels.map(({ text, at, row, stoneAt }) => {
    const baseline = ground + 17 + row * labelRow;
    const moved = row > 0 || Math.abs(at - stoneAt) > 7;
    return (
      <g key={`${stoneAt}${text}`}>
        {moved ? (
          <path
            className="strip-leader"
            d={`M${stoneAt} ${ground + 2.5}L${at} ${baseline - figure * 0.72}`}
          />
        ) : null}
        <text className="strip-figure" x={at} y={baseline} fontSize={figure} textAnchor="middle">
          {text}
        </text>
      </g>
    );
  });
}
