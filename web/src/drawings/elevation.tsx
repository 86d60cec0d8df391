'use client';
import type { Building, WallLine } from '@groundward/engine/building/definition';
import type { Sense } from '@groundward/engine/path/result';
import { levelsAscending, type DemandIndex } from '@/lib/demands';
import { figure, quantity } from '@/lib/format';

export type ElevationView = {
  readonly building: Building;
  readonly line: WallLine;
  /** Left out, the wall is drawn without forces. */
  readonly forces?: { readonly index: DemandIndex; readonly caseId: string; readonly sense: Sense } | undefined;
  readonly marks?: ReadonlyMap<string, string> | undefined;
  /** Posts that find nothing below them, by end-post key. */
  readonly openPosts?: ReadonlySet<string> | undefined;
};

const LEFT = 118;
const RIGHT = 24;
const TOP = 22;
const FOOT = 46;

/** Elevation of a wall line: piers of every storey to scale, what arrives from each diaphragm, shears and end forces. */
export function ElevationDrawing({ view, width }: { readonly view: ElevationView; readonly width: number }) {
  const { building, line } = view;
  const levels = levelsAscending(building);
  const [a, b] = line.axis;
  const length = Math.hypot(b[0] - a[0], b[1] - a[1]);
  const base = levels[0]?.elevation ?? 0;
  const top = levels[levels.length - 1]?.elevation ?? 1;
  const across = Math.max(60, width - LEFT - RIGHT) / length;
  // Storeys are drawn at least high enough to be written in.
  const up = Math.max(across, (78 * (levels.length - 1)) / (top - base));
  const height = (top - base) * up + TOP + FOOT;
  const x = (d: number): number => LEFT + d * across;
  const y = (z: number): number => TOP + (top - z) * up;
  const { force, length: unit } = building.units;
  return (
    <svg width={width} height={height} role="img" aria-label={`Elevation of wall line ${line.id}`}>
      {levels.map((level, i) => (
        <g key={level.id}>
          <line
            x1={LEFT - 10}
            x2={width - RIGHT + 10}
            y1={y(level.elevation)}
            y2={y(level.elevation)}
            stroke={i === 0 ? 'var(--ink)' : 'var(--hair-2)'}
            strokeWidth={i === 0 ? 2 : 1}
          />
          <text x={4} y={y(level.elevation) + 4} fontSize={12} className="t-ink">
            {level.name ?? level.id}
          </text>
          <text x={4} y={y(level.elevation) + 18} fontSize={10}>
            {`${figure(level.elevation)} ${unit}`}
          </text>
        </g>
      ))}
      {levels.slice(1).map((level, i) => {
        const below = levels[i];
        const storey = line.storeys.find((candidate) => candidate.under === level.id);
        if (storey === undefined || below === undefined) return null;
        const member = `${line.id}/${level.id}`;
        const reaction = view.forces?.index.of(member, 'reaction', view.forces.caseId, view.forces.sense);
        return (
          <g key={level.id}>
            {reaction !== undefined && <Reaction value={reaction.value} y={y(level.elevation)} unit={force} />}
            {storey.piers.map((pier) => {
              const key = `${member}/${pier.id}`;
              const mark = view.marks?.get(key);
              const x1 = x(pier.from);
              const w = (pier.to - pier.from) * across;
              const y1 = y(level.elevation);
              const h = (level.elevation - below.elevation) * up;
              const shear = view.forces?.index.of(key, 'shear', view.forces.caseId, view.forces.sense);
              const unitShear = view.forces?.index.of(key, 'unit-shear', view.forces.caseId, view.forces.sense);
              const tension = view.forces?.index.of(key, 'end-tension', view.forces.caseId, view.forces.sense);
              const [near, far] =
                typeof pier.endOffset === 'number' ? [pier.endOffset, pier.endOffset] : (pier.endOffset ?? [0, 0]);
              const pull = (shear?.value ?? 0) >= 0 ? 'from' : 'to';
              return (
                <g key={pier.id}>
                  <rect
                    x={x1}
                    y={y1}
                    width={w}
                    height={h}
                    fill={mark ?? 'var(--floor)'}
                    fillOpacity={mark === undefined ? 1 : 0.35}
                    stroke="var(--ink)"
                    strokeWidth={1}
                  >
                    <title>{`Pier ${key}`}</title>
                  </rect>
                  <Post
                    x={x(pier.from + near)}
                    y1={y1}
                    y2={y1 + h}
                    open={view.openPosts?.has(`${key}/from`) ?? false}
                  />
                  <Post x={x(pier.to - far)} y1={y1} y2={y1 + h} open={view.openPosts?.has(`${key}/to`) ?? false} />
                  <text x={x1 + w / 2} y={y1 + 15} fontSize={11} textAnchor="middle" className="t-ink">
                    {pier.id}
                  </text>
                  {unitShear !== undefined && w > 46 && (
                    <>
                      <text x={x1 + w / 2} y={y1 + h / 2 + 2} fontSize={12} textAnchor="middle" className="t-force">
                        {quantity(shear?.value ?? 0, force)}
                      </text>
                      <text x={x1 + w / 2} y={y1 + h / 2 + 16} fontSize={10.5} textAnchor="middle">
                        {quantity(unitShear.value, unitShear.unit)}
                      </text>
                    </>
                  )}
                  {tension !== undefined && tension.value > 0 && (
                    <EndForces x1={x1} w={w} y={y1 + h} value={tension.value} pull={pull} />
                  )}
                </g>
              );
            })}
          </g>
        );
      })}
    </svg>
  );
}

