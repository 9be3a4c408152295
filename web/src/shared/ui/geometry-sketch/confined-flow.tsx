import { Flow, Flows, Mark, Span, Surface } from './strokes';

export function WettedWall() {
  const film = (x: number, turn: 1 | -1) =>
    `M${x} 12${Array.from({ length: 8 }, (_, i) => `q${(i % 2 ? -2.5 : 2.5) * turn} 7.75 0 15.5`).join('')}`;
  return (
    <>
      <Surface from={[72, 12]} to={[72, 136]} side="right" />
      <Surface from={[168, 136]} to={[168, 12]} side="right" />
      <path d={film(86, 1)} />
      <path d={film(154, -1)} />
      <Flow from={[79, 22]} to={[79, 48]} />
      <Flow from={[161, 22]} to={[161, 48]} />
      <Flows from={[108, 138]} to={[108, 100]} step={[24, 0]} count={2} />
      <Span from={[72, 72]} to={[168, 72]} symbol="d" at="above" />
    </>
  );
}

export function Pipe() {
  return (
    <>
      <path d="M34 42H204M34 108H204" />
      <ellipse cx={34} cy={75} rx={11} ry={33} />
      <path d="M204 42a11 33 0 0 1 0 66" />
      <Flows from={[66, 62]} to={[112, 62]} step={[0, 26]} count={2} />
      <Span from={[152, 42]} to={[152, 108]} symbol="d" at="right" />
    </>
  );
}

export function RectangularDuct() {
  return (
    <>
      <path d="M38 62h96v50h-96zM38 62l64-34h96l-64 34M198 28v50l-64 34" />
      <Flow from={[64, 96]} to={[108, 73]} />
      <Flow from={[176, 62]} to={[216, 41]} />
      <Span from={[26, 62]} to={[26, 112]} symbol="h" at="left" />
      <Span from={[38, 124]} to={[134, 124]} symbol="b" at="below" />
      <Mark x={160} y={136} anchor="start">
        d_h
      </Mark>
      <Mark x={180} y={136} anchor="start">
        = 4 A / P
      </Mark>
    </>
  );
}

export function Annulus() {
  return (
    <>
      <path d="M34 24H206M34 126H206M34 54H206M34 96H206" />
      <ellipse cx={34} cy={75} rx={13} ry={51} />
      <ellipse cx={34} cy={75} rx={6} ry={21} />
      <Flows from={[66, 39]} to={[110, 39]} step={[0, 72]} count={2} />
      <Span from={[140, 54]} to={[140, 96]} symbol="d_1" at="right" />
      <Span from={[182, 24]} to={[182, 126]} symbol="d_2" at="right" />
    </>
  );
}

export function HelicalCoil() {
  const turns = Array.from({ length: 121 }, (_, i) => {
    const angle = (i / 120) * 8 * Math.PI;
    const x = 44 + i * 1.2 - 9 * Math.cos(angle);
    const y = 72 - 38 * Math.sin(angle);
    return `${x.toFixed(1)} ${y.toFixed(1)}`;
  }).join('L');
  return (
    <>
      <path className="sketch-tube" d={`M${turns}`} />
      <path className="sketch-bore" d={`M${turns}`} />
      <Flow from={[35, 118]} to={[35, 84]} />
      <Flow from={[179, 64]} to={[179, 32]} />
      <Span from={[206, 34]} to={[206, 110]} symbol="D" at="right" />
      <Mark x={118} y={140}>
        tube bore d
      </Mark>
    </>
  );
}

export function Monolith() {
  const cells = [0, 1, 2, 3].flatMap((i) => [0, 1, 2, 3].map((j) => [70 + i * 24, 40 + j * 24] as const));
  return (
    <>
      <path d="M67 37l44-24h99l-44 24M210 13v99l-44 24M67 37h99v99h-99z" />
      {cells.map(([x, y]) => (
        <rect key={`${x} ${y}`} x={x} y={y} width={21} height={21} />
      ))}
      <Flows from={[20, 50.5]} to={[56, 50.5]} step={[0, 24]} count={4} />
      <Span from={[142, 144]} to={[163, 144]} symbol="d" at="right" />
    </>
  );
}
