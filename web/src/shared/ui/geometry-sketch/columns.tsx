import { Circles, CurvedFlow, Flow, Flows, Span } from './strokes';

/** Rows of four and three in turn, as balls lie between two walls. */
const BED: [number, number][] = [0, 1, 2, 3].flatMap((row) =>
  Array.from({ length: row % 2 ? 3 : 4 }, (_, i): [number, number] => [
    87 + i * 22 + (row % 2 ? 11 : 0),
    46 + row * 19,
  ]),
);

function Walls() {
  return <path d="M76 14v122M164 14v122" />;
}

export function PackedBed() {
  return (
    <>
      <Walls />
      <Circles at={BED} r={10.5} />
      <Flow from={[120, 144]} to={[120, 120]} />
      <Flow from={[142, 32]} to={[142, 8]} />
      <Span from={[76.5, 28]} to={[97.5, 28]} symbol="d_p" at="right" />
    </>
  );
}

export function TrickleBed() {
  return (
    <>
      <Walls />
      <Circles at={BED} r={10.5} />
      <Flows from={[98, 8]} to={[98, 32]} step={[44, 0]} count={2} />
      <Flows from={[98, 118]} to={[98, 142]} step={[44, 0]} count={2} />
      <Span from={[178, 35.5]} to={[178, 56.5]} symbol="d_p" at="right" />
    </>
  );
}

export function FluidisedBed() {
  const particles: [number, number][] = [
    [90, 104],
    [112, 98],
    [134, 106],
    [152, 96],
    [88, 78],
    [106, 66],
    [128, 80],
    [148, 70],
    [96, 48],
    [124, 54],
    [146, 44],
  ];
  return (
    <>
      <Walls />
      <path className="sketch-dashed" d="M76 118h88" />
      <Circles at={particles} r={6.5} />
      <Flows from={[100, 144]} to={[100, 124]} step={[20, 0]} count={3} />
      <Span from={[178, 37.5]} to={[178, 50.5]} symbol="d_p" at="right" />
    </>
  );
}

export function PackedColumn() {
  const rings = [
    [88, 40, 20],
    [112, 44, -50],
    [138, 38, 70],
    [154, 54, 10],
    [90, 62, -30],
    [114, 68, 35],
    [138, 64, -15],
    [152, 82, 60],
    [88, 86, 75],
    [110, 92, -10],
    [132, 90, 45],
    [92, 108, -40],
    [116, 112, 20],
    [146, 106, -70],
  ] as const;
  return (
    <>
      <Walls />
      {rings.map(([x, y, turn]) => (
        <g key={`${x} ${y}`} transform={`translate(${x} ${y}) rotate(${turn})`}>
          <path d="M-7 -5h14v10h-14zM-7 -5a2.5 5 0 0 0 0 10" />
        </g>
      ))}
      <Flows from={[96, 4]} to={[96, 26]} step={[48, 0]} count={2} />
      <Flow from={[120, 146]} to={[120, 124]} />
      <path d="M192 66h26v19h-26zM192 66a5 9.5 0 0 0 0 19" />
      <Span from={[192, 98]} to={[218, 98]} symbol="d_p" at="below" />
    </>
  );
}

/** Parallel lines at 45°, cut off at the packing's edges. */
function corrugation(lean: 1 | -1): string {
  const [left, right, top, bottom] = [76, 164, 26, 124];
  return Array.from({ length: 13 }, (_, i) => {
    const reach = 14 * (i + 1);
    const start = reach <= bottom - top ? [left, top + reach] : [left + reach - (bottom - top), bottom];
    const end = reach <= right - left ? [left + reach, top] : [right, top + reach - (right - left)];
    const x = (at: number | undefined) => (lean === 1 ? (at ?? left) : left + right - (at ?? left));
    return `M${x(start[0])} ${start[1]}L${x(end[0])} ${end[1]}`;
  }).join('');
}

export function StructuredPacking() {
  return (
    <>
      <Walls />
      <path d="M76 26h88M76 124h88" />
      <path d={corrugation(1)} />
      <path className="sketch-hatch sketch-dashed" d={corrugation(-1)} />
      <Flows from={[96, 2]} to={[96, 22]} step={[48, 0]} count={2} />
      <Flow from={[120, 148]} to={[120, 129]} />
      <path d="M184 92l20-26 20 26" />
      <Span from={[198, 58]} to={[218, 84]} symbol="s" at="right" />
    </>
  );
}

export function Tray() {
  return (
    <>
      <path d="M46 10v130M194 10v130M64 96h92" />
      <path className="sketch-dashed" d="M64 96h92" />
      <path d="M156 72v52M64 84v-74M64 66q12-6 24 0t24 0 24 0 18 4M46 116h18v-20M64 96v20" />
      <Circles
        at={[
          [86, 80],
          [110, 84],
          [132, 78],
        ]}
        r={4}
      />
      <Flows from={[84, 136]} to={[84, 104]} step={[26, 0]} count={3} />
      <CurvedFlow d="M150 64c18-2 26 10 26 40" tip={[176, 104]} angle={90} />
      <Span from={[206, 72]} to={[206, 96]} symbol="h_w" at="right" />
    </>
  );
}

export function BubbleColumn() {
  return (
    <>
      <path d="M80 10v116h80v-116M80 26h80" />
      <path d="M96 114h48" />
      <Circles
        at={[
          [100, 100],
          [118, 90],
          [138, 98],
          [106, 72],
          [130, 64],
          [146, 78],
          [98, 46],
          [120, 40],
          [142, 46],
        ]}
        r={5}
      />
      <Flow from={[120, 146]} to={[120, 118]} />
      <CurvedFlow d="M90 50c-4 20-4 34 0 48" tip={[90, 98]} angle={78} />
      <CurvedFlow d="M150 54c4 16 4 30 0 44" tip={[150, 98]} angle={102} />
      <Span from={[172, 26]} to={[172, 114]} symbol="H" at="right" />
    </>
  );
}

export function StirredTank() {
  return (
    <>
      <path d="M62 18v84q0 30 58 30t58-30v-84M62 36h116M120 6v72" />
      <path d="M88 70h64v16h-64zM88 78h64" />
      <CurvedFlow d="M100 22a20 6 0 0 0 40 0" tip={[140, 22]} angle={-75} />
      <CurvedFlow d="M160 92c14-6 12-32-6-38" tip={[154, 54]} angle={200} />
      <CurvedFlow d="M80 92c-14-6-12-32 6-38" tip={[86, 54]} angle={-20} />
      <Span from={[88, 98]} to={[152, 98]} symbol="d_i" at="below" />
    </>
  );
}
