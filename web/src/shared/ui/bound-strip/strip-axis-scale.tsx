import { stripGeometry, type StripAxis } from '@merestone/engine';
import { superscript } from '../../format/format-number';
import { measuresOf } from './strip-measures';
import { useElementWidth } from './use-element-width';

interface StripAxisScaleProps {
  axis: StripAxis;
  /** Powers of ten that carry a label. */
  labelled: readonly number[];
}

/** The scale over a column of small strips that share one axis. */
export function StripAxisScale({ axis, labelled }: StripAxisScaleProps) {
  const [box, width] = useElementWidth<HTMLSpanElement>(210);
  const { x } = measuresOf('small', width);
  const { decades } = stripGeometry({ stretches: [], axis });
  const ends = `from 10${superscript(Math.round(Math.log10(axis.from)))} to 10${superscript(Math.round(Math.log10(axis.to)))}`;
  return (
    <span ref={box} className="strip-scale">
      <svg
        className="strip"
        width={width}
        height={18}
        viewBox={`0 0 ${width} 18`}
        role="img"
        aria-label={ends}
      >
        {decades.map(({ at, exponent }) =>
          labelled.includes(exponent) ? (
            <g key={exponent}>
              <line className="strip-decade" x1={x(at)} x2={x(at)} y1={14} y2={18} />
              <text className="strip-scale-figure" x={x(at)} y={11} fontSize={12} textAnchor={anchor(at)}>
                {exponent === 0 ? '1' : `10${superscript(exponent)}`}
              </text>
            </g>
          ) : null,
        )}
      </svg>
    </span>
  );
}

/** Labels at the ends stay inside. */
function anchor(at: number): 'start' | 'middle' | 'end' {
  if (at < 0.03) return 'start';
  return at > 0.97 ? 'end' : 'middle';
}
