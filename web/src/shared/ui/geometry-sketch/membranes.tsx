import { Circles, CurvedFlow, Flow, Flows, Span } from './strokes';

export function HollowFibreLumen() {
  const pores = Array.from({ length: 15 }, (_, i) => `M${42 + i * 11} 40v12M${42 + i * 11} 98v12`).join('');
  return (
    <>
      <path d="M34 40H206M34 52H206M34 98H206M34 110H206" />
      <path className="sketch-hatch" d={pores} />
      <Flows from={[60, 64]} to={[104, 64]} step={[0, 22]} count={2} />
      <Span from={[148, 52]} to={[148, 98]} symbol="d_i" at="right" />
    </>
  );
}

export function HollowFibreShell() {
  return (
    <>
      <rect x={30} y={20} width={168} height={110} rx={2} />
      {[42, 70, 98].map((y) => (
        <path key={y} d={`M18 ${y}H210M18 ${y + 12}H210`} />
      ))}
      <Flows from={[56, 31]} to={[98, 31]} step={[0, 31]} count={2} />
      <Flows from={[56, 90]} to={[98, 90]} step={[0, 30]} count={2} />
      <Span from={[216, 70]} to={[216, 82]} symbol="d_o" at="right" />
    </>
  );
}

export function SpacerChannel() {
  return (
    <>
      <Membrane y={32} />
      <Membrane y={118} />
      <Circles
        at={[
          [78, 54],
          [150, 54],
          [114, 96],
          [186, 96],
        ]}
        r={22}
      />
      <Flows from={[22, 58]} to={[48, 58]} step={[0, 34]} count={2} />
      <Span from={[218, 32]} to={[218, 118]} symbol="h" at="right" />
    </>
  );
}

export function MembraneChannel() {
  return (
    <>
      <Membrane y={36} />
      <Membrane y={114} />
      <Flow from={[40, 52]} to={[84, 52]} />
      <Flow from={[40, 75]} to={[112, 75]} />
      <Flow from={[40, 98]} to={[84, 98]} />
      <Span from={[168, 36]} to={[168, 114]} symbol="h" at="right" />
    </>
  );
}

export function StirredCell() {
  return (
    <>
      <path d="M74 22V116H166V22M74 40H166M120 10V92M96 92H144V100H96Z" />
      <path className="sketch-dashed" d="M74 108H166" />
      <CurvedFlow d="M100 28a20 6 0 0 0 40 0" tip={[140, 28]} angle={-80} />
      <Span from={[120, 130]} to={[166, 130]} symbol="r" at="right" />
    </>
  );
}

function Membrane({ y }: { y: number }) {
  return (
    <>
      <line x1={22} y1={y} x2={210} y2={y} />
      <line
        className="sketch-dashed"
        x1={22}
        y1={y < 75 ? y - 6 : y + 6}
        x2={210}
        y2={y < 75 ? y - 6 : y + 6}
      />
    </>
  );
}
