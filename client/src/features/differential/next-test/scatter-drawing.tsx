import { axisSteps, type Dot, labelSpots, type Spot, stair } from './scatter-geometry';
import type { Takes } from './scatter';
import type { TestView } from './tests-view';

interface Props {
  tests: readonly TestView[];
  takes: Takes;
  /** What the axis at the bottom counts. */
  axis: string;
  /** Pixels. */
  width: number;
}

const height = 300;
const edge = { top: 26, right: 18, bottom: 42, left: 40 };
/** Pixels at the left for tests of which nobody said what they take. */
const unsaidStrip = 58;

/** The drawing: the higher, the more is settled; the further right, the more it takes. Numbers are those of the list. */
export function ScatterDrawing({ tests, takes, axis, width }: Props) {
  const dots: Dot[] = tests.map(({ finding, bits }) => ({
    id: finding.id,
    takes: finding[takes],
    settles: bits,
  }));
  const strip = dots.some((dot) => dot.takes === null) ? unsaidStrip : 0;
  const zero = edge.left + strip;
  const across = axisSteps(Math.max(...dots.map((dot) => dot.takes ?? 0)), width < 340 ? 3 : 5);
  const up = axisSteps(Math.max(...dots.map((dot) => dot.settles)), 4);
  const x = (value: number | null) =>
    value === null
      ? edge.left + strip / 2
      : zero + (value / (across.at(-1) ?? 1)) * (width - edge.right - zero);
  const y = (value: number) =>
    height - edge.bottom - (value / (up.at(-1) ?? 1)) * (height - edge.bottom - edge.top);
  const spots = dots.map((dot) => ({ x: x(dot.takes), y: y(dot.settles) }));
  const labels = labelSpots(spots);
  return (
    <svg
      className="scatter-drawing"
      width={width}
      height={height}
      role="img"
      aria-label={`Bits settled against ${axis}. The table below says the same.`}
    >
      {up.map((value) => (
        <g key={value}>
          <line className="scatter-rule" x1={edge.left} x2={width - edge.right} y1={y(value)} y2={y(value)} />
          <text className="scatter-step" x={edge.left - 6} y={y(value) + 4} textAnchor="end">
            {value}
          </text>
        </g>
      ))}
      {across.map((value) => (
        <text
          key={value}
          className="scatter-step"
          x={x(value)}
          y={height - edge.bottom + 18}
          textAnchor="middle"
        >
          {value.toLocaleString('en-GB')}
        </text>
      ))}
      {strip > 0 && (
        <text className="scatter-step" x={x(null)} y={height - edge.bottom + 18} textAnchor="middle">
          not said
        </text>
      )}
      <text className="scatter-axis" x={width - edge.right} y={height - 4} textAnchor="end">
        {axis}
      </text>
      <text className="scatter-axis" x={4} y={14}>
        bits it settles
      </text>
      <path className="scatter-stair" d={stairPath(stair(dots), x, y, width - edge.right)} />
      {tests.map((test, index) => (
        <Mark key={test.finding.id} test={test} at={spots[index]} label={labels[index]} />
      ))}
    </svg>
  );
}

function stairPath(
  corners: readonly { takes: number; settles: number }[],
  x: (value: number) => number,
  y: (value: number) => number,
  end: number,
): string {
  if (corners.length === 0) return '';
  const steps = corners.map(({ takes, settles }, index) =>
    index === 0 ? `M${String(x(takes))} ${String(y(settles))}` : `H${String(x(takes))}V${String(y(settles))}`,
  );
  return `${steps.join('')}H${String(end)}`;
}

function Mark({ test, at, label }: { test: TestView; at: Spot | undefined; label: Spot | undefined }) {
  if (!at || !label) return null;
  return (
    <g>
      <title>{test.finding.title}</title>
      <circle className="scatter-dot" data-best={test.frontier || undefined} cx={at.x} cy={at.y} r={5} />
      <text className="scatter-number" x={label.x} y={label.y} textAnchor="middle">
        {test.rank}
      </text>
    </g>
  );
}
