'use client';
import { Area, AreaChart, ReferenceLine, ResponsiveContainer, Tooltip, XAxis, YAxis } from 'recharts';
import { figure, quantity } from '@/lib/format';
import type { DiagramPoint } from '@/lib/polynomial';

export type SpanDiagramsView = {
  readonly points: readonly DiagramPoint[];
  /** The plan's extent along s, so that diagrams and plan stand over each other. */
  readonly from: number;
  readonly to: number;
  readonly lines: readonly { readonly line: string; readonly s: number }[];
  readonly units: { readonly length: string; readonly force: string };
};

export const AXIS = 56;
/** Height of a caption over an upright diagram. */
export const CAPTION = 40;

type Diagram = {
  readonly key: 'w' | 'V' | 'v' | 'M' | 'T';
  readonly name: string;
  readonly unit: (force: string, length: string) => string;
};

const DIAGRAMS: readonly Diagram[] = [
  { key: 'w', name: 'Load w', unit: (f, l) => `${f}/${l}` },
  { key: 'V', name: 'Shear V', unit: (f) => f },
  { key: 'v', name: 'Unit V/d', unit: (f, l) => `${f}/${l}` },
  { key: 'M', name: 'Moment M', unit: (f, l) => `${f}·${l}` },
  { key: 'T', name: 'Chord M/D', unit: (f) => f },
];

/** Load, shear, unit shear, moment and chord force along the span; `upright` where s runs up the sheet. */
export function SpanDiagrams({
  view,
  upright,
  length,
}: {
  readonly view: SpanDiagramsView;
  readonly upright: boolean;
  readonly length: number;
}) {
  const { force, length: unit } = view.units;
  return (
    <div style={upright ? { display: 'flex', gap: 8 } : undefined}>
      {DIAGRAMS.map((diagram) => {
        const largest = view.points.reduce(
          (most, point) => (Math.abs(point[diagram.key]) > Math.abs(most) ? point[diagram.key] : most),
          0,
        );
        const label = diagram.unit(force, unit);
        return (
          <figure
            key={diagram.key}
            style={{ margin: 0, flex: 1, minWidth: 0 }}
            aria-label={`${diagram.name}, largest ${quantity(largest, label)}`}
          >
            <figcaption
              className="chart-name"
              style={
                upright
                  ? { flexDirection: 'column', height: CAPTION, gap: 0, padding: 0, whiteSpace: 'nowrap' }
                  : { paddingLeft: AXIS }
              }
            >
              <span>{diagram.name}</span>
              <b>{quantity(largest, label)}</b>
            </figcaption>
            <ResponsiveContainer width="100%" height={upright ? length : 84}>
              {upright ? (
                <AreaChart data={[...view.points]} layout="vertical" margin={{ top: 0, bottom: 0, left: 2, right: 2 }}>
                  <XAxis type="number" hide domain={bounds(largest)} />
                  <YAxis type="number" dataKey="s" hide domain={[view.from, view.to]} allowDataOverflow />
                  <ReferenceLine x={0} stroke="var(--ink-3)" />
                  {view.lines.map((line) => (
                    <ReferenceLine key={line.line} y={line.s} stroke="var(--hair-2)" strokeDasharray="10 3 2 3" />
                  ))}
                  <Area
                    type="linear"
                    dataKey={diagram.key}
                    stroke="var(--force)"
                    fill="var(--force)"
                    fillOpacity={0.14}
                    isAnimationActive={false}
                    dot={false}
                  />
                  <Tooltip content={<Reading unit={unit} name={diagram.name} label={label} field={diagram.key} />} />
                </AreaChart>
              ) : (
                <AreaChart data={[...view.points]} margin={{ top: 2, bottom: 2, left: 0, right: 20 }}>
                  <XAxis type="number" dataKey="s" hide domain={[view.from, view.to]} allowDataOverflow />
                  <YAxis
                    width={AXIS}
                    domain={bounds(largest)}
                    ticks={ticksOf(view.points.map((point) => point[diagram.key]))}
                    tickFormatter={(value: number) => figure(value, 2)}
                    tickLine={false}
                    axisLine={false}
                  />
                  <ReferenceLine y={0} stroke="var(--ink-3)" />
                  {view.lines.map((line) => (
                    <ReferenceLine key={line.line} x={line.s} stroke="var(--hair-2)" strokeDasharray="10 3 2 3" />
                  ))}
                  <Area
                    type="linear"
                    dataKey={diagram.key}
                    stroke="var(--force)"
                    fill="var(--force)"
                    fillOpacity={0.14}
                    isAnimationActive={false}
                    dot={false}
                  />
                  <Tooltip content={<Reading unit={unit} name={diagram.name} label={label} field={diagram.key} />} />
                </AreaChart>
              )}
            </ResponsiveContainer>
          </figure>
        );
      })}
    </div>
  );
}

/** The least and the largest value, and zero. */
function ticksOf(values: readonly number[]): number[] {
  return [...new Set([Math.min(0, ...values), 0, Math.max(0, ...values)])];
}

/** A range with zero in it, a little wider than the values. */
function bounds(largest: number): [(low: number) => number, (high: number) => number] {
  const pad = Math.abs(largest) * 0.06 || 1;
  return [(low) => Math.min(0, low) - (low < 0 ? pad : 0), (high) => Math.max(0, high) + (high > 0 ? pad : 0)];
}

type Payload = { readonly payload?: DiagramPoint };

function Reading({
  active,
  payload,
  unit,
  name,
  label,
  field,
}: {
  readonly active?: boolean;
  readonly payload?: readonly Payload[];
  readonly unit: string;
  readonly name: string;
  readonly label: string;
  readonly field: keyof DiagramPoint;
}) {
  const point = payload?.[0]?.payload;
  if (active !== true || point === undefined) return null;
  return (
    <div style={{ background: 'var(--ink)', color: 'var(--paper)', padding: '3px 6px', fontSize: 12 }}>
      {`${name}: ${quantity(point[field], label, 4)} at s = ${quantity(point.s, unit, 4)}`}
    </div>
  );
}
