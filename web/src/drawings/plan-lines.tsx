'use client';
import type { Units, WallLine } from '@groundward/engine/building/definition';
import { axisOf } from '@/lib/demands';
import { dimension } from '@/lib/format';
import type { Box, Scale } from './scale';

/** How a pier is marked: by colour and by a sign, so that nothing hangs on the colour. */
export type Mark = { readonly colour: string; readonly sign: string; readonly says: string };

/** A wall line's trace on plan with the piers under the level. */
export function WallLineShape({
  line,
  level,
  units,
  scale,
  shown,
  marks,
  onPick,
}: {
  readonly line: WallLine;
  readonly level: string;
  readonly units: Units;
  readonly scale: Scale;
  readonly shown: boolean;
  readonly marks: ReadonlyMap<string, Mark> | undefined;
  readonly onPick: ((line: string) => void) | undefined;
}) {
  const [a] = line.axis;
  const { u, length } = axisOf(line);
  const at = (d: number): [number, number] => [scale.x(a[0] + u[0] * d), scale.y(a[1] + u[1] * d)];
  const piers = line.storeys.find((storey) => storey.under === level)?.piers ?? [];
  const [ax, ay] = at(0);
  const [bx, by] = at(length);
  const picks =
    onPick === undefined
      ? {}
      : {
          className: 'pick',
          tabIndex: 0,
          role: 'button',
          'aria-label': `Wall line ${line.name ?? line.id}`,
          'aria-pressed': shown,
          onClick: () => onPick(line.id),
          onKeyDown: (event: { readonly key: string }) => event.key === 'Enter' && onPick(line.id),
        };
  return (
    <g {...picks}>
      <line x1={ax} y1={ay} x2={bx} y2={by} className={shown ? 'axis shown' : 'axis'} />
      <line x1={ax} y1={ay} x2={bx} y2={by} stroke="transparent" strokeWidth={14} />
      {piers.map((pier) => {
        const [x1, y1] = at(pier.from);
        const [x2, y2] = at(pier.to);
        const mark = marks?.get(`${line.id}/${level}/${pier.id}`);
        return (
          <g key={pier.id}>
            <line
              x1={x1}
              y1={y1}
              x2={x2}
              y2={y2}
              stroke={mark?.colour ?? 'var(--wall)'}
              strokeWidth={mark === undefined ? 4 : 6}
            >
              <title>
                {`Pier ${line.id}/${level}/${pier.id}, from ${dimension(pier.from)} to ${dimension(pier.to, units.length)}${mark === undefined ? '' : `: ${mark.says}`}`}
              </title>
            </line>
            {mark !== undefined && (
              <text
                x={(x1 + x2) / 2 + 11 * Math.abs(u[1])}
                y={(y1 + y2) / 2 + 4 - 10 * Math.abs(u[0])}
                textAnchor="middle"
                className="sign halo"
                style={{ fill: mark.colour }}
              >
                {mark.sign}
              </text>
            )}
          </g>
        );
      })}
    </g>
  );
}

/** The line's name at its first end, outside whatever is drawn of any level. */
export function LineLabel({
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
  const [a] = line.axis;
  const { u } = axisOf(line);
  const edge = (value: number, low: number, high: number): number =>
    Math.min(Math.abs(value - low), Math.abs(value - high));
  // How far the first end stands inside the box, along the line: at most a small overhang is skipped.
  const inside = Math.abs(u[0]) > Math.abs(u[1]) ? edge(a[0], box.x0, box.x1) : edge(a[1], box.y0, box.y1);
  const skip = inside * scale.perUnit < 40 ? inside * scale.perUnit : 0;
  const x = scale.x(a[0]) - u[0] * (skip + 18);
  const y = scale.y(a[1]) + u[1] * (skip + 18);
  const half = Math.max(8.5, 3.5 + line.id.length * 3.2);
  return (
    <g pointerEvents="none">
      <rect
        x={x - half}
        y={y - 8.5}
        width={2 * half}
        height={17}
        rx={8.5}
        className={braced ? 'bubble' : 'bubble unbraced'}
      />
      <text x={x} y={y + 3.5} textAnchor="middle" className="s10 t-ink">
        {line.id}
      </text>
    </g>
  );
}
