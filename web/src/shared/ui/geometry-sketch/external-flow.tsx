import { CurvedFlow, Flow, Flows, Span, Surface } from './strokes';

export function FlatPlate() {
  return (
    <>
      <Surface from={[56, 104]} to={[212, 104]} side="right" />
      <path className="sketch-dashed" d="M56 104C90 80 150 68 212 62" />
      <Flows from={[18, 34]} to={[56, 34]} step={[0, 22]} count={4} />
      <Flow from={[100, 46]} to={[150, 46]} />
      <Span from={[56, 124]} to={[212, 124]} symbol="L" at="below" />
    </>
  );
}

export function CylinderInCrossFlow() {
  return (
    <>
      <circle cx={124} cy={75} r={32} />
      <path d="M119 75h10M124 70v10" />
      <Flows from={[18, 39]} to={[58, 39]} step={[0, 36]} count={3} />
      <CurvedFlow d="M72 34C104 18 146 18 178 34" tip={[178, 34]} angle={27} />
      <CurvedFlow d="M72 116C104 132 146 132 178 116" tip={[178, 116]} angle={-27} />
      <Span from={[192, 43]} to={[192, 107]} symbol="d" at="right" />
    </>
  );
}

export function Sphere() {
  return (
    <>
      <circle cx={124} cy={75} r={34} />
      <path className="sketch-dashed" d="M90 75a34 9 0 0 1 68 0" />
      <path d="M90 75a34 9 0 0 0 68 0" />
      <Flows from={[18, 39]} to={[58, 39]} step={[0, 36]} count={3} />
      <Span from={[190, 41]} to={[190, 109]} symbol="d" at="right" />
    </>
  );
}

export function Drop() {
  return (
    <>
      <path d="M120 38c24 0 38 17 38 37s-15 33-38 33-38-13-38-33 14-37 38-37z" />
      <CurvedFlow d="M114 62c-20-4-26 26-8 32 8 2 10-8 9-20" tip={[115, 72]} angle={-95} />
      <CurvedFlow d="M126 62c20-4 26 26 8 32-8 2-10-8-9-20" tip={[125, 72]} angle={-85} />
      <Flow from={[44, 100]} to={[44, 52]} />
      <Flow from={[196, 100]} to={[196, 52]} />
      <Span from={[82, 124]} to={[158, 124]} symbol="d" at="below" />
    </>
  );
}

export function Bubble() {
  return (
    <>
      <ellipse cx={120} cy={62} rx={40} ry={28} />
      <path d="M94 56c4-10 12-14 22-15" />
      <circle cx={72} cy={122} r={7} />
      <circle cx={176} cy={114} r={5} />
      <circle cx={158} cy={134} r={4} />
      <Flow from={[120, 138]} to={[120, 102]} />
      <Span from={[80, 22]} to={[160, 22]} symbol="d" at="right" />
    </>
  );
}

export function ImpingingJet() {
  return (
    <>
      <path d="M104 12v36M136 12v36M104 48h-10M136 48h10" />
      <Flow from={[120, 30]} to={[120, 92]} />
      <CurvedFlow d="M108 62c0 28-20 34-62 36" tip={[46, 98]} angle={177} />
      <CurvedFlow d="M132 62c0 28 20 34 62 36" tip={[194, 98]} angle={3} />
      <Surface from={[24, 112]} to={[216, 112]} side="right" />
      <Span from={[104, 22]} to={[136, 22]} symbol="d" at="right" />
      <Span from={[212, 48]} to={[212, 112]} symbol="H" at="left" />
    </>
  );
}

export function RotatingDisc() {
  return (
    <>
      <path d="M112 14v46M128 14v46M54 66v10a66 21 0 0 0 132 0v-10" />
      <ellipse cx={120} cy={66} rx={66} ry={21} />
      <CurvedFlow d="M98 34a22 7 0 0 0 44 0" tip={[142, 34]} angle={-75} />
      <Flow from={[120, 148]} to={[120, 116]} />
      <CurvedFlow d="M98 128c0-18-14-22-52-24" tip={[46, 104]} angle={182} />
      <CurvedFlow d="M142 128c0-18 14-22 52-24" tip={[194, 104]} angle={-2} />
      <Span from={[120, 66]} to={[186, 66]} symbol="r" at="above" />
    </>
  );
}

export function RotatingCylinder() {
  return (
    <>
      <path d="M52 18v118h136v-118M96 36v78a24 7 0 0 0 48 0v-78" />
      <ellipse cx={120} cy={36} rx={24} ry={7} />
      <path d="M120 8v28" />
      <CurvedFlow d="M82 66a38 11 0 0 0 76 0" tip={[158, 66]} angle={-75} />
      <Span from={[96, 98]} to={[144, 98]} symbol="d" at="above" />
    </>
  );
}
