'use client';
import { dimension } from '@/lib/format';
import { barLength, type Box, type Scale } from './scale';

/** A span's name and where it stands on plan: the middle of its extent. */
export type SpanName = {
  readonly member: string;
  readonly name: string;
  readonly from: number;
  readonly to: number;
  /** Whether s runs up the sheet. */
  readonly upright: boolean;
};

/** Names of the spans along the edge of the plan that no wall line's name takes. */
export function SpanNames({
  spans,
  scale,
  box,
}: {
  readonly spans: readonly SpanName[];
  readonly scale: Scale;
  readonly box: Box;
}) {
  return spans.map(({ member, name, from, to, upright }) => {
    const size = Math.abs(to - from) * scale.perUnit;
    const long = upright ? 13 : name.length * 5.6 + 6;
    if (size < long) return null;
    const middle = (from + to) / 2;
    const [x, y] = upright ? [scale.x(box.x1) + 6, scale.y(middle) + 3.5] : [scale.x(middle), scale.y(box.y1) - 9];
    const [a, b] = upright ? [scale.y(from), scale.y(to)] : [scale.x(from), scale.x(to)];
    const [cx, cy] = [scale.x(box.x1) + 2, scale.y(box.y1) - 4];
    return (
      <g key={member}>
        <path
          className="extent"
          d={
            upright
              ? `M${cx},${a}L${cx},${b}M${cx - 2},${a}L${cx + 2},${a}M${cx - 2},${b}L${cx + 2},${b}`
              : `M${a},${cy}L${b},${cy}M${a},${cy - 2}L${a},${cy + 2}M${b},${cy - 2}L${b},${cy + 2}`
          }
        />
        <text x={x} y={y} textAnchor={upright ? 'start' : 'middle'} className="s10">
          {name}
          <title>{`Span ${member}`}</title>
        </text>
      </g>
    );
  });
}

/** Centre of mass (a disc in quarters) or of rigidity (a cross in a ring) of a rigid diaphragm. */
export type Centre = { readonly of: 'mass' | 'rigidity'; readonly at: readonly [number, number] };

export function Centres({
  centres,
  unit,
  scale,
}: {
  readonly centres: readonly Centre[];
  readonly unit: string;
  readonly scale: Scale;
}) {
  return centres.map(({ of, at }) => {
    const [x, y] = [scale.x(at[0]), scale.y(at[1])];
    return (
      <g key={of}>
        <circle cx={x} cy={y} r={6} fill="var(--sheet)" stroke="var(--ink)" />
        {of === 'mass' ? (
          <path
            d={`M${x},${y}V${y - 6}A6,6 0 0 1 ${x + 6},${y}ZM${x},${y}V${y + 6}A6,6 0 0 1 ${x - 6},${y}Z`}
            fill="var(--ink)"
          />
        ) : (
          <path d={`M${x - 6},${y}H${x + 6}M${x},${y - 6}V${y + 6}`} stroke="var(--ink)" />
        )}
        <title>{`Centre of ${of}: x ${dimension(at[0])}, y ${dimension(at[1], unit)}`}</title>
      </g>
    );
  });
}

/** The cut of the plan at which the diagrams are read. */
export function CursorLine({
  cursor,
  scale,
  box,
}: {
  readonly cursor: { readonly across: readonly [number, number]; readonly s: number };
  readonly scale: Scale;
  readonly box: Box;
}) {
  const { across, s } = cursor;
  const [px, py] = [across[0] * s, across[1] * s];
  const reach = Math.hypot(box.x1 - box.x0, box.y1 - box.y0);
  const centre = -across[1] * ((box.x0 + box.x1) / 2) + across[0] * ((box.y0 + box.y1) / 2);
  const at = (t: number): [number, number] => [scale.x(px - across[1] * t), scale.y(py + across[0] * t)];
  const [x1, y1] = at(centre - reach);
  const [x2, y2] = at(centre + reach);
  return <line x1={x1} y1={y1} x2={x2} y2={y2} className="cursor" />;
}

/** Direction and sense of the load, beside the plan's upper right corner. */
export function LoadArrow({
  load,
  scale,
  box,
}: {
  readonly load: readonly [number, number];
  readonly scale: Scale;
  readonly box: Box;
}) {
  const x = scale.x(box.x1) - 8 - 30 * Math.abs(load[0]);
  const y = scale.y(box.y1) + 8 + 30 * Math.abs(load[1]);
  const [dx, dy] = [load[0] * 26, -load[1] * 26];
  const [px, py] = [-dy / 26, dx / 26];
  const tip = [x + dx, y + dy] as const;
  const head = `${tip[0]},${tip[1]} ${tip[0] - dx * 0.38 + px * 5},${tip[1] - dy * 0.38 + py * 5} ${tip[0] - dx * 0.38 - px * 5},${tip[1] - dy * 0.38 - py * 5}`;
  return (
    <g role="img" aria-label="Direction of the load">
      <line
        x1={x - dx}
        y1={y - dy}
        x2={tip[0] - dx * 0.3}
        y2={tip[1] - dy * 0.3}
        stroke="var(--force)"
        strokeWidth={2.5}
      />
      <polygon points={head} fill="var(--force)" />
    </g>
  );
}

export function ScaleBar({ unit, scale, box }: { readonly unit: string; readonly scale: Scale; readonly box: Box }) {
  const bar = barLength(box);
  const width = bar * scale.perUnit;
  return (
    <g transform={`translate(${scale.x(box.x0)},${scale.height - 7})`}>
      <path d={`M0,-3V3M0,0H${width}M${width},-3V3M${width / 2},-2V2`} stroke="var(--ink-2)" fill="none" />
      <text x={width + 6} y={4} className="s10">
        {dimension(bar, unit)}
      </text>
    </g>
  );
}
