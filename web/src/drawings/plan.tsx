'use client';
import type { Building, Point, WallLine } from '@groundward/engine/building/definition';
import { figure } from '@/lib/format';
import { barLength, type Box, type Scale } from './scale';

export type PlanCollector = {
  readonly line: string;
  readonly points: readonly { readonly at: number; readonly axial: number }[];
};

export type PlanView = {
  readonly building: Building;
  readonly level: string;
  /** Unit vector of the load with its sense; none draws no arrow. */
  readonly load?: readonly [number, number] | undefined;
  readonly collectors?: readonly PlanCollector[] | undefined;
  /** Marks of piers and wall lines, by member key: a CSS colour. */
  readonly marks?: ReadonlyMap<string, string> | undefined;
  readonly shown?: string | undefined;
};

/** The box of all levels' outlines and wall lines, so that every level's plan stands at the same place. */
export function planBox(building: Building): [number, number][] {
  const points: [number, number][] = [];
  for (const level of building.levels)
    for (const diaphragm of level.diaphragms ?? []) points.push(...diaphragm.outline);
  for (const line of building.wallLines) points.push(...line.axis);
  return points;
}

/** A level's plan to scale: outline, openings, zones, wall lines, piers, collectors, the load's direction. */
export function PlanDrawing({
  plan,
  scale,
  box,
  onPick,
}: {
  readonly plan: PlanView;
  readonly scale: Scale;
  readonly box: Box;
  readonly onPick?: ((line: string) => void) | undefined;
}) {
  const { building, level } = plan;
  const path = (ring: readonly Point[]): string =>
    `M${ring.map(([x, y]) => `${scale.x(x).toFixed(1)},${scale.y(y).toFixed(1)}`).join('L')}Z`;
  const diaphragms = building.levels.find((candidate) => candidate.id === level)?.diaphragms ?? [];
  const bar = barLength(box);
  const most = Math.max(
    1e-12,
    ...(plan.collectors ?? []).flatMap((collector) => collector.points.map((point) => Math.abs(point.axial))),
  );
  return (
    <svg width={scale.width} height={scale.height} role="img" aria-label={`Plan of level ${level}`}>
      {diaphragms.map((diaphragm) => (
        <g key={diaphragm.id}>
          <path
            d={[diaphragm.outline, ...(diaphragm.openings ?? []).map((o) => o.outline)].map(path).join(' ')}
            fillRule="evenodd"
            fill="var(--floor)"
            stroke="var(--ink-2)"
            strokeWidth={1}
          />
          {(diaphragm.weight?.zones ?? []).map((zone) => (
            <path key={zone.id} d={path(zone.outline)} fill="none" stroke="var(--hair-2)" strokeDasharray="2 3" />
          ))}
          {(diaphragm.openings ?? []).map((opening) => (
            <g key={opening.id}>
              <path
                d={`M${corner(opening.outline, scale, 0)}L${corner(opening.outline, scale, 2)}M${corner(opening.outline, scale, 1)}L${corner(opening.outline, scale, 3)}`}
                stroke="var(--hair-2)"
              />
              <title>{`Opening ${opening.name ?? opening.id}`}</title>
            </g>
          ))}
        </g>
      ))}
      {building.wallLines.map((line) => {
        const [a, b] = line.axis;
        const length = Math.hypot(b[0] - a[0], b[1] - a[1]);
        const u = [(b[0] - a[0]) / length, (b[1] - a[1]) / length] as const;
        const at = (d: number): [number, number] => [scale.x(a[0] + u[0] * d), scale.y(a[1] + u[1] * d)];
        const below = line.storeys.find((storey) => storey.under === level);
        const [ax, ay] = at(0);
        const [bx, by] = at(length);
        const on = plan.shown === line.id;
        return (
          <g
            key={line.id}
            className={onPick === undefined ? undefined : 'pick'}
            tabIndex={onPick === undefined ? undefined : 0}
            role={onPick === undefined ? undefined : 'button'}
            aria-label={`Wall line ${line.id}`}
            onClick={() => onPick?.(line.id)}
            onKeyDown={(event) => event.key === 'Enter' && onPick?.(line.id)}
          >
            <line
              x1={ax}
              y1={ay}
              x2={bx}
              y2={by}
              stroke={on ? 'var(--force)' : 'var(--ink-3)'}
              strokeWidth={on ? 1.6 : 0.8}
              strokeDasharray="10 3 2 3"
            />
            <line x1={ax} y1={ay} x2={bx} y2={by} stroke="transparent" strokeWidth={12} />
            {(below?.piers ?? []).map((pier) => {
              const [x1, y1] = at(pier.from);
              const [x2, y2] = at(pier.to);
              const mark = plan.marks?.get(`${line.id}/${level}/${pier.id}`) ?? plan.marks?.get(`${line.id}/${level}`);
              return (
                <line
                  key={pier.id}
                  x1={x1}
                  y1={y1}
                  x2={x2}
                  y2={y2}
                  stroke={mark ?? 'var(--wall)'}
                  strokeWidth={mark === undefined ? 4 : 6}
                >
                  <title>{`Pier ${line.id}/${level}/${pier.id}, ${figure(pier.from)} to ${figure(pier.to)}`}</title>
                </line>
              );
            })}
          </g>
        );
      })}
      {(plan.collectors ?? []).map((collector) => (
        <CollectorShape key={collector.line} collector={collector} building={building} scale={scale} most={most} />
      ))}
      {building.wallLines.map((line) => (
        <LineLabel
          key={line.id}
          line={line}
          scale={scale}
          box={box}
          braced={line.storeys.some((storey) => storey.under === level)}
        />
      ))}
      {plan.load !== undefined && <LoadArrow load={plan.load} scale={scale} box={box} />}
      <g transform={`translate(${scale.x(box.x0)},${scale.height - 7})`}>
        <line x1={0} x2={bar * scale.perUnit} y1={0} y2={0} stroke="var(--ink)" strokeWidth={2} />
        <text x={bar * scale.perUnit + 6} y={4} fontSize={11}>
          {`${figure(bar, 2)} ${building.units.length}`}
        </text>
      </g>
    </svg>
  );
}

