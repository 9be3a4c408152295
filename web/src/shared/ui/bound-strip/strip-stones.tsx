import type { StripStone } from '@merestone/engine';
import type { StripMeasures } from './strip-measures';

interface StripStonesProps {
  stones: readonly StripStone[];
  measures: StripMeasures;
}

/** A small upright stone at each limit; a limit beyond the axis is an arrow head at the edge instead. */
export function StripStones({ stones, measures }: StripStonesProps) {
  const { x, ground, stone, width } = measures;
  return stones.map(({ at, value, side, offAxis }) =>
    offAxis ? (
      <path
        key={`${side}${value}`}
        className="strip-off-axis"
        d={at < 0.5 ? `M6 ${ground - 4}L1.5 ${ground}L6 ${ground + 4}` : edgeArrow(width, ground)}
      />
    ) : (
      <path key={`${side}${value}`} className="strip-stone" d={stonePath(x(at), ground + 1.5, stone)} />
    ),
  );
}

function edgeArrow(width: number, ground: number): string {
  return `M${width - 6} ${ground - 4}L${width - 1.5} ${ground}L${width - 6} ${ground + 4}`;
}

/** Straight flanks that lean in a little, under a rounded head. */
function stonePath(
  middle: number,
  foot: number,
  { width, height }: { width: number; height: number },
): string {
  const half = width / 2;
  const shoulder = half * 0.86;
  const top = foot - height;
  return [
    `M${middle - half} ${foot}`,
    `L${middle - shoulder} ${top + shoulder}`,
    `A${shoulder} ${shoulder} 0 0 1 ${middle + shoulder} ${top + shoulder}`,
    `L${middle + half} ${foot}Z`,
  ].join('');
}
