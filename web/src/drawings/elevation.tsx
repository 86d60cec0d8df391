'use client';
import type { Building, Level, Pier, WallLine } from '@groundward/engine/building/definition';
import type { Demand } from '@groundward/engine/path/result';
import type { GonePier } from '@/lib/changes';
import { axisOf, levelsAscending, type DemandIndex, type Loading } from '@/lib/demands';
import { dimension, quantity } from '@/lib/format';
import { Arrival, Departure, EndForces, Post, type PostState } from './elevation-signs';
import type { Mark } from './plan-lines';

export type ElevationForces = Loading & {
  readonly index: DemandIndex;
  /** End forces are those of this combination; left out, of the case alone. */
  readonly combination?: string | undefined;
  readonly origin: (demand: Demand) => string;
};

export type ElevationView = {
  readonly building: Building;
  readonly line: WallLine;
  /** Left out, the wall is drawn without forces. */
  readonly forces?: ElevationForces | undefined;
  readonly marks?: ReadonlyMap<string, Mark> | undefined;
  /** Piers that are no longer there. */
  readonly gone?: readonly GonePier[] | undefined;
  /** End posts that do not stand on an end post, by their key, with the finding. */
  readonly posts?: ReadonlyMap<string, PostState> | undefined;
};

const LEFT = 118;
const RIGHT = 30;
const TOP = 24;
const FOOT = 40;
/** A storey is drawn at least so high that it can be written in [px]. */
const LEAST_STOREY = 70;
const LEAST_PLAIN = 42;
/** A short wall is drawn at most so high [px]. */
const MOST_HEIGHT = 560;

/** Elevation of a wall line: piers of every storey to scale, what arrives from each diaphragm, shears and end forces. */
export function ElevationDrawing({ view, width }: { readonly view: ElevationView; readonly width: number }) {
  const { building, line, forces } = view;
  const levels = levelsAscending(building);
  const { length } = axisOf(line);
  const base = levels[0]?.elevation ?? 0;
  const top = levels[levels.length - 1]?.elevation ?? 1;
  const across = Math.min(Math.max(60, width - LEFT - RIGHT) / length, MOST_HEIGHT / (top - base));
  const lowest = Math.min(...levels.slice(1).map((level, i) => level.elevation - (levels[i]?.elevation ?? 0)));
  const up = Math.max(across, (forces === undefined ? LEAST_PLAIN : LEAST_STOREY) / lowest);
  const height = (top - base) * up + TOP + FOOT;
  const x = (d: number): number => LEFT + d * across;
  const y = (z: number): number => TOP + (top - z) * up;
  const unit = building.units.force;
  const sheet = Math.max(LEFT + length * across + RIGHT, 300);
  return (
    <svg width={sheet} height={height} role="img" aria-label={`Elevation of wall line ${line.name ?? line.id}`}>
      {levels.map((level, i) => (
        <LevelMark
          key={level.id}
          level={level}
          y={y(level.elevation)}
          ground={i === 0}
          width={sheet}
          building={building}
        />
      ))}
      {levels.slice(1).map((level, i) => {
        const below = levels[i];
        const storey = line.storeys.find(({ under }) => under === level.id);
        if (storey === undefined || below === undefined) return null;
        const member = `${line.id}/${level.id}`;
        const of = (what: 'reaction' | 'shear') => forces?.index.of(member, what, forces.caseId, forces.sense);
        const [reaction, shear] = [of('reaction'), of('shear')];
        const goesOn = i === 0 || line.storeys.some(({ under }) => under === below.id);
        return (
          <g key={level.id}>
            {forces !== undefined && reaction !== undefined && (
              <Arrival demand={reaction} from={forces.origin(reaction)} x={LEFT - 14} y={y(level.elevation)} />
            )}
            {storey.piers.map((pier) => (
              <PierShape
                key={pier.id}
                view={view}
                pier={pier}
                member={`${member}/${pier.id}`}
                box={{
                  x: x(pier.from),
                  width: (pier.to - pier.from) * across,
                  y: y(level.elevation),
                  height: (level.elevation - below.elevation) * up,
                }}
                x={x}
              />
            ))}
            {forces !== undefined && shear !== undefined && !goesOn && (
              <Departure
                text={`${quantity(Math.abs(shear.value), unit)} into the diaphragm`}
                from={`Line ${line.id} stops at ${below.name ?? below.id}: its shear goes through the diaphragm to other lines.`}
                x={x(length / 2)}
                y={y(below.elevation)}
                direction={shear.value < 0 ? -1 : 1}
              />
            )}
          </g>
        );
      })}
      <text x={sheet - RIGHT} y={height - 6} textAnchor="end" className="s10">
        {up > across * 1.01
          ? `heights drawn ${(up / across).toFixed(1)} times as large as lengths`
          : `line ${line.id}, ${dimension(length, building.units.length)}, heights and lengths to one scale`}
      </text>
    </svg>
  );
}

