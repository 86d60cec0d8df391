'use client';
import type { WallLine } from '@groundward/engine/building/definition';
import { axisOf } from '@/lib/demands';
import { figure } from '@/lib/format';
import type { Scale } from './scale';

export type CollectorView = {
  readonly line: WallLine;
  /** Axial force with the sense applied, tension positive; `at` along the line's axis. */
  readonly points: readonly { readonly at: number; readonly axial: number }[];
};

export function largestAxial(collectors: readonly CollectorView[]): number {
  return Math.max(1e-12, ...collectors.flatMap(({ points }) => points.map(({ axial }) => Math.abs(axial))));
}

const REACH = 26;

/** Axial force square to its line: tension on one side with a full edge, compression on the other with a broken one. */
export function CollectorShape({
  collector,
  scale,
  most,
  named,
}: {
  readonly collector: CollectorView;
  readonly scale: Scale;
  readonly most: number;
  readonly named: boolean;
}) {
  const { line, points } = collector;
  if (points.length < 2) return null;
  const [a] = line.axis;
  const { u } = axisOf(line);
  const at = (d: number, axial: number): [number, number] => {
    const n = (axial / most) * REACH;
    return [scale.x(a[0] + u[0] * d) + u[1] * n, scale.y(a[1] + u[1] * d) + u[0] * n];
  };
  return (
    <g pointerEvents="none">
      {visible(points, most, 1) && <path d={area(points, 1, at)} className="tension" />}
      {visible(points, most, -1) && <path d={area(points, -1, at)} className="compression" />}
      {named &&
        extremes(points).map(({ at: d, axial }) => {
          const [x, y] = at(d, axial);
          return (
            <text
              key={`${d} ${axial}`}
              x={x + u[1] * Math.sign(axial) * 4}
              y={y + 3.5 + u[0] * Math.sign(axial) * 9}
              textAnchor={Math.abs(u[0]) > Math.abs(u[1]) ? 'middle' : axial * u[1] > 0 ? 'start' : 'end'}
              className={axial > 0 ? 's10 t-tension halo' : 's10 t-compression halo'}
            >
              {signedFigure(axial)}
            </text>
          );
        })}
    </g>
  );
}

/** The same force as a small diagram along the line; all diagrams of a table have one scale. */
export function CollectorSpark({
  collector,
  most,
  width = 132,
}: {
  readonly collector: CollectorView;
  readonly most: number;
  readonly width?: number;
}) {
  const { points, line } = collector;
  const { length } = axisOf(line);
  const middle = 15;
  const at = (d: number, axial: number): [number, number] => [
    1 + (d / length) * (width - 2),
    middle - (axial / most) * (middle - 1),
  ];
  const text = extremes(points)
    .map(({ axial, at: d }) => `${signedFigure(axial)} at ${figure(d, 3)}`)
    .join(', ');
  return (
    <svg width={width} height={2 * middle} role="img" aria-label={`Along line ${line.id}: ${text}`}>
      <line x1={0} x2={width} y1={middle} y2={middle} className="zero" />
      {visible(points, most, 1) && <path d={area(points, 1, at)} className="tension" />}
      {visible(points, most, -1) && <path d={area(points, -1, at)} className="compression" />}
    </svg>
  );
}

/** Whether a sign's part is large enough to be told from the line it stands on. */
function visible(points: CollectorView['points'], most: number, sign: 1 | -1): boolean {
  return points.some(({ axial }) => (sign * axial) / most > 0.02);
}

/** The part of one sign as a closed shape on the zero line; where the sign changes between two points the edge meets it. */
function area(
  points: CollectorView['points'],
  sign: 1 | -1,
  at: (d: number, axial: number) => readonly [number, number],
): string {
  const corners: (readonly [number, number])[] = [];
  points.forEach((point, i) => {
    const before = points[i - 1];
    if (before !== undefined && before.axial * point.axial < 0) {
      const share = before.axial / (before.axial - point.axial);
      corners.push(at(before.at + (point.at - before.at) * share, 0));
    }
    corners.push(at(point.at, sign * point.axial > 0 ? point.axial : 0));
  });
  const [first, last] = [points[0], points[points.length - 1]];
  const closed = [at(first?.at ?? 0, 0), ...corners, at(last?.at ?? 0, 0)];
  const text = closed.map(([x, y]) => `${x.toFixed(1)},${y.toFixed(1)}`);
  return `M${text.join('L')}Z`;
}

function extremes(points: CollectorView['points']): { at: number; axial: number }[] {
  const largest = points.reduce((most, point) => (point.axial > most.axial ? point : most), { at: 0, axial: 0 });
  const least = points.reduce((most, point) => (point.axial < most.axial ? point : most), { at: 0, axial: 0 });
  return [largest, least].filter(({ axial }) => axial !== 0);
}

function signedFigure(axial: number): string {
  return axial > 0 ? `+${figure(axial, 3)}` : figure(axial, 3);
}
