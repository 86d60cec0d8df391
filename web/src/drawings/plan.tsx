'use client';
import type { Building, Point } from '@groundward/engine/building/definition';
import { axisOf } from '@/lib/demands';
import type { GonePier } from '@/lib/changes';
import { CollectorShape, largestAxial, type CollectorView } from './collector';
import { LineLabel, WallLineShape, type Mark } from './plan-lines';
import { Centres, CursorLine, LoadArrow, ScaleBar, SpanNames, type Centre, type SpanName } from './plan-signs';
import type { Box, Scale } from './scale';

export type PlanView = {
  readonly building: Building;
  readonly level: string;
  /** Unit vector of the load with its sense; none draws no arrow. */
  readonly load?: readonly [number, number] | undefined;
  readonly collectors?: readonly CollectorView[] | undefined;
  readonly spans?: readonly SpanName[] | undefined;
  /** Centres of a rigid diaphragm. */
  readonly centres?: readonly Centre[] | undefined;
  /** Where along the span the diagrams are read: a point of the plan has s = across · p. */
  readonly cursor?: { readonly across: readonly [number, number]; readonly s: number } | undefined;
  /** Marks of piers, by member key. */
  readonly marks?: ReadonlyMap<string, Mark> | undefined;
  /** Piers that are no longer there. */
  readonly gone?: readonly GonePier[] | undefined;
  readonly shown?: string | undefined;
};

/** Corners of all levels' outlines and wall lines, so that every level's plan stands at the same place. */
export function planBox(building: Building): [number, number][] {
  const points: [number, number][] = [];
  for (const level of building.levels)
    for (const diaphragm of level.diaphragms ?? []) points.push(...diaphragm.outline);
  for (const line of building.wallLines) points.push(...line.axis);
  return points;
}

/** A level's plan to scale: outline, openings, zones, wall lines, piers, collectors, span names, the load's direction. */
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
  const collectors = plan.collectors ?? [];
  const most = largestAxial(collectors);
  return (
    <svg
      width={scale.width}
      height={scale.height}
      role={onPick === undefined ? 'img' : 'group'}
      aria-label={`Plan of level ${level}`}
    >
      <Floors plan={plan} scale={scale} />
      {plan.cursor !== undefined && <CursorLine cursor={plan.cursor} scale={scale} box={box} />}
      {building.wallLines.map((line) => (
        <WallLineShape
          key={line.id}
          line={line}
          level={level}
          units={building.units}
          scale={scale}
          shown={plan.shown === line.id}
          marks={plan.marks}
          onPick={onPick}
        />
      ))}
      {(plan.gone ?? [])
        .filter(({ under }) => under === level)
        .map(({ line, pier }) => (
          <GoneShape key={`${line.id}/${pier.id}`} line={line} pier={pier} scale={scale} />
        ))}
      {collectors.map((collector) => (
        <CollectorShape
          key={collector.line.id}
          collector={collector}
          scale={scale}
          most={most}
          named={plan.shown === collector.line.id}
        />
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
      <Centres centres={plan.centres ?? []} unit={building.units.length} scale={scale} />
      <SpanNames spans={plan.spans ?? []} scale={scale} box={box} />
      {plan.load !== undefined && <LoadArrow load={plan.load} scale={scale} box={box} />}
      <ScaleBar unit={building.units.length} scale={scale} box={box} />
    </svg>
  );
}

function GoneShape({ line, pier, scale }: Pick<GonePier, 'line' | 'pier'> & { readonly scale: Scale }) {
  const [a] = line.axis;
  const { u } = axisOf(line);
  const at = (d: number) => [scale.x(a[0] + u[0] * d), scale.y(a[1] + u[1] * d)] as const;
  const [[x1, y1], [x2, y2]] = [at(pier.from), at(pier.to)];
  return (
    <g>
      <line x1={x1} y1={y1} x2={x2} y2={y2} className="gone" />
      <text x={(x1 + x2) / 2} y={(y1 + y2) / 2 - 6} textAnchor="middle" className="sign halo gone-sign">
        ✕
      </text>
      <title>{`Pier ${pier.id} of line ${line.id} is gone`}</title>
    </g>
  );
}

function Floors({ plan, scale }: { readonly plan: PlanView; readonly scale: Scale }) {
  const path = (ring: readonly Point[]): string =>
    `M${ring.map(([x, y]) => `${scale.x(x).toFixed(1)},${scale.y(y).toFixed(1)}`).join('L')}Z`;
  const diaphragms = plan.building.levels.find((candidate) => candidate.id === plan.level)?.diaphragms ?? [];
  return diaphragms.map((diaphragm) => (
    <g key={diaphragm.id}>
      <path
        className="floor"
        d={[diaphragm.outline, ...(diaphragm.openings ?? []).map(({ outline }) => outline)].map(path).join(' ')}
      >
        <title>{`${diaphragm.name ?? diaphragm.id}, ${diaphragm.behaviour ?? 'flexible'}`}</title>
      </path>
      {(diaphragm.weight?.zones ?? []).map((zone) => (
        <path key={zone.id} className="zone" d={path(zone.outline)} />
      ))}
      {(diaphragm.openings ?? []).map((opening) => (
        <path
          key={opening.id}
          className="void"
          d={`M${corner(opening.outline, scale, 0)}L${corner(opening.outline, scale, 2)}M${corner(opening.outline, scale, 1)}L${corner(opening.outline, scale, 3)}`}
        >
          <title>{`Opening ${opening.name ?? opening.id}`}</title>
        </path>
      ))}
    </g>
  ));
}

function corner(ring: readonly Point[], scale: Scale, i: number): string {
  const point = ring[Math.floor((i * ring.length) / 4) % ring.length] ?? [0, 0];
  return `${scale.x(point[0]).toFixed(1)},${scale.y(point[1]).toFixed(1)}`;
}
