import { CurvedFlow, Flow, Flows, Mark, Span, Surface } from './strokes';

export function FallingFilm() {
  return (
    <>
      <Surface from={[96, 10]} to={[96, 140]} side="right" />
      <path d="M120 10q4 10 0 20t0 22q-5 10 1 20t-1 22q-5 12 0 22t0 24" />
      <Flows from={[107, 24]} to={[107, 54]} step={[0, 62]} count={2} />
      <Flow from={[158, 124]} to={[158, 86]} />
      <Span from={[96, 72]} to={[119, 72]} symbol="δ" at="right" />
      <Span from={[66, 10]} to={[66, 140]} symbol="L" at="left" />
    </>
  );
}

export function LiquidPool() {
  return (
    <>
      <path d="M14 88h42v30h128v-30h42" />
      <path d="M56 94h128" />
      <path className="sketch-hatch" d="M74 102h20M112 108h24M146 102h20" />
      <Flows from={[26, 32]} to={[84, 32]} step={[0, 24]} count={2} />
      <Rising x={98} />
      <Rising x={128} />
      <Rising x={158} />
      <Span from={[56, 128]} to={[184, 128]} symbol="L" at="below" />
    </>
  );
}

function Rising({ x }: { x: number }) {
  return <CurvedFlow d={`M${x} 88q6-8 0-16t2-18`} tip={[x + 2, 54]} angle={-75} />;
}

export function OpenWater() {
  return (
    <>
      <path d="M14 102q14-12 28 0t28 0 28 0 28 0 28 0 28 0 28 0" />
      <path className="sketch-hatch" d="M40 120h26M104 128h32M160 118h24" />
      <Flows from={[30, 36]} to={[96, 36]} step={[0, 24]} count={2} />
      <Span from={[176, 24]} to={[176, 98]} symbol="10 m" at="right" />
      <Mark x={128} y={54}>
        u
      </Mark>
    </>
  );
}

export function Stream() {
  return (
    <>
      <path d="M16 44L224 56" />
      <path className="sketch-hatch" d="M60 56l28 1.6M150 60l26 1.5" />
      <Surface from={[16, 106]} to={[224, 122]} side="right" />
      <Flow from={[38, 74]} to={[108, 79]} />
      <Flow from={[38, 92]} to={[86, 95.5]} />
      <Span from={[162, 53]} to={[162, 117]} symbol="h" at="right" />
    </>
  );
}

export function VerticalPlateFreeConvection() {
  return (
    <>
      <Surface from={[104, 14]} to={[104, 132]} side="right" />
      <path className="sketch-dashed" d="M104 132C122 100 132 60 138 14" />
      <Flow from={[115, 108]} to={[115, 76]} />
      <Flow from={[121, 66]} to={[121, 24]} />
      <CurvedFlow d="M182 96c-20 0-34-6-40-18" tip={[142, 78]} angle={-118} />
      <Span from={[76, 14]} to={[76, 132]} symbol="L" at="left" />
    </>
  );
}

export function HorizontalPlateFreeConvection() {
  return (
    <>
      <Surface from={[52, 106]} to={[188, 106]} side="right" />
      <CurvedFlow d="M108 98q8-18 0-36t4-38" tip={[112, 24]} angle={-75} />
      <CurvedFlow d="M132 98q-8-18 0-36t-4-38" tip={[128, 24]} angle={-105} />
      <CurvedFlow d="M22 66c22 2 44 12 58 28" tip={[80, 94]} angle={48} />
      <CurvedFlow d="M218 66c-22 2-44 12-58 28" tip={[160, 94]} angle={132} />
      <Mark x={104} y={140} anchor="start">
        L
      </Mark>
      <Mark x={116} y={140} anchor="start">
        = A / P
      </Mark>
    </>
  );
}

export function CylinderFreeConvection() {
  return (
    <>
      <circle cx={120} cy={92} r={28} />
      <path d="M115 92h10M120 87v10" />
      <Plume />
      <Span from={[172, 64]} to={[172, 120]} symbol="d" at="right" />
    </>
  );
}

export function SphereFreeConvection() {
  return (
    <>
      <circle cx={120} cy={92} r={28} />
      <path className="sketch-dashed" d="M92 92a28 8 0 0 1 56 0" />
      <path d="M92 92a28 8 0 0 0 56 0" />
      <Plume />
      <Span from={[172, 64]} to={[172, 120]} symbol="d" at="right" />
    </>
  );
}

function Plume() {
  return (
    <>
      <CurvedFlow d="M84 118c-10-40 26-46 28-104" tip={[112, 14]} angle={-88} />
      <CurvedFlow d="M156 118c10-40-26-46-28-104" tip={[128, 14]} angle={-92} />
    </>
  );
}