function LevelMark({
  level,
  y,
  ground,
  width,
  building,
}: {
  readonly level: Level;
  readonly y: number;
  readonly ground: boolean;
  readonly width: number;
  readonly building: Building;
}) {
  return (
    <g>
      <line
        x1={LEFT - 10}
        x2={width - RIGHT + 10}
        y1={y}
        y2={y}
        stroke={ground ? 'var(--ink)' : 'var(--hair-2)'}
        strokeWidth={ground ? 2.5 : 1}
      />
      <text x={0} y={y + 4} className="s12 t-ink">
        {level.name ?? level.id}
      </text>
      <text x={0} y={y + 18} className="s10">
        {dimension(level.elevation, building.units.length)}
      </text>
    </g>
  );
}

function PierShape({
  view,
  pier,
  member,
  box,
  x,
}: {
  readonly view: ElevationView;
  readonly pier: Pier;
  readonly member: string;
  readonly box: { readonly x: number; readonly y: number; readonly width: number; readonly height: number };
  readonly x: (d: number) => number;
}) {
  const { forces } = view;
  const mark = view.marks?.get(member);
  const [near, far] =
    typeof pier.endOffset === 'number' ? [pier.endOffset, pier.endOffset] : (pier.endOffset ?? [0, 0]);
  const foot = box.y + box.height;
  const posts = { from: pier.from + near, to: pier.to - far };
  const middle = box.x + box.width / 2;
  const of = (what: Demand['quantity'], combination?: string) =>
    forces?.index.of(member, what, forces.caseId, forces.sense, combination);
  const [shear, unitShear] = [of('shear'), of('unit-shear')];
  return (
    <g>
      <rect {...box} className="pier" style={mark === undefined ? undefined : { fill: mark.colour, fillOpacity: 0.28 }}>
        <title>{`Pier ${member}${mark === undefined ? '' : `: ${mark.says}`}`}</title>
      </rect>
      {(['from', 'to'] as const).map((end) => (
        <Post key={end} x={x(posts[end])} top={box.y} foot={foot} state={view.posts?.get(`${member}/${end}`)} />
      ))}
      <text x={middle} y={box.y + 14} textAnchor="middle" className="s10 t-ink">
        {pier.id}
      </text>
      {mark !== undefined && (
        <text
          x={middle}
          y={box.y + box.height / 2 + 6}
          textAnchor="middle"
          className="sign"
          style={{ fill: mark.colour }}
        >
          {mark.sign}
        </text>
      )}
      {forces !== undefined && shear !== undefined && box.width > 44 && (
        <text
          x={middle}
          y={box.y + box.height / 2 + 3}
          textAnchor="middle"
          className="s12 t-force"
          data-from={forces.origin(shear)}
        >
          {quantity(shear.value, shear.unit)}
        </text>
      )}
      {forces !== undefined && unitShear !== undefined && box.width > 44 && (
        <text
          x={middle}
          y={box.y + box.height / 2 + 17}
          textAnchor="middle"
          className="s10"
          data-from={forces.origin(unitShear)}
        >
          {quantity(unitShear.value, unitShear.unit)}
        </text>
      )}
      {forces !== undefined && (
        <EndForces
          line={view.line}
          tension={of('end-tension', forces.combination)}
          compression={of('end-compression', forces.combination)}
          posts={posts}
          x={x}
          foot={foot}
          origin={forces.origin}
        />
      )}
    </g>
  );
}