function Post({
  x,
  y1,
  y2,
  open,
}: {
  readonly x: number;
  readonly y1: number;
  readonly y2: number;
  readonly open: boolean;
}) {
  return (
    <g>
      <line x1={x} x2={x} y1={y1} y2={y2} stroke="var(--ink-2)" strokeWidth={2} />
      {open && (
        <path
          d={`M${x - 5},${y2 - 5}L${x + 5},${y2 + 5}M${x + 5},${y2 - 5}L${x - 5},${y2 + 5}`}
          stroke="var(--alarm)"
          strokeWidth={2}
        >
          <title>This end post stands on nothing.</title>
        </path>
      )}
    </g>
  );
}

/** What the diaphragm gives to the line at its level. */
function Reaction({ value, y, unit }: { readonly value: number; readonly y: number; readonly unit: string }) {
  const dir = value >= 0 ? 1 : -1;
  const [x1, x2] = dir === 1 ? [LEFT - 46, LEFT - 14] : [LEFT - 14, LEFT - 46];
  return (
    <g>
      <line x1={x1} x2={x2} y1={y - 6} y2={y - 6} stroke="var(--force)" strokeWidth={2.5} />
      <polygon points={`${x2},${y - 6} ${x2 - dir * 8},${y - 10} ${x2 - dir * 8},${y - 2}`} fill="var(--force)" />
      <text x={LEFT - 12} y={y - 13} fontSize={11} textAnchor="end" className="t-force">
        {quantity(value, unit)}
      </text>
    </g>
  );
}

/** Tension and compression at the foot, by arrow, sign and colour. */
function EndForces({
  x1,
  w,
  y,
  value,
  pull,
}: {
  readonly x1: number;
  readonly w: number;
  readonly y: number;
  readonly value: number;
  readonly pull: 'from' | 'to';
}) {
  const label = figure(value, 3);
  const at = (end: 'from' | 'to'): number => (end === 'from' ? x1 + 3 : x1 + w - 3);
  const push = pull === 'from' ? 'to' : 'from';
  const anchor = (end: 'from' | 'to'): 'start' | 'end' => (end === 'from' ? 'start' : 'end');
  return (
    <>
      <text x={at(pull)} y={y - 5} fontSize={10.5} textAnchor={anchor(pull)} className="t-tension">
        {`↑${label}`}
      </text>
      <text x={at(push)} y={y - 5} fontSize={10.5} textAnchor={anchor(push)} className="t-compression">
        {`↓${label}`}
      </text>
    </>
  );
}
