'use client';
import type { WallLine } from '@groundward/engine/building/definition';
import type { Demand } from '@groundward/engine/path/result';
import { axisOf } from '@/lib/demands';
import { figure, quantity } from '@/lib/format';

/** How an end post fails to stand on an end post, with the finding's sentence. */
export type PostState = { readonly rests: 'on-nothing' | 'within-pier'; readonly sentence: string };

export function Post({
  x,
  top,
  foot,
  state,
}: {
  readonly x: number;
  readonly top: number;
  readonly foot: number;
  readonly state: PostState | undefined;
}) {
  return (
    <g>
      <line x1={x} x2={x} y1={top} y2={foot} stroke="var(--ink-2)" strokeWidth={1.6} />
      {state !== undefined && (
        <g data-from={state.sentence}>
          <rect x={x - 8} y={foot - 8} width={16} height={16} fill="transparent" />
          {state.rests === 'on-nothing' ? (
            <path
              d={`M${x - 5},${foot - 5}L${x + 5},${foot + 5}M${x + 5},${foot - 5}L${x - 5},${foot + 5}`}
              className="cross"
            />
          ) : (
            <path d={`M${x},${foot - 6}L${x + 6},${foot + 4}H${x - 6}Z`} className="tri" />
          )}
        </g>
      )}
    </g>
  );
}

/** What the level's diaphragm gives to the line, as an arrow along the line. */
export function Arrival({
  demand,
  from,
  x,
  y,
}: {
  readonly demand: Demand;
  readonly from: string;
  readonly x: number;
  readonly y: number;
}) {
  const direction = demand.value < 0 ? -1 : 1;
  const [tail, tip] = direction === 1 ? [x - 32, x] : [x, x - 32];
  return (
    <g data-from={from}>
      <line x1={tail} x2={tip - direction * 5} y1={y - 6} y2={y - 6} stroke="var(--force)" strokeWidth={2} />
      <polygon
        points={`${tip},${y - 6} ${tip - direction * 9},${y - 10} ${tip - direction * 9},${y - 2}`}
        fill="var(--force)"
      />
      <text x={x + 2} y={y - 13} textAnchor="end" className="t-force">
        {quantity(demand.value, demand.unit)}
      </text>
    </g>
  );
}

/** Where a line stops: its shear leaves into the diaphragm. */
export function Departure({
  text,
  from,
  x,
  y,
  direction,
}: {
  readonly text: string;
  readonly from: string;
  readonly x: number;
  readonly y: number;
  readonly direction: 1 | -1;
}) {
  return (
    <g data-from={from}>
      <path
        d={`M${x - direction * 40},${y + 9}H${x + direction * 34}`}
        stroke="var(--alarm)"
        strokeWidth={2}
        strokeDasharray="6 3"
      />
      <polygon
        points={`${x + direction * 40},${y + 9} ${x + direction * 31},${y + 5} ${x + direction * 31},${y + 13}`}
        fill="var(--alarm)"
      />
      <text x={x} y={y + 25} textAnchor="middle" className="t-alarm halo">
        {text}
      </text>
    </g>
  );
}

/** Tension and compression at the foot of a pier, each at its own end post: by arrow, word of the legend and colour. */
export function EndForces({
  line,
  tension,
  compression,
  posts,
  x,
  foot,
  origin,
}: {
  readonly line: WallLine;
  readonly tension: Demand | undefined;
  readonly compression: Demand | undefined;
  readonly posts: { readonly from: number; readonly to: number };
  readonly x: (d: number) => number;
  readonly foot: number;
  readonly origin: (demand: Demand) => string;
}) {
  const [a] = line.axis;
  const { u } = axisOf(line);
  const shown = [
    { demand: tension, sign: '↑', className: 's10 t-tension' },
    { demand: compression, sign: '↓', className: 's10 t-compression' },
  ];
  const room = x(posts.to) - x(posts.from) > 74;
  return shown.map(({ demand, sign, className }, i) => {
    if (demand?.at === undefined || demand.value <= 0) return null;
    const d = u[0] * (demand.at[0] - a[0]) + u[1] * (demand.at[1] - a[1]);
    const near = Math.abs(d - posts.from) < Math.abs(d - posts.to);
    return (
      <text
        key={sign}
        x={near ? x(posts.from) + 4 : x(posts.to) - 4}
        y={foot - 5 - (room ? 0 : i * 12)}
        textAnchor={near ? 'start' : 'end'}
        className={className}
        data-from={origin(demand)}
      >
        {`${sign}${figure(demand.value, 3)}`}
      </text>
    );
  });
}
