/** The few strokes all sketches are made of. Coordinates are those of a 240 × 150 drawing. */

interface FlowProps {
  from: readonly [number, number];
  to: readonly [number, number];
}

/** An arrow along the flow. */
export function Flow({ from, to }: FlowProps) {
  return (
    <g className="sketch-flow">
      <line x1={from[0]} y1={from[1]} x2={to[0]} y2={to[1]} />
      <path d={headPath(to, Math.atan2(to[1] - from[1], to[0] - from[0]))} />
    </g>
  );
}

/** Several arrows side by side, each moved by `step` from the one before. */
export function Flows({
  from,
  to,
  step,
  count,
}: FlowProps & { step: readonly [number, number]; count: number }) {
  return Array.from({ length: count }, (_, i) => (
    <Flow
      key={i}
      from={[from[0] + i * step[0], from[1] + i * step[1]]}
      to={[to[0] + i * step[0], to[1] + i * step[1]]}
    />
  ));
}

/** A flow along a curve; `tip` and `angle` (degrees, 0 to the right, 90 down) give its head. */
export function CurvedFlow({ d, tip, angle }: { d: string; tip: readonly [number, number]; angle: number }) {
  return (
    <g className="sketch-flow">
      <path d={d} />
      <path d={headPath(tip, (angle * Math.PI) / 180)} />
    </g>
  );
}

/** An open head of 7 by 6. */
function headPath([x, y]: readonly [number, number], angle: number): string {
  const barb = (side: 1 | -1) => {
    const turned = angle + Math.PI - side * 0.42;
    return `${(x + 7 * Math.cos(turned)).toFixed(2)} ${(y + 7 * Math.sin(turned)).toFixed(2)}`;
  };
  return `M${barb(1)}L${x} ${y}L${barb(-1)}`;
}

interface SpanProps {
  from: readonly [number, number];
  to: readonly [number, number];
  /** Symbol of the length, such as `d` or `d_p`; words stand upright. */
  symbol: string;
  /** Where the symbol stands: beside the middle of the span, or at its end where it runs that way. */
  at: 'above' | 'below' | 'left' | 'right';
}

const SHIFT = { above: [0, -6], below: [0, 16], left: [-7, 5], right: [7, 5] } as const;
const ANCHOR = { above: 'middle', below: 'middle', left: 'end', right: 'start' } as const;

/** A length, marked from tick to tick with its symbol. */
export function Span({ from, to, symbol, at }: SpanProps) {
  const length = Math.hypot(to[0] - from[0], to[1] - from[1]);
  const across: [number, number] = [(-(to[1] - from[1]) / length) * 4, ((to[0] - from[0]) / length) * 4];
  const tick = ([x, y]: readonly [number, number]) =>
    `M${x - across[0]} ${y - across[1]}L${x + across[0]} ${y + across[1]}`;
  const [dx, dy] = SHIFT[at];
  const alongX = from[1] === to[1] && (at === 'left' || at === 'right');
  const end = at === 'left' ? Math.min(from[0], to[0]) : Math.max(from[0], to[0]);
  const x = alongX ? end : (from[0] + to[0]) / 2;
  return (
    <g className="sketch-span">
      <path d={`M${from[0]} ${from[1]}L${to[0]} ${to[1]}${tick(from)}${tick(to)}`} />
      <Mark x={x + dx} y={(from[1] + to[1]) / 2 + dy} anchor={ANCHOR[at]}>
        {symbol}
      </Mark>
    </g>
  );
}

interface MarkProps {
  x: number;
  y: number;
  anchor?: 'start' | 'middle' | 'end';
  children: string;
}

/** A symbol, its subscript after an underscore; words with a space stand upright. */
export function Mark({ x, y, anchor = 'middle', children }: MarkProps) {
  const [body = '', subscript] = children.split('_');
  return (
    <text
      className={children.includes(' ') ? 'sketch-words' : 'sketch-symbol'}
      x={x}
      y={y}
      textAnchor={anchor}
    >
      {body}
      {subscript ? (
        <tspan dy={4} fontSize={11}>
          {subscript}
        </tspan>
      ) : null}
    </text>
  );
}

interface HatchProps {
  from: readonly [number, number];
  to: readonly [number, number];
  /** Side the solid lies on, looking from `from` to `to`. */
  side: 'left' | 'right';
}

/** The surface of a solid: a line with short slanting strokes behind it. */
export function Surface({ from, to, side }: HatchProps) {
  const length = Math.hypot(to[0] - from[0], to[1] - from[1]);
  const along: [number, number] = [(to[0] - from[0]) / length, (to[1] - from[1]) / length];
  const turn = side === 'right' ? 1 : -1;
  const behind: [number, number] = [-along[1] * turn, along[0] * turn];
  const count = Math.floor(length / 8);
  const strokes = Array.from({ length: count }, (_, i) => {
    const x = from[0] + along[0] * (i * 8 + 7);
    const y = from[1] + along[1] * (i * 8 + 7);
    return `M${x.toFixed(1)} ${y.toFixed(1)}l${(behind[0] * 6 - along[0] * 5).toFixed(1)} ${(behind[1] * 6 - along[1] * 5).toFixed(1)}`;
  });
  return (
    <>
      <line x1={from[0]} y1={from[1]} x2={to[0]} y2={to[1]} />
      <path className="sketch-hatch" d={strokes.join('')} />
    </>
  );
}

/** Circles of one size. */
export function Circles({ at, r }: { at: readonly (readonly [number, number])[]; r: number }) {
  return at.map(([x, y]) => <circle key={`${x} ${y}`} cx={x} cy={y} r={r} />);
}
