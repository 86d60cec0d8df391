'use client';
import { Area, AreaChart, ReferenceDot, ReferenceLine, XAxis, YAxis } from 'recharts';
import { dimension, figure, quantity } from '@/lib/format';
import type { DiagramPoint } from '@/lib/polynomial';

export type SpanDiagramsView = {
  /** One list of points for every diaphragm. */
  readonly series: readonly (readonly DiagramPoint[])[];
  /** The plan's extent along s, so that diagrams and plan stand over each other. */
  readonly from: number;
  readonly to: number;
  readonly lines: readonly { readonly line: string; readonly s: number }[];
  readonly units: { readonly length: string; readonly force: string };
};

/** What is left and right of the span on plan and diagrams alike. */
export const AXIS = 52;
export const RIGHT = 24;
/** Height of a caption over an upright diagram. */
export const CAPTION = 44;
const HEIGHT = 82;

export type Ordinate = {
  readonly key: 'w' | 'V' | 'v' | 'M' | 'T';
  readonly symbol: string;
  readonly name: string;
  readonly unit: (force: string, length: string) => string;
};

export const ORDINATES: readonly Ordinate[] = [
  { key: 'w', symbol: 'w', name: 'Load w', unit: (f, l) => `${f}/${l}` },
  { key: 'V', symbol: 'V', name: 'Shear V', unit: (f) => f },
  { key: 'v', symbol: 'V/d', name: 'Unit shear V/d', unit: (f, l) => `${f}/${l}` },
  { key: 'M', symbol: 'M', name: 'Moment M', unit: (f, l) => `${f}·${l}` },
  { key: 'T', symbol: 'M/D', name: 'Chord M/D', unit: (f) => f },
];

/** Load, shear, unit shear, moment and chord force along the span; `upright` where s runs up the sheet. */
export function SpanDiagrams({
  view,
  upright,
  width,
  length,
}: {
  readonly view: SpanDiagramsView;
  readonly upright: boolean;
  /** Of one diagram [px]. */
  readonly width: number;
  /** Of the span, where it runs up the sheet [px]. */
  readonly length: number;
}) {
  const { force, length: unit } = view.units;
  return ORDINATES.map((ordinate) => {
    const largest = largestOf(view, ordinate.key);
    const label = ordinate.unit(force, unit);
    const value = largest === undefined ? 0 : largest[ordinate.key];
    const said = `${ordinate.name}, largest ${quantity(value, label)} at s = ${dimension(largest?.s ?? 0, unit)}`;
    return (
      <figure key={ordinate.key} className="diagram" style={{ width }}>
        <figcaption
          className={upright ? 'over' : undefined}
          style={upright ? { height: CAPTION } : { paddingLeft: AXIS, paddingRight: RIGHT }}
        >
          <span>{ordinate.name}</span>
          <b data-from={`${said}, from the exact pieces of the diagram.`}>{quantity(value, label)}</b>
        </figcaption>
        {upright ? (
          <Upright view={view} field={ordinate.key} said={said} width={width} length={length} largest={largest} />
        ) : (
          <Level view={view} field={ordinate.key} said={said} width={width} largest={largest} />
        )}
      </figure>
    );
  });
}

type One = {
  readonly view: SpanDiagramsView;
  readonly field: Ordinate['key'];
  readonly said: string;
  readonly width: number;
  readonly largest: DiagramPoint | undefined;
};

function Level({ view, field, said, width, largest }: One) {
  const data = rowsOf(view.series);
  return (
    <AreaChart
      width={width}
      height={HEIGHT}
      data={data}
      margin={{ top: 3, bottom: 3, left: 0, right: RIGHT }}
      role="img"
      title={said}
      accessibilityLayer={false}
    >
      <XAxis type="number" dataKey="s" hide domain={[view.from, view.to]} allowDataOverflow />
      <YAxis
        width={AXIS}
        domain={bounds(view, field)}
        ticks={ticksOf(view, field)}
        tickFormatter={(value: number) => figure(value, 3)}
        tick={{ fill: 'var(--ink-2)' }}
        tickLine={false}
        axisLine={false}
        interval={0}
      />
      <ReferenceLine y={0} className="zero" />
      {view.lines.map((line, i) => (
        <ReferenceLine key={i} x={line.s} className="axis" />
      ))}
      <Area type="linear" dataKey={field} {...SHAPE} />
      {largest !== undefined && <ReferenceDot x={largest.s} y={largest[field]} r={2.5} className="extreme" />}
    </AreaChart>
  );
}

function Upright({ view, field, said, width, length, largest }: One & { readonly length: number }) {
  return (
    <AreaChart
      width={width}
      height={length}
      data={rowsOf(view.series)}
      layout="vertical"
      margin={{ top: 0, bottom: 0, left: 3, right: 3 }}
      role="img"
      title={said}
      accessibilityLayer={false}
    >
      <XAxis type="number" hide domain={bounds(view, field)} />
      <YAxis type="number" dataKey="s" hide domain={[view.from, view.to]} allowDataOverflow />
      <ReferenceLine x={0} className="zero" />
      {view.lines.map((line, i) => (
        <ReferenceLine key={i} y={line.s} className="axis" />
      ))}
      <Area type="linear" dataKey={field} {...SHAPE} />
      {largest !== undefined && <ReferenceDot x={largest[field]} y={largest.s} r={2.5} className="extreme" />}
    </AreaChart>
  );
}

const SHAPE = {
  stroke: 'var(--force)',
  strokeWidth: 1.2,
  fill: 'var(--force)',
  fillOpacity: 0.13,
  isAnimationActive: false,
  dot: false,
  activeDot: false,
  connectNulls: false,
} as const;

type Row = { readonly s: number } & Partial<DiagramPoint>;

/** One list for the chart; a row without values keeps one diaphragm’s curve from running into the next one’s. */
function rowsOf(series: SpanDiagramsView['series']): Row[] {
  return series.flatMap((points, i): Row[] => {
    const first = points[0];
    return i === 0 || first === undefined ? [...points] : [{ s: first.s }, ...points];
  });
}

function largestOf(view: SpanDiagramsView, field: Ordinate['key']): DiagramPoint | undefined {
  return view.series
    .flat()
    .reduce<DiagramPoint | undefined>(
      (most, point) =>
        most === undefined || Math.abs(point[field]) > Math.abs(most[field]) * (1 + 1e-9) ? point : most,
      undefined,
    );
}

function rangeOf(view: SpanDiagramsView, field: Ordinate['key']): [number, number] {
  const values = view.series.flat().map((point) => point[field]);
  return [Math.min(0, ...values), Math.max(0, ...values)];
}

/** Zero and the two extremes, as far as they can be told apart. */
function ticksOf(view: SpanDiagramsView, field: Ordinate['key']): number[] {
  const [low, high] = rangeOf(view, field);
  const apart = (high - low) * 0.2;
  return [...(low < -apart ? [low] : []), 0, ...(high > apart ? [high] : [])];
}

/** A range with zero in it, a little wider than the values. */
function bounds(view: SpanDiagramsView, field: Ordinate['key']): [number, number] {
  const [low, high] = rangeOf(view, field);
  const pad = (high - low) * 0.04 || 1;
  return [low - pad, high + pad];
}
