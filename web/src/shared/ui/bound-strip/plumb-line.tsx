import type { StripGeometry } from '@merestone/engine';
import type { StripMeasures } from './strip-measures';
import { withUnit } from './strip-words';
import { textWidth } from './text-width';

interface PlumbLineProps {
  plumb: NonNullable<StripGeometry['plumb']>;
  value: number | null;
  unit: string;
  measures: StripMeasures;
}

/** A cord and a bob over the present value, its figure above; a value beyond the axis points off the edge. */
export function PlumbLine({ plumb, value, unit, measures }: PlumbLineProps) {
  const { ground, size, figure, width } = measures;
  const large = size === 'large';
  const at = measures.x(plumb.at);
  const text = large && value !== null ? withUnit(value, unit, 4) : null;
  const room = text === null ? 0 : textWidth(text, figure) + 7;
  const left = at + room > width;
  const bob = large ? { half: 3.5, height: 9 } : { half: 2.75, height: 7 };
  const tip = ground - (large ? 1.5 : 1);
  return (
    <g className={`strip-plumb strip-plumb-${plumb.state}`}>
      <line x1={at} x2={at} y1={large ? 4 : 1} y2={tip - bob.height + 1} />
      {plumb.offAxis ? (
        <path d={outward(plumb.at < 0.5 ? -1 : 1, at, ground)} />
      ) : (
        <path d={bobPath(at, tip, bob)} />
      )}
      {text === null ? null : (
        <text x={left ? at - 6 : at + 6} y={14} fontSize={figure} textAnchor={left ? 'end' : 'start'}>
          {text}
        </text>
      )}
    </g>
  );
}

/** A small drop that hangs point down. */
function bobPath(at: number, tip: number, { half, height }: { half: number; height: number }): string {
  const shoulder = tip - height + half * 0.8;
  return [
    `M${at} ${tip}`,
    `L${at - half} ${shoulder}`,
    `A${half} ${half} 0 0 1 ${at + half} ${shoulder}`,
    `Z`,
  ].join('');
}

function outward(direction: 1 | -1, at: number, ground: number): string {
  const tip = at + direction * 5;
  return `M${tip} ${ground - 8}L${at - direction * 3} ${ground - 12}L${at - direction * 3} ${ground - 4}Z`;
}
