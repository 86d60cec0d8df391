'use client';
import type { Support } from '@groundward/engine/foundation/result';
import type { Building } from '@groundward/engine/building/definition';
import { figure } from '@/lib/format';
import { levelsAscending } from '@/lib/demands';
import type { Scale } from './scale';

/** Where every end post and pier foot comes down, with its label. Feet of piers are bars, posts are squares. */
export function FoundationPlan({
  building,
  supports,
  scale,
  shown,
  onPick,
}: {
  readonly building: Building;
  readonly supports: readonly Support[];
  readonly scale: Scale;
  readonly shown: string;
  readonly onPick: (member: string) => void;
}) {
  const lowest = levelsAscending(building)[1];
  return (
    <svg width={scale.width} height={scale.height} role="group" aria-label="Foundation plan">
      {(lowest?.diaphragms ?? []).map((diaphragm) => (
        <polygon
          key={diaphragm.id}
          points={diaphragm.outline.map(([x, y]) => `${scale.x(x)},${scale.y(y)}`).join(' ')}
          fill="var(--floor)"
          stroke="var(--hair-2)"
        />
      ))}
      {building.wallLines.map((line) => {
        const [a, b] = line.axis;
        const storey = line.storeys.find((candidate) => candidate.under === lowest?.id);
        const length = Math.hypot(b[0] - a[0], b[1] - a[1]);
        return (
          <g key={line.id}>
            <line
              x1={scale.x(a[0])}
              y1={scale.y(a[1])}
              x2={scale.x(b[0])}
              y2={scale.y(b[1])}
              stroke="var(--hair-2)"
              strokeDasharray="10 3 2 3"
            />
            {(storey?.piers ?? []).map((pier) => {
              const at = (d: number): [number, number] => [
                a[0] + ((b[0] - a[0]) * d) / length,
                a[1] + ((b[1] - a[1]) * d) / length,
              ];
              const [p, q] = [at(pier.from), at(pier.to)];
              return (
                <line
                  key={pier.id}
                  x1={scale.x(p[0])}
                  y1={scale.y(p[1])}
                  x2={scale.x(q[0])}
                  y2={scale.y(q[1])}
                  stroke="var(--wall)"
                  strokeWidth={3}
                />
              );
            })}
          </g>
        );
      })}
      {supports.map((support) => {
        const post = /\/(from|to)$/.test(support.member);
        const x = scale.x(support.at[0]);
        const y = scale.y(support.at[1]);
        const on = shown === support.member;
        const uplift = support.demands.find((demand) => demand.quantity === 'uplift' && demand.governing);
        return (
          <g
            key={support.member}
            className="pick"
            tabIndex={0}
            role="button"
            aria-label={`Support ${support.label}, ${support.member}`}
            onClick={() => onPick(support.member)}
            onKeyDown={(event) => event.key === 'Enter' && onPick(support.member)}
          >
            {post ? (
              <rect
                x={x - 4}
                y={y - 4}
                width={8}
                height={8}
                fill={on ? 'var(--force)' : uplift === undefined ? 'var(--sheet)' : 'var(--tension)'}
                stroke="var(--ink)"
              />
            ) : (
              <circle cx={x} cy={y} r={on ? 5 : 3} fill={on ? 'var(--force)' : 'var(--ink-2)'} />
            )}
            {on && (
              <text
                x={x + 8}
                y={y - 7}
                fontSize={12}
                className="t-force"
                stroke="var(--paper)"
                strokeWidth={3}
                paintOrder="stroke"
              >
                {support.label}
              </text>
            )}
            <title>{`${support.label} ${support.member}${uplift === undefined ? '' : `, uplift ${figure(uplift.value)} ${uplift.unit}`}`}</title>
          </g>
        );
      })}
    </svg>
  );
}