/** The line's name at its first end, outside whatever is drawn of any level. */
function LineLabel({
  line,
  scale,
  box,
  braced,
}: {
  readonly line: WallLine;
  readonly scale: Scale;
  readonly box: Box;
  readonly braced: boolean;
}) {
  const [a, b] = line.axis;
  const length = Math.hypot(b[0] - a[0], b[1] - a[1]);
  const u = [(b[0] - a[0]) / length, (b[1] - a[1]) / length] as const;
  const edge = (value: number, low: number, high: number): number =>
    Math.min(Math.abs(value - low), Math.abs(value - high));
  // How far the first end stands inside the box, along the line: at most a small overhang is skipped.
  const inside = Math.abs(u[0]) > Math.abs(u[1]) ? edge(a[0], box.x0, box.x1) : edge(a[1], box.y0, box.y1);
  const skip = inside * scale.perUnit < 40 ? inside * scale.perUnit : 0;
  const x = scale.x(a[0]) - u[0] * (skip + 14);
  const y = scale.y(a[1]) + u[1] * (skip + 14);
  return (
    <g pointerEvents="none">
      <circle
        cx={x}
        cy={y}
        r={8.5}
        fill="var(--sheet)"
        stroke={braced ? 'var(--ink-2)' : 'var(--hair-2)'}
        strokeDasharray={braced ? undefined : '2 2'}
      />
      <text x={x} y={y + 3.5} textAnchor="middle" fontSize={10} className="t-ink">
        {line.id}
      </text>
    </g>
  );
}

function corner(ring: readonly Point[], scale: Scale, i: number): string {
  const point = ring[Math.floor((i * ring.length) / 4) % ring.length] ?? [0, 0];
  return `${scale.x(point[0]).toFixed(1)},${scale.y(point[1]).toFixed(1)}`;
}

/** Axial force drawn square to its line: tension filled, compression hatched by a dashed edge. */
function CollectorShape({
  collector,
  building,
  scale,
  most,
}: {
  readonly collector: PlanCollector;
  readonly building: Building;
  readonly scale: Scale;
  readonly most: number;
}) {
  const line = building.wallLines.find((candidate) => candidate.id === collector.line);
  if (line === undefined || collector.points.length < 2) return null;
  const [a, b] = line.axis;
  const length = Math.hypot(b[0] - a[0], b[1] - a[1]);
  const u = [(b[0] - a[0]) / length, (b[1] - a[1]) / length] as const;
  const reach = 26;
  const shape = (sign: 1 | -1): string => {
    const outline = collector.points.map(({ at, axial }) => {
      const n = (Math.max(0, sign * axial) / most) * reach * sign;
      return `${(scale.x(a[0] + u[0] * at) + u[1] * n).toFixed(1)},${(scale.y(a[1] + u[1] * at) + u[0] * n).toFixed(1)}`;
    });
    const first = collector.points[0];
    const last = collector.points[collector.points.length - 1];
    const base = (at: number): string =>
      `${scale.x(a[0] + u[0] * at).toFixed(1)},${scale.y(a[1] + u[1] * at).toFixed(1)}`;
    return `M${base(first?.at ?? 0)}L${outline.join('L')}L${base(last?.at ?? 0)}Z`;
  };
  return (
    <g pointerEvents="none">
      <path d={shape(1)} fill="var(--tension)" fillOpacity={0.25} stroke="var(--tension)" strokeWidth={1} />
      <path
        d={shape(-1)}
        fill="var(--compression)"
        fillOpacity={0.18}
        stroke="var(--compression)"
        strokeWidth={1}
        strokeDasharray="4 2"
      />
    </g>
  );
}

function LoadArrow({
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
    <g aria-label="Direction of the load">
      <line
        x1={x - dx}
        y1={y - dy}
        x2={tip[0] - dx * 0.3}
        y2={tip[1] - dy * 0.3}
        stroke="var(--force)"
        strokeWidth={3}
      />
      <polygon points={head} fill="var(--force)" />
    </g>
  );
}
