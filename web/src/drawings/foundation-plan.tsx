'use client';
import type { Building, WallLine } from '@groundward/engine/building/definition';
import type { Support } from '@groundward/engine/foundation/result';
import { axisOf, levelsAscending } from '@/lib/demands';
import { dimension, quantity, words } from '@/lib/format';
import { LineLabel } from './plan-lines';
import { ScaleBar } from './plan-signs';
import { Picked } from './picked';
import { placeLabels } from './labels';
import type { Box, Scale } from './scale';

/** Where every end post and pier foot comes down, with its label. Feet of piers are discs, posts are squares, filled where they lift. */
export function FoundationPlan({
  building,
  supports,
  scale,
  box,
  shown,
  onPick,
}: {
  readonly building: Building;
  readonly supports: readonly Support[];
  readonly scale: Scale;
  readonly box: Box;
  readonly shown: string;
  readonly onPick: (member: string) => void;
}) {
  const lowest = levelsAscending(building)[1];
  const points = supports.map((support) => ({
    x: scale.x(support.at[0]),
    y: scale.y(support.at[1]),
    text: support.label,
  }));
  const labels = placeLabels(points, { width: scale.width, height: scale.height });
  return (
    <svg width={scale.width} height={scale.height} role="group" aria-label="Foundation plan">
      {(lowest?.diaphragms ?? []).map((diaphragm) => (
        <polygon
          key={diaphragm.id}
          points={diaphragm.outline.map(([x, y]) => `${scale.x(x)},${scale.y(y)}`).join(' ')}
          className="floor"
        />
      ))}
      {building.wallLines.map((line) => (
        <LowestPiers key={line.id} line={line} under={lowest?.id ?? ''} scale={scale} />
      ))}
      {building.wallLines.map((line) => (
        <LineLabel
          key={line.id}
          line={line}
          scale={scale}
          box={box}
          braced={line.storeys.some(({ under }) => under === lowest?.id)}
        />
      ))}
      {supports.map((support, i) => {
        const on = shown === support.member;
        const [x, y] = [scale.x(support.at[0]), scale.y(support.at[1])];
        const label = labels[i];
        return (
          <Picked
            key={support.member}
            label={`Support ${support.label}, ${support.member}`}
            shown={on}
            onPick={() => onPick(support.member)}
          >
            <g data-from={summary(support, building)}>
              <rect x={x - 8} y={y - 8} width={16} height={16} fill="transparent" />
              <Sign support={support} x={x} y={y} on={on} />
              {(on || label !== undefined) && (
                <text
                  x={label?.x ?? x + 8}
                  y={label?.y ?? y - 7}
                  textAnchor={label?.anchor ?? 'start'}
                  className={on ? 's12 t-force halo' : 's10 halo'}
                >
                  {support.label}
                </text>
              )}
            </g>
          </Picked>
        );
      })}
      <ScaleBar unit={building.units.length} scale={scale} box={box} />
    </svg>
  );
}

function isPost(member: string): boolean {
  return /\/(from|to)$/.test(member);
}

/** A post that comes down where no pier stands under the lowest level is drawn open, standing on its corner. */
function Sign({
  support,
  x,
  y,
  on,
}: {
  readonly support: Support;
  readonly x: number;
  readonly y: number;
  readonly on: boolean;
}) {
  const lifts = support.demands.some(({ quantity: what, governing }) => what === 'uplift' && governing);
  const fill = on ? 'var(--force)' : lifts ? 'var(--tension)' : 'var(--sheet)';
  if (!isPost(support.member))
    return <circle cx={x} cy={y} r={on ? 5 : 3} fill={on ? 'var(--force)' : 'var(--ink-2)'} />;
  const alone = support.member.split('/').length === 4;
  return (
    <rect
      x={x - 4}
      y={y - 4}
      width={8}
      height={8}
      fill={fill}
      stroke="var(--ink)"
      transform={alone ? `rotate(45 ${x} ${y})` : undefined}
    />
  );
}

function summary(support: Support, building: Building): string {
  const unit = building.units.length;
  const place = `x ${dimension(support.at[0])}, y ${dimension(support.at[1], unit)}`;
  const governing = support.demands
    .filter((demand) => demand.governing)
    .map(
      (demand) =>
        `${words(demand.quantity)} ${quantity(demand.value, demand.unit)} (${demand.case}, ${demand.combination ?? 'unfactored'})`,
    );
  return [`${support.label}, ${support.member}, at ${place}`, ...governing].join('\n');
}

function LowestPiers({
  line,
  under,
  scale,
}: {
  readonly line: WallLine;
  readonly under: string;
  readonly scale: Scale;
}) {
  const [a, b] = line.axis;
  const { u } = axisOf(line);
  const at = (d: number) => ({ x: scale.x(a[0] + u[0] * d), y: scale.y(a[1] + u[1] * d) });
  return (
    <g>
      <line x1={scale.x(a[0])} y1={scale.y(a[1])} x2={scale.x(b[0])} y2={scale.y(b[1])} className="axis" />
      {(line.storeys.find((storey) => storey.under === under)?.piers ?? []).map((pier) => {
        const [p, q] = [at(pier.from), at(pier.to)];
        return <line key={pier.id} x1={p.x} y1={p.y} x2={q.x} y2={q.y} stroke="var(--wall)" strokeWidth={3} />;
      })}
    </g>
  );
}
